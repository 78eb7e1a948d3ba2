import { kinematicDamBreak } from '@/server/solvers/exact/kinematicDamBreak';
import { buildCase, buildSections, openRectanglePoints } from '../../helpers/solvers/caseBuilders';
import { routeChecked } from '../../helpers/solvers/routeChecked';

/** A dam 10 m high fails on a slope of 1 %, n = 0.05: far below, friction and slope rule (B. Hunt 1982). The theory leaves out
 *  the inertia of the start, so the true front is late by a constant, some 0.4 reservoir lengths; its speed, and in time its
 *  depth, are those of the theory. */
const [SLOPE, MANNING, HEIGHT] = [0.01, 0.05, 10];
const POOL = HEIGHT / SLOPE;
const CELL = POOL / 50;
const TIMES = [10, 15, 20];
const unit = (MANNING * POOL) / (Math.sqrt(SLOPE) * HEIGHT ** (2 / 3));

it('a dam-break wave far down a dry slope runs as the kinematic wave', () => {
  const length = 11 * POOL;
  const dam = 1.2 * POOL;
  const bed = (x: number) => SLOPE * (length - x);
  const fronts: number[] = [];
  const depths: number[] = [];
  routeChecked(
    buildCase({
      sections: buildSections(0, length, 2, MANNING, (x) => openRectanglePoints(1, bed(x))),
      upstream: { kind: 'wall' },
      downstream: { kind: 'open' },
      initial: { kind: 'dam', chainage: dam, stageAbove: bed(dam) + HEIGHT, stageBelow: null },
      numerics: { cellSize: CELL, duration: 20 * unit, outputInterval: 5 * unit },
    }),
    {
      onOutput: ({ index, stage }) => {
        if (index < 2) return;
        const depth = Array.from(stage, (eta, i) => eta - bed((i + 0.5) * CELL));
        const deepest = Math.max(...depth);
        // Where the front is half as deep as the wave behind it, read between cells.
        const last = depth.findLastIndex((h) => h > deepest / 2);
        const share = (depth[last] - deepest / 2) / (depth[last] - depth[last + 1]);
        fronts.push(((last + 0.5 + share) * CELL - dam) / POOL);
        depths.push(deepest / HEIGHT);
      },
    },
  );
  const theory = TIMES.map(kinematicDamBreak);
  for (const i of [1, 2]) {
    const speed = fronts[i] - fronts[i - 1];
    expect(Math.abs(speed / (theory[i].front - theory[i - 1].front) - 1)).toBeLessThan(0.01);
  }
  const late = theory.map(({ front }, i) => front - fronts[i]);
  expect(Math.max(...late) - Math.min(...late)).toBeLessThan(0.03);
  expect(Math.max(...late)).toBeLessThan(0.5);
  const off = theory.map(({ frontDepth }, i) => Math.abs(depths[i] / frontDepth - 1));
  expect(off[2]).toBeLessThan(0.05);
  expect(off[2]).toBeLessThan(off[0] / 2);
});
