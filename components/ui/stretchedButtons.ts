import { createContext, useContext } from 'react';

const StretchedContext = createContext(false);

/** Within it buttons take the whole width, e.g. at the foot of a phone. */
export const StretchedButtons = StretchedContext.Provider;

export const useIsStretched = (): boolean => useContext(StretchedContext);
