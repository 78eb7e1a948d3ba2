import type { PlacePeaks } from '../runs/types';

/** A run in a comparison; the first one is what the others are measured against. */
export interface ComparedRun {
  id: number;
  number: number;
  scenarioName: string;
  startsAt: string | null;
  /** s. */
  duration: number;
  caseHash: string;
}

/** A place with what each run says of it, in the order of the runs; null where it lies off that run's reach. */
export interface ComparedPlace {
  name: string;
  kind: 'station' | 'section';
  /** m. */
  chainage: number;
  peaks: (PlacePeaks | null)[];
}

/** One input that is not the same in all runs. */
export interface InputDifference {
  /** Which part of the inputs: `Inflow`, `Section XS-07`. */
  part: string;
  /** What of it: `peak`, `Manning’s n`. */
  what: string;
  /** In the study's units, in the order of the runs; null where a run has nothing of the kind. */
  values: (string | null)[];
}

/** `GET /api/studies/:studyId/comparison?runs=3,5`. */
export interface RunComparison {
  runs: ComparedRun[];
  places: ComparedPlace[];
  differences: InputDifference[];
  /** Differences beyond the limit, counted and not listed. */
  differencesNotListed: number;
  /** All runs are on sections of the same shape at the same places; else they are compared by chainage. */
  sameReach: boolean;
}
