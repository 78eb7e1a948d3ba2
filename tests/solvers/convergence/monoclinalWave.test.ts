import { monoclinalWave } from '@/server/solvers/exact/monoclinalWave';
import { trapezoid } from '@/server/solvers/exact/prismaticSection';
import {
  buildCase,
  buildSections,
  GRAVITY,
  trapezoidPoints,
} from '../../helpers/solvers/caseBuilders';
import { errorNorms } from '../../helpers/solvers/errorNorms';
import { orderTable } from '../../helpers/solvers/orderTable';
import { routeChecked } from '../../helpers/solvers/routeChecked';

/** A flood front of constant form, 1.5 m to 3 m deep in a trapezoid, half an hour of its way down 12 km: an exact
 *  unsteady flow with Manning friction (V. T. Chow 1959, uniformly progressive flow), its hydrograph given at the inlet
 *  and its stage at the outlet. */
const [LENGTH, SLOPE, MANNING, BOTTOM, SIDE] = [12_000, 0.001, 0.03, 20, 2];
const [START, DURATION] = [4000, 1800];
const GRIDS = [60, 120, 240, 480];
const wave = monoclinalWave(trapezoid(BOTTOM, SIDE), GRAVITY, MANNING, SLOPE, 3, 1.5);

function errorsOn(cells: number, order: 1 | 2) {
  const at = (x: number, time: number) => x - START - wave.speed * time;
  const times = Array.from({ length: cells + 1 }, (_, i) => (i * DURATION) / cells);
  const middles = Array.from({ length: cells }, (_, i) => ((i + 0.5) * LENGTH) / cells);
  const chainages = [0, ...middles, LENGTH];
  const { cells: found } = routeChecked(
    buildCase({
      sections: buildSections(0, LENGTH, 2, MANNING, (x) =>
        trapezoidPoints(BOTTOM, SIDE, SLOPE * (LENGTH - x), 8),
      ),
      upstream: { kind: 'inflow', times, flows: times.map((time) => wave.flow(at(0, time))) },
      downstream: {
        kind: 'stage',
        times,
        stages: times.map((time) => wave.depth(at(LENGTH, time))),
      },
      initial: {
        kind: 'profile',
        chainages,
        stages: chainages.map((x) => SLOPE * (LENGTH - x) + wave.depth(at(x, 0))),
        flows: chainages.map((x) => wave.flow(at(x, 0))),
      },
      numerics: { cellSize: LENGTH / cells, duration: DURATION, outputInterval: DURATION, order },
    }),
  );
  const depth = (x: number) => wave.depth(at(x, DURATION));
  const flow = (x: number) => wave.flow(at(x, DURATION));
  return {
    depth: errorNorms(found.chainage, found.finalDepth, depth).mean,
    flow: errorNorms(found.chainage, found.finalFlow, flow).mean,
  };
}

describe('a flood front of constant form', () => {
  // Limits on the finest grid, half as much again as measured: of depth (m), of flow (m³/s of some 90); least orders. The
  // tables of sections, good to some 1e-4 of the conveyance, take from the order at second order.
  it.each<[1 | 2, number, number, number]>([
    [1, 1.3e-2, 1.4, 0.95],
    [2, 3.1e-6, 1.6e-4, 1.6],
  ])('is followed at order %d', (order, depthLimit, flowLimit, leastOrder) => {
    const errors = new Map(GRIDS.map((cells) => [cells, errorsOn(cells, order)]));
    const name = `Front of constant form, order ${order}`;
    const depth = orderTable(`${name}, depth`, GRIDS, (n) => errors.get(n)!.depth);
    const flow = orderTable(`${name}, flow`, GRIDS, (n) => errors.get(n)!.flow);
    expect(depth.finest).toBeLessThan(depthLimit);
    expect(flow.finest).toBeLessThan(flowLimit);
    expect(depth.order).toBeGreaterThan(leastOrder);
    expect(flow.order).toBeGreaterThan(leastOrder);
  });
});
