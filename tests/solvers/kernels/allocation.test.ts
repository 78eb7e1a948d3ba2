import { setFlagsFromString } from 'node:v8';
import { runInNewContext } from 'node:vm';

import { createKernelRun } from '../../bench/kernelRun';

/**
 * Nothing is allocated in a loop over cells: what the heap grows by does not grow with them. A number that becomes an
 * object has 12 bytes or more, so one a cell and step would be seen; the ends and the ledger take some a step.
 */
const CELLS = 2000;
const STEPS = 100;
const BYTES_A_CELL = 2;

setFlagsFromString('--expose-gc');
const collect = runInNewContext('gc') as () => void;

function bytesACell(run: ReturnType<typeof createKernelRun>, dt: number): number {
  collect();
  const before = process.memoryUsage().heapUsed;
  run.seconds(dt, STEPS);
  return (process.memoryUsage().heapUsed - before) / (CELLS * STEPS);
}

it.each([
  ['fast', 1e-6],
  ['reference', 1e-6],
  // Steps at the Courant number: cells leave the levels of their tables.
  ['fast', 100],
  ['reference', 100],
] as const)('the %s kernel allocates nothing in its loops, steps of at most %d s', (which, dt) => {
  const run = createKernelRun(CELLS, which);
  run.seconds(dt, 3 * STEPS);
  // More than once: the compiler of the machine allocates too, now and then.
  let bytes = Infinity;
  for (let k = 0; k < 6 && bytes >= BYTES_A_CELL; k++) bytes = bytesACell(run, dt);
  expect(bytes).toBeLessThan(BYTES_A_CELL);
});
