import { createContext, useContext } from 'react';

/** What a picture of a drawing says of where it comes from. */
export interface PictureSource {
  /** What its file name begins with, e.g. `Run 3`. */
  stem: string;
  /** Lines in its foot: the study, then what of it is drawn and whether it may be relied on. */
  foot: readonly string[];
  /** What its file name ends with: `preliminary`, `signed`, `withdrawn`, `unsigned`; empty for what nobody signs. */
  ending: string;
}

const PictureContext = createContext<PictureSource | null>(null);

/** Drawings within it offer a picture of themselves. */
export const PictureProvider = PictureContext.Provider;
export const usePictureSource = () => useContext(PictureContext);
