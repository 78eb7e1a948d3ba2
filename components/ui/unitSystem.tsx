import { createContext, useContext } from 'react';
import type { UnitSystem } from '@/shared/units/units';

const UnitSystemContext = createContext<UnitSystem>('metric');

/** Set once by a study for all its screens. */
export const UnitSystemProvider = UnitSystemContext.Provider;

/** What the study is shown and typed in. */
export const useUnitSystem = (): UnitSystem => useContext(UnitSystemContext);
