import type { Said } from '../../shared/units/message';
import type { Run } from '../../shared/runs/types';
import type { EncodedBlock } from '../results/blocks/blockTypes';

/** What a run's worker thread is started with. */
export interface RunWorkerData {
  /** The frozen case, gzip of canonical JSON. */
  caseBytes: Uint8Array;
  /** One Int32 in shared memory; not zero: stop. */
  stopFlag: SharedArrayBuffer;
}

/** Water surface of the moment, at most `LIVE_PLACES` places. */
export interface LiveSurface {
  /** s of model time */
  time: number;
  chainages: number[];
  bed: number[];
  stage: number[];
}

/** How a run ended that was not broken off. */
export type WorkerResult =
  | {
      type: 'routed';
      blocks: EncodedBlock[];
      solver: string;
      peakStage: number;
      peakFlow: number;
      /** Into the reach, where it came of the routing itself: from a reservoir. */
      inflow: Run['inflow'] | null;
    }
  | { type: 'failed'; reason: Said }
  | { type: 'cancelled' };

export type WorkerMessage =
  { type: 'progress'; fraction: number; time: number; surface: LiveSurface | null } | WorkerResult;
