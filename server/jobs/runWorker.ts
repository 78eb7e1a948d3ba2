import { parentPort, workerData } from 'node:worker_threads';
import { gunzipSync } from 'node:zlib';
import type { CaseFile } from '../../shared/case/caseFile';
import { releaseOutline } from '../results/inflowOutline';
import { encodeRun } from '../results/blocks/encodeRun';
import { recordWave } from '../results/blocks/waveRecorder';
import { RunCancelled, RunFailed, outputTimes, routeCase } from '../solvers';
import { liveSurface } from './liveSurface';
import type { RunWorkerData, WorkerMessage, WorkerResult } from './workerMessages';

/** Milliseconds between two messages of progress: four a second. */
const PROGRESS_INTERVAL = 250;

/** Entry of the thread that computes one run: frozen case in, encoded blocks out. */
function main({ caseBytes, stopFlag }: RunWorkerData): void {
  const caseFile = JSON.parse(gunzipSync(caseBytes).toString('utf8')) as CaseFile;
  const stop = new Int32Array(stopFlag);
  const post = (message: WorkerMessage) => parentPort?.postMessage(message);
  try {
    post(route(caseFile, () => Atomics.load(stop, 0) !== 0, post));
  } catch (error) {
    if (error instanceof RunCancelled) post({ type: 'cancelled' });
    else if (error instanceof RunFailed) post({ type: 'failed', reason: error.said });
    else throw error;
  }
}

function route(
  caseFile: CaseFile,
  shouldStop: () => boolean,
  post: (message: WorkerMessage) => void,
): WorkerResult {
  const { duration, outputInterval } = caseFile.numerics;
  const wave = recordWave(outputTimes(duration, outputInterval).length);
  const picture = liveSurface(caseFile);
  const mayPost = atMostEvery(PROGRESS_INTERVAL);
  const mayDraw = atMostEvery(PROGRESS_INTERVAL);
  let fraction = 0;
  const result = routeCase(caseFile, {
    shouldStop,
    onProgress: (progress) => {
      fraction = progress.fraction;
      if (mayPost()) post({ type: 'progress', fraction, time: progress.time, surface: null });
    },
    onOutput: (output) => {
      wave.add(output);
      if (!mayDraw()) return;
      post({ type: 'progress', fraction, time: output.time, surface: picture(output) });
    },
  });
  const outlet = result.sections[result.sections.length - 1].peak;
  return {
    type: 'routed',
    blocks: encodeRun(caseFile, result, wave.finish()),
    solver: result.solver,
    peakStage: outlet.stage,
    peakFlow: outlet.flow,
    inflow: releaseOutline(result),
  };
}

function atMostEvery(milliseconds: number): () => boolean {
  let last = -Infinity;
  return () => {
    const now = performance.now();
    if (now - last < milliseconds) return false;
    last = now;
    return true;
  };
}

main(workerData as RunWorkerData);
