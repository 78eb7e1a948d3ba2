import { parentPort, workerData } from 'node:worker_threads';
import { gunzipSync, gzipSync } from 'node:zlib';
import type { EncodedBlock } from '../../../server/results/blocks/blockTypes';
import { RunFailed } from '../../../server/solvers/runErrors';
import type { RunWorkerData, WorkerMessage } from '../../../server/jobs/workerMessages';

/** What a stand-in for a run does; it travels where the frozen case would. */
export interface FakeCase {
  /** `routesTwice` sends the same block twice: it cannot be stored. */
  does: 'routes' | 'routesTwice' | 'fails' | 'throws' | 'exits' | 'eatsMemory' | 'isStuck';
  /** ms of wall time before it does so, listening to the stop flag unless it is stuck. */
  after: number;
}

const { caseBytes, stopFlag } = workerData as RunWorkerData;
const { does, after } = JSON.parse(gunzipSync(caseBytes).toString()) as FakeCase;
const stop = new Int32Array(stopFlag);
const post = (message: WorkerMessage) => parentPort?.postMessage(message);

function stopped(): boolean {
  const started = Date.now();
  while (Date.now() - started < after) {
    if (does === 'isStuck') continue;
    if (Atomics.wait(stop, 0, 0, 20) !== 'timed-out') return true;
    const fraction = (Date.now() - started) / after;
    post({ type: 'progress', fraction, time: 100 * fraction, surface: null });
  }
  return false;
}

if (stopped()) {
  post({ type: 'cancelled' });
} else if (does === 'routes' || does === 'routesTwice') {
  const bytes = gzipSync('{}');
  const block: EncodedBlock = { kind: 'facts', part: 0, bytes };
  const blocks = does === 'routesTwice' ? [block, block] : [block];
  post({ type: 'routed', blocks, solver: '1.0.0', peakStage: 4, peakFlow: 5, inflow: null });
} else if (does === 'fails') {
  post({ type: 'failed', reason: new RunFailed('too steep.', 5, 10).said });
} else if (does === 'throws') {
  throw new Error('a fault in the program');
} else if (does === 'eatsMemory') {
  const eaten: number[][] = [];
  for (;;) eaten.push(new Array(1e6).fill(eaten.length));
} else {
  process.exit(7);
}
