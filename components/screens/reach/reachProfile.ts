import type { LongProfile } from '@/components/charts/geometry/longProfile';
import type { ReachSection } from '@/shared/reaches/types';

/** Bed and banks along the reach, m. A section without bank marks has its ends there. */
export const reachProfile = (sections: readonly ReachSection[]): LongProfile => ({
  chainages: sections.map(({ chainage }) => chainage),
  bed: sections.map(({ thalweg }) => thalweg),
  leftBank: sections.map(({ leftBank }) => leftBank),
  rightBank: sections.map(({ rightBank }) => rightBank),
});
