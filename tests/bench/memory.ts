import { gzipSync } from 'node:zlib';

import { RUN_WORKER, startWorker } from '../../server/jobs/startWorker';
import { naturalReach } from './naturalReach';

/**
 * The most memory that a process takes for one run of 20,000 cells and 577 outputs in its worker thread, to the encoded
 * blocks: `tsx tests/bench/memory.ts [hours]`, 48 unless given. Memory depends on cells and outputs, not on the hours.
 */
const CELLS = 20_000;
const CELL = 25;
const OUTPUTS = 577;

void main(Number(process.argv[2] ?? 48));

async function main(hours: number): Promise<void> {
  const megabytes = (): number => Math.round(process.resourceUsage().maxRSS / 1024);
  const caseFile = naturalReach(CELLS * CELL, CELL);
  const duration = 3600 * hours;
  caseFile.numerics = { ...caseFile.numerics, duration, outputInterval: duration / (OUTPUTS - 1) };
  const caseBytes = gzipSync(JSON.stringify(caseFile));
  const before = megabytes();
  const began = performance.now();
  const outcome = await startWorker(RUN_WORKER, caseBytes, () => undefined).outcome;
  const seconds = (performance.now() - began) / 1000;
  if (outcome.type !== 'routed') throw new Error(`The run ended as ${outcome.type}`);
  const most = megabytes();
  console.log(
    `${CELLS} cells, ${hours} h, ${OUTPUTS} outputs in a worker: ${seconds.toFixed(0)} s; the process at most ` +
      `${most} MB, ${most - before} MB more than before the run`,
  );
}
