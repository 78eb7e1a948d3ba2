import type { RunResiduals } from './types';

/** The marks of a flood for a long section, with what each is allowed; m. */
export const observedLevels = (residuals: RunResiduals) =>
  residuals.marks.map(({ mark: { chainage, level }, tolerance }) => ({
    chainage,
    level,
    tolerance,
  }));
