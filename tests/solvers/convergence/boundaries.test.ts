import type { CaseFile } from '@/shared/case/caseFile';
import {
  buildCase,
  buildSections,
  openRectanglePoints,
  steadyFlow,
  steadyStage,
} from '../../helpers/solvers/caseBuilders';
import { routeChecked } from '../../helpers/solvers/routeChecked';

/** Waves that a boundary makes, reflects or lets go, in a level frictionless channel of unit width, 1 km long, in
 *  cells of 5 m. Jump conditions S [h] = [hu], S [hu] = [h u² + g h²/2] and invariants u ± 2c (J. J. Stoker
 *  1957; V. T. Chow 1959, ch. 19); values computed apart from this program to 8 digits. */
const LENGTH = 1000;
const CELL = 5;

function route(
  parts: Pick<CaseFile, 'upstream' | 'downstream'> & {
    duration: number;
    depth: number;
    flow: number;
  },
) {
  const { upstream, downstream, duration, depth, flow } = parts;
  return routeChecked(
    buildCase({
      sections: buildSections(0, LENGTH, 2, 0, () => openRectanglePoints(1, 0)),
      upstream,
      downstream,
      initial: {
        kind: 'profile',
        chainages: [0, LENGTH],
        stages: [depth, depth],
        flows: [flow, flow],
      },
      numerics: { cellSize: CELL, duration, outputInterval: duration },
    }),
  ).cells;
}
type Cells = ReturnType<typeof route>;

/** Away from a front, by sixteen cells, the state is even: to a millimetre of depth and 1 ‰ of flow (of the larger flow
 *  beside the front, of 1 m²/s at least). What is left is the start of the wave, which takes a few cells to become a
 *  front, and the ripple behind a slow one. */
function expectEven(
  cells: Cells,
  from: number,
  to: number,
  depth: number,
  flow: number,
  largestFlow = Math.abs(flow),
) {
  cells.chainage.forEach((x, i) => {
    if (x < from || x > to) return;
    expect(Math.abs(cells.finalDepth[i] - depth)).toBeLessThan(1e-3);
    expect(Math.abs(cells.finalFlow[i] - flow)).toBeLessThan(1e-3 * Math.max(1, largestFlow));
  });
}

/** Place where the depth passes the mean of both sides. */
function front(cells: Cells, one: number, other: number): number {
  const middle = (one + other) / 2;
  const above = cells.finalDepth[0] > middle;
  const i = cells.finalDepth.findIndex((depth) => depth > middle !== above);
  return cells.chainage[i] - CELL / 2;
}

describe('inflow', () => {
  it.each([
    [1, 1.2, 0.71969994, 3.5984997],
    [1, 2, 5.4249424, 5.4249424],
    [2, 3, 6.06527, 6.06527],
  ])('into still water of %f m raises a bore of %f m', (ahead, behind, flow, speed) => {
    const duration = 600 / speed;
    const cells = route({
      upstream: { kind: 'inflow', ...steadyFlow(flow) },
      downstream: { kind: 'wall' },
      duration,
      depth: ahead,
      flow: 0,
    });
    expectEven(cells, 0, 520, behind, flow);
    expectEven(cells, 680, LENGTH, ahead, 0);
    expect(Math.abs(front(cells, ahead, behind) - 600)).toBeLessThan(2 * CELL);
  });

  it('that stops lets the water fall by its invariant', () => {
    // u - 2c is carried to the closed inlet: 2 √(g h) = 2 √(g 2) - 1, h = 1.5827...
    const root = Math.sqrt(9.81 * 2) - 0.5;
    const cells = route({
      upstream: { kind: 'inflow', ...steadyFlow(0) },
      downstream: { kind: 'open' },
      duration: 100,
      depth: 2,
      flow: 2,
    });
    expectEven(cells, 0, 250, root ** 2 / 9.81, 0);
  });
});

describe('wall', () => {
  it.each([
    [1.5, 1, 1.914065, 3.6226192],
    [2, 2, 2.9884767, 4.0466304],
  ])('downstream: %f m at %f m/s surges to %f m', (depth, velocity, surge, speed) => {
    const cells = route({
      upstream: { kind: 'inflow', ...steadyFlow(depth * velocity) },
      downstream: { kind: 'wall' },
      duration: 500 / speed,
      depth,
      flow: depth * velocity,
    });
    expectEven(cells, 600, LENGTH, surge, 0, depth * velocity);
    expectEven(cells, 0, 420, depth, depth * velocity);
    expect(Math.abs(front(cells, depth, surge) - 500)).toBeLessThan(2 * CELL);
  });

  it('upstream: the mirror image', () => {
    const cells = route({
      upstream: { kind: 'wall' },
      downstream: { kind: 'stage', ...steadyStage(1.5) },
      duration: 500 / 3.6226192,
      depth: 1.5,
      flow: -1.5,
    });
    expectEven(cells, 0, 420, 1.914065, 0);
    expectEven(cells, 580, LENGTH, 1.5, -1.5);
  });
});

