import { execFileSync, spawnSync } from 'node:child_process';
import { mkdtempSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';

import type { Workspace } from '../../server/solvers/workspace';

/** Compiles kernel.c with all that the machine has; null where there is no C compiler. */
export function compileKernel(): string | null {
  if (spawnSync('cc', ['--version']).status !== 0) return null;
  const program = join(mkdtempSync(join(tmpdir(), 'spate-bench-')), 'kernel');
  const source = join(__dirname, 'kernel.c');
  execFileSync('cc', ['-O3', '-march=native', '-o', program, source, '-lm']);
  return program;
}

/** Seconds that the C kernel takes for `steps` steps from the state of the workspace. */
export function secondsInC(
  program: string,
  workspace: Workspace,
  dt: number,
  steps: number,
): number {
  const w = workspace;
  const head = Float64Array.of(w.n, w.dx, w.gravity, dt, steps);
  const arrays = [w.area, w.flow, w.stage, w.width, w.slopeFloor, w.bed, w.levelZ];
  arrays.push(w.levelArea, w.levelEnd, w.levelB0, w.levelB1, w.levelV0, w.levelV1, w.levelV2);
  const input = Buffer.concat(
    [head, ...arrays].map((a) => Buffer.from(a.buffer, a.byteOffset, a.byteLength)),
  );
  const { status, stdout } = spawnSync(program, { input });
  if (status !== 0) throw new Error(`The C kernel ended with ${status}: see kernel.c`);
  return Number(stdout.toString().split(' ')[0]);
}
