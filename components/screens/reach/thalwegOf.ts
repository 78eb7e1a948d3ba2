import type { Section } from '@/shared/surveys/types';

/** Lowest point of a section, m. */
export const thalwegOf = ({ points }: Pick<Section, 'points'>): number =>
  points.reduce((lowest, [, elevation]) => Math.min(lowest, elevation), Infinity);
