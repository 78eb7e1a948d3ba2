import { SEARCH_LIMITS } from '@/shared/calibration/search/schemas';
import type { SearchStretch } from '@/shared/calibration/search/types';

type Sections = readonly { chainage: number }[];

/** Wide enough for doubts about n, narrow enough to stay a roughness; a search that ends on a bound says so. */
const BOUNDS = { low: 0.6, high: 1.6 };

/** Channel and flood plain of the whole reach: what the first search asks. */
export function firstStretches(sections: Sections): SearchStretch[] {
  const ends = { from: sections[0].chainage, to: sections[sections.length - 1].chainage };
  return [
    { name: 'Channel', ...ends, part: 'channel', ...BOUNDS },
    { name: 'Flood plain', ...ends, part: 'overbank', ...BOUNDS },
  ];
}

export const nextStretch = (sections: Sections): SearchStretch => ({
  ...firstStretches(sections)[0],
  name: '',
  part: 'all',
});

/** Cells twice as long are a quarter of the work: half as many, in half as many steps. */
export const searchSeconds = (seconds: number, coarser: number, runs: number): number =>
  (runs * seconds) / coarser ** 2;

/** Runs of a usual search with two multipliers, and how long one likes to wait for them, s. */
const USUAL = { runs: 48, wait: 240 };

/** Cells to begin with: those of the run where they are quick, coarser ones where they are not. */
export const firstCells = (seconds: number): number =>
  [1, 2].find((coarser) => searchSeconds(seconds, coarser, USUAL.runs) <= USUAL.wait) ?? 4;

export const hasRoom = (count: number): boolean => count < SEARCH_LIMITS.stretches;
