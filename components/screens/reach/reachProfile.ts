import type { LongProfile } from '@/components/charts/geometry/longProfile';
import type { ReachSection } from '@/shared/reaches/types';

/** Bed and banks along the reach, m. NaN, which lifts the pen, where a section has no bank marks. */
export const reachProfile = (sections: readonly ReachSection[]): LongProfile => ({
  chainages: sections.map(({ chainage }) => chainage),
  bed: sections.map(({ thalweg }) => thalweg),
  leftBank: sections.map(({ banks, leftBank }) => (banks ? leftBank : NaN)),
  rightBank: sections.map(({ banks, rightBank }) => (banks ? rightBank : NaN)),
});
