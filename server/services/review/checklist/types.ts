import type { RunResiduals } from '../../../../shared/calibration/types';
import type { CaseFile } from '../../../../shared/case/caseFile';
import type { ConvergenceResult } from '../../../../shared/confidence/types';
import type { Advice } from '../../../../shared/reaches/types';
import type { ChecklistItem } from '../../../../shared/review/types';
import { q, type Said } from '../../../../shared/units/message';
import type { RunState } from '../../../../shared/runs/types';
import type { PlaceColumns, RunFacts } from '../../../results/blocks/blockTypes';

/** What the wave did at one surveyed section. */
export interface SectionHistory {
  id: string;
  chainage: number;
  /** Dry after it had been wet, and wet again after that. */
  fellDry: boolean;
  rewetted: boolean;
  /** Largest Froude number where the water is deeper than the dry depth. */
  peakFroude: number;
  peakStage: number;
  /** Elevation of the lower end of the section, m. */
  lowerEnd: number;
}

/** Peak stage at a place, in this run and in another one, m. */
export interface PeakPair {
  name: string;
  here: number;
  there: number;
}

/** All that the items are found from. SI. */
export interface ChecklistFacts {
  caseFile: CaseFile;
  run: RunFacts;
  places: PlaceColumns;
  sections: SectionHistory[];
  /** Advice on the reach as it stands now. */
  advice: Advice[];
  /** The same case with a changed outlet; null: not asked for. */
  probe: { runNumber: number; state: RunState; change: Said; peaks: PeakPair[] } | null;
  /** The latest finished convergence set of this very case; null: none. */
  convergence: { name: string; result: ConvergenceResult } | null;
  /** Against the observed flood of its report; null: none was chosen. */
  observed: RunResiduals | null;
  /** Routed runs of the same case with other cells, finest first; this run is among them. */
  grids: { runNumber: number; cellSize: number; peaks: { name: string; stage: number }[] }[];
}

/** An item whose words can be told in the study's units. */
export type FoundItem = Omit<ChecklistItem, 'answer' | 'finding' | 'rule'> & {
  finding: string | Said;
  rule: string | Said;
};

/** One item, from the facts alone; null where it does not concern the run. */
export type ChecklistRule = (facts: ChecklistFacts) => FoundItem | null;

/** A height or a depth to the millimetre. */
export const fine = (value: number) => q(value, 'depth', { decimals: 3 });
export const counted = (count: number, one: string, many = `${one}s`) =>
  `${count} ${count === 1 ? one : many}`;

/** The place where two runs differ most. */
export const widest = (peaks: PeakPair[]): (PeakPair & { difference: number }) | null =>
  peaks.reduce<(PeakPair & { difference: number }) | null>((most, pair) => {
    const difference = Math.abs(pair.there - pair.here);
    return !most || difference > most.difference ? { ...pair, difference } : most;
  }, null);
