import { macDonald, type MacDonaldCase } from '@/server/solvers/exact/macDonald';
import {
  buildCase,
  buildSectionsAtCells,
  GRAVITY,
  steadyFlow,
  steadyStage,
  trapezoidPoints,
} from '../../helpers/solvers/caseBuilders';
import { errorNorms } from '../../helpers/solvers/errorNorms';
import { orderTable } from '../../helpers/solvers/orderTable';
import { routeChecked } from '../../helpers/solvers/routeChecked';

/** Steady flow with Manning friction on a bed made for a known depth. Sections at the cells. */
function settle(name: MacDonaldCase, cellSize: number) {
  const exact = macDonald(name, GRAVITY);
  const length = exact.to - exact.from;
  const place = (chainage: number) => exact.from + chainage;
  const fastOutlet = name === 'B';
  const result = routeChecked(
    buildCase({
      sections: buildSectionsAtCells(length, length / cellSize, exact.manning, (chainage) =>
        trapezoidPoints(exact.width, 0, exact.bed(place(chainage)), 5),
      ),
      upstream: { kind: 'inflow', ...steadyFlow(exact.flow) },
      downstream: fastOutlet
        ? { kind: 'open' }
        : { kind: 'stage', ...steadyStage(exact.depth(exact.to)) },
      initial: { kind: 'steady' },
      numerics: { cellSize, duration: name === 'D' ? 300 : 1200, outputInterval: 300 },
    }),
  );
  return { exact, cells: result.cells, place };
}

type Run = ReturnType<typeof settle>;

describe('steady flow of prescribed depth', () => {
  it.each<[MacDonaldCase, number, number[], number, number, number]>([
    // Case; length of C and D that the jump may disturb on either side (m); cell sizes; limits on the finest grid of the
    // mean error of depth elsewhere (m), of its order, and of the departure of the flow (relative). The limits of the
    // error are a quarter above what was measured; the flow in D goes on flickering, since a slope limiter switches
    // from step to step in the cells of the jump.
    ['A', 0, [40, 20, 10, 5], 1e-4, 1.8, 1e-8],
    ['B', 0, [40, 20, 10, 5], 1.5e-5, 1.8, 1e-8],
    ['C', 50, [40, 20, 10, 5], 1.5e-5, 1.7, 1e-7],
    ['D', 5, [4, 2, 1, 0.5], 6e-5, 1.4, 1.2e-5],
  ])('%s', (name, disturbed, sizes, limit, leastOrder, flowLimit) => {
    const runs = sizes.map((size) => settle(name, size));
    const { exact } = runs[0];
    const beside = (x: number) => x > 0 && Math.abs(x - (exact.jumpAt ?? -Infinity)) > disturbed;
    const depthError = ({ cells, place }: Run, within: (x: number) => boolean) =>
      errorNorms(
        cells.chainage,
        cells.finalDepth,
        (chainage) => exact.depth(place(chainage)),
        (chainage) => within(place(chainage)),
      ).mean;

    const grids = runs.map(({ cells }) => cells.chainage.length);
    const table = orderTable(`Prescribed depth ${name}`, grids, (count) =>
      depthError(runs[grids.indexOf(count)], beside),
    );
    expect(table.finest).toBeLessThan(limit);
    expect(table.order).toBeGreaterThan(leastOrder);

    const finest = runs[runs.length - 1];
    const departures = finest.cells.finalFlow.map((flow) => Math.abs(flow / exact.flow - 1));
    expect(Math.max(...departures)).toBeLessThan(flowLimit);
    if (exact.jumpAt !== null) {
      // All in all the jump is out of place by less than a cell.
      const height = exact.depth(exact.jumpAt + 1e-6) - exact.depth(exact.jumpAt);
      const cell = sizes[sizes.length - 1];
      expect(depthError(finest, (x) => x > 0)).toBeLessThan((height * cell) / exact.to);
    }
  });
});
