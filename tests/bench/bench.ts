import { demoCase } from '../../seed/demoCase';
import { routeCase } from '../../server/solvers';
import { hasFastKernel } from '../../server/solvers/fast/fastKernel';
import type { CaseFile } from '../../shared/case/caseFile';
import { compileKernel, secondsInC } from './kernelInC';
import { createKernelRun } from './kernelRun';
import { naturalReach } from './naturalReach';

/** Rounds of one interleaved run; medians are printed. */
const ROUNDS = 9;
/** Steps are cut to so short a time (s) that the water hardly moves and every round does the same work. */
const STEP = 1e-6;
const KERNELS = ['C', 'reference', 'fast'] as const;
const NAMES = {
  C: 'C, -O3 -march=native',
  reference: 'readable TypeScript',
  fast: 'fast (WebAssembly, SIMD)',
};

main();

function main(): void {
  const program = compileKernel();
  if (program === null) console.log('No C compiler (cc): the kernel is not compared.');
  for (const cells of [2_000, 20_000]) benchKernel(cells, program);
  const river = naturalReach(20_000, 25);
  benchCase('20 km of river, 12 h flood, cells of 25 m', river);
  const demo = demoCase();
  benchCase(`Demo: ${demo.title}`, demo);
}

/** C, the readable kernel and the fast one in turn, so that what else the machine does hits them alike. */
function benchKernel(cells: number, program: string | null): void {
  const steps = Math.round(2_000_000 / cells);
  const reference = createKernelRun(cells, 'reference');
  const fast = hasFastKernel() ? createKernelRun(cells, 'fast') : null;
  const seconds = { C: [] as number[], reference: [] as number[], fast: [] as number[] };
  for (let round = -1; round < ROUNDS; round++) {
    const times = {
      C: program === null ? NaN : secondsInC(program, reference.workspace, STEP, steps),
      reference: reference.seconds(STEP, steps),
      fast: fast === null ? NaN : fast.seconds(STEP, steps),
    };
    // The first round is for the compilers.
    if (round < 0) continue;
    for (const name of KERNELS) seconds[name].push(times[name]);
  }
  const updates = cells * steps * 2;
  console.log(`${cells} cells, million cell updates a second (one a cell and stage):`);
  for (const name of KERNELS) {
    const own = median(seconds[name]);
    if (Number.isNaN(own)) continue;
    const ratio = median(seconds.C) / own;
    const beside = program === null ? '' : `, ${ratio.toFixed(2)} of C`;
    console.log(
      `  ${NAMES[name].padEnd(26)}${(updates / own / 1e6).toFixed(1).padStart(6)}${beside}`,
    );
  }
}

function benchCase(name: string, caseFile: CaseFile): void {
  const { seconds, steps, cellUpdates } = routeCase(caseFile);
  console.log(
    `${name}: ${seconds.toFixed(2)} s, ${steps} steps, ` +
      `${(cellUpdates / seconds / 1e6).toFixed(1)} million cell updates/s with everything`,
  );
}

function median(values: number[]): number {
  const sorted = [...values].sort((a, b) => a - b);
  return sorted[Math.floor(sorted.length / 2)];
}
