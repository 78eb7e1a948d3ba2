import { macDonald, type MacDonaldCase } from '@/server/solvers/exact/macDonald';
import {
  buildCase,
  buildSections,
  GRAVITY,
  steadyFlow,
  steadyStage,
  trapezoidPoints,
} from '../../helpers/solvers/caseBuilders';
import { errorNorms } from '../../helpers/solvers/errorNorms';
import { orderTable } from '../../helpers/solvers/orderTable';
import { routeChecked } from '../../helpers/solvers/routeChecked';

/** Steady flow with Manning friction on a bed made for a known depth. Sections at the middles of the finest cells,
 *  2.5 m or 0.25 m apart. */
function settle(name: MacDonaldCase, cellSize: number) {
  const exact = macDonald(name, GRAVITY);
  const length = exact.to - exact.from;
  const spacing = name === 'D' ? 0.25 : 2.5;
  const place = (chainage: number) => exact.from + chainage;
  const fastOutlet = name === 'B';
  const result = routeChecked(
    buildCase({
      sections: buildSections(0, length, length / spacing + 1, exact.manning, (chainage) =>
        trapezoidPoints(exact.width, 0, exact.bed(place(chainage)), 5),
      ),
      upstream: { kind: 'inflow', ...steadyFlow(exact.flow) },
      downstream: fastOutlet
        ? { kind: 'open' }
        : { kind: 'stage', ...steadyStage(exact.depth(exact.to)) },
      initial: { kind: 'steady' },
      numerics: { cellSize, duration: 1200, outputInterval: 1200 },
    }),
  );
  return { exact, cells: result.cells, place };
}

describe('steady flow of prescribed depth', () => {
  it.each<[MacDonaldCase, number[], number, number, number]>([
    // Case, cell sizes, mean error of depth on the finest (m), least order, departure of the flow (relative).
    ['A', [40, 20, 10, 5], 1e-4, 1.8, 1e-8],
    ['B', [40, 20, 10, 5], 1e-4, 1.8, 1e-8],
    ['C', [40, 20, 10, 5], 1e-3, 0.9, 1e-7],
    ['D', [4, 2, 1, 0.5], 5e-3, 0.9, 1e-7],
  ])('%s', (name, sizes, limit, leastOrder, flowLimit) => {
    let flowError = NaN;
    const grids = sizes.map((size) => (name === 'D' ? 100 : 1000) / size);
    const table = orderTable(`Prescribed depth ${name}`, grids, (count) => {
      const { exact, cells, place } = settle(name, (name === 'D' ? 100 : 1000) / count);
      flowError = Math.max(...cells.finalFlow.map((flow) => Math.abs(flow / exact.flow - 1)));
      const depth = (chainage: number) => exact.depth(place(chainage));
      return errorNorms(cells.chainage, cells.finalDepth, depth, (x) => place(x) > 0).mean;
    });
    expect(table.finest).toBeLessThan(limit);
    expect(table.order).toBeGreaterThan(leastOrder);
    expect(flowError).toBeLessThan(flowLimit);
  });
});
