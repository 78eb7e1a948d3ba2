import { createContext, useContext } from 'react';

/** What a picture of a drawing says of where it comes from. */
export interface PictureSource {
  /** What its file name begins with, e.g. `Run 3`. */
  stem: string;
  study: string;
  /** Number and name of the run, e.g. `Run 3, design flood`. */
  run: string;
  /** `Preliminary, not signed`, `Signed` or `Withdrawn`. */
  state: string;
}

const PictureContext = createContext<PictureSource | null>(null);

/** Drawings within it offer a picture of themselves. */
export const PictureProvider = PictureContext.Provider;
export const usePictureSource = () => useContext(PictureContext);