describe('stage', () => {
  const raised = { depth: 1.2, flow: 0.71969994, speed: 3.5984997 };
  const loweredFlow = 0.8 * 2 * (Math.sqrt(9.81) - Math.sqrt(9.81 * 0.8));

  it('raised at the outlet sends a bore upstream: water comes in', () => {
    const cells = route({
      upstream: { kind: 'wall' },
      downstream: { kind: 'stage', ...steadyStage(1.2) },
      duration: 500 / raised.speed,
      depth: 1,
      flow: 0,
    });
    expectEven(cells, 580, LENGTH, raised.depth, -raised.flow);
    expectEven(cells, 0, 420, 1, 0);
  });

  it('raised at the inlet sends the same bore downstream', () => {
    const cells = route({
      upstream: { kind: 'stage', ...steadyStage(1.2) },
      downstream: { kind: 'wall' },
      duration: 500 / raised.speed,
      depth: 1,
      flow: 0,
    });
    expectEven(cells, 0, 420, raised.depth, raised.flow);
    expectEven(cells, 580, LENGTH, 1, 0);
  });

  it('lowered at either end draws water out by the invariant', () => {
    const down = route({
      upstream: { kind: 'wall' },
      downstream: { kind: 'stage', ...steadyStage(0.8) },
      duration: 200,
      depth: 1,
      flow: 0,
    });
    // The tail of the fan moves at c - u = 2.14 m/s.
    expectEven(down, LENGTH - 350, LENGTH, 0.8, loweredFlow);
    const up = route({
      upstream: { kind: 'stage', ...steadyStage(0.8) },
      downstream: { kind: 'wall' },
      duration: 200,
      depth: 1,
      flow: 0,
    });
    expectEven(up, 0, 350, 0.8, -loweredFlow);
  });

  it('rising slowly fills a short basin at the rate of its surface', () => {
    // 5000 m² rising a metre an hour takes 1.3889 m³/s at the mouth and half of that in the middle.
    const rate = 5000 / 3600;
    const { sections } = routeChecked(
      buildCase({
        sections: buildSections(0, 100, 3, 0.02, () => openRectanglePoints(50, 0)),
        upstream: { kind: 'wall' },
        downstream: { kind: 'stage', times: [0, 3600], stages: [2, 3] },
        // From still water it would sway for hours: a quarter wave of 90 s has nothing to damp it.
        initial: { kind: 'profile', chainages: [0, 100], stages: [2, 2], flows: [0, -rate] },
        numerics: { cellSize: 5, duration: 3600, outputInterval: 600 },
      }),
    );
    expect(sections[2].flow.at(-1)! / -rate).toBeCloseTo(1, 2);
    expect(sections[1].flow.at(-1)! / -rate).toBeCloseTo(0.5, 2);
    expect(sections[0].stage.at(-1)!).toBeCloseTo(3, 3);
  });
});

describe('open end', () => {
  it('lets a bore go without an echo', () => {
    // The bore passes the end after 278 s; an echo would be back over half the reach after 600 s.
    const cells = route({
      upstream: { kind: 'inflow', ...steadyFlow(0.71969994) },
      downstream: { kind: 'open' },
      duration: 600,
      depth: 1,
      flow: 0,
    });
    // Across the bore u - 2c itself changes by 0.002 m/s, which no end can know: 1 mm.
    cells.finalDepth.forEach((depth) => expect(Math.abs(depth - 1.2)).toBeLessThan(1e-3));
    cells.finalFlow.forEach((flow) => expect(Math.abs(flow - 0.71969994)).toBeLessThan(3e-3));
  });
});

describe('free overfall', () => {
  it('opened on still water carries 8/27 h0 √(g h0), as a dam that vanishes', () => {
    const result = routeChecked(
      buildCase({
        sections: buildSections(0, LENGTH, 2, 0, () => openRectanglePoints(1, 0)),
        upstream: { kind: 'wall' },
        downstream: { kind: 'criticalDepth' },
        initial: { kind: 'still', stage: 10 },
        numerics: { cellSize: CELL, duration: 60, outputInterval: 60 },
      }),
    );
    const outlet = result.sections[1];
    expect(Math.abs(outlet.depth.at(-1)! / (40 / 9) - 1)).toBeLessThan(0.02);
    expect(Math.abs(outlet.flow.at(-1)! / 29.346798 - 1)).toBeLessThan(5e-3);
    // All that left until then: the flow is constant from the first moment on.
    expect(Math.abs(result.volume.outflow / (60 * 29.346798) - 1)).toBeLessThan(5e-3);
  });
});

describe('rating', () => {
  it('empties a pool by the weir law', () => {
    // Pool of 1e6 m² over a weir 1.7 b h^1.5 with b = 50 m: h = (h0^-½ + C b t/(2 A))^-2, exact.
    const weir = (h: number) => 85 * h ** 1.5;
    const stages = Array.from({ length: 1001 }, (_, i) => i / 100);
    const { sections, times } = routeChecked(
      buildCase({
        sections: buildSections(0, 50, 2, 0, () => openRectanglePoints(20_000, 0)),
        upstream: { kind: 'wall' },
        downstream: { kind: 'rating', stages, flows: stages.map(weir) },
        initial: { kind: 'still', stage: 10 },
        numerics: { cellSize: 5, duration: 14_400, outputInterval: 600 },
      }),
    );
    for (const [time, depth, flow] of [
      [600, 8.563267, 2129.9927],
      [1800, 6.483609, 1403.2793],
      [3600, 4.541848, 822.7499],
      [7200, 2.582862, 352.8343],
      [14_400, 1.160622, 106.2809],
    ]) {
      const i = times.indexOf(time);
      expect(Math.abs(sections[1].depth[i] - depth)).toBeLessThan(5e-3);
      expect(Math.abs(sections[1].flow[i] / flow - 1)).toBeLessThan(2e-3);
    }
  });
});
