import { demoCase } from '../../seed/demoCase';
import { routeCase } from '../../server/solvers';
import type { CaseFile } from '../../shared/case/caseFile';
import { compileKernel, secondsInC } from './kernelInC';
import { createKernelRun } from './kernelRun';
import { naturalReach } from './naturalReach';

/** Rounds of one interleaved run; medians are printed. */
const ROUNDS = 9;
/** Steps are cut to so short a time (s) that the water hardly moves and every round does the same work. */
const STEP = 1e-6;

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

function benchKernel(cells: number, program: string | null): void {
  const steps = Math.round(2_000_000 / cells);
  const run = createKernelRun(cells);
  run.seconds(STEP, steps);
  const own: number[] = [];
  const inC: number[] = [];
  for (let round = 0; round < ROUNDS; round++) {
    own.push(run.seconds(STEP, steps));
    if (program !== null) inC.push(secondsInC(program, run.workspace, STEP, steps));
  }
  const updates = cells * steps * 2;
  const rate = (seconds: number): string => `${(updates / seconds / 1e6).toFixed(1)} million/s`;
  console.log(`${cells} cells: ${rate(median(own))} cell updates (one a cell and stage)`);
  if (program !== null) {
    const ratio = median(inC) / median(own);
    console.log(`  C, -O3 -march=native: ${rate(median(inC))}; ratio ${ratio.toFixed(2)}`);
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
