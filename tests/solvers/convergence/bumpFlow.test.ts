import { bumpFlow, type BumpRegime } from '@/server/solvers/exact/bumpFlow';
import {
  buildCase,
  buildSections,
  GRAVITY,
  openRectanglePoints,
  steadyFlow,
  steadyStage,
} from '../../helpers/solvers/caseBuilders';
import { errorNorms } from '../../helpers/solvers/errorNorms';
import { orderTable } from '../../helpers/solvers/orderTable';
import { routeChecked } from '../../helpers/solvers/routeChecked';

/** Frictionless flow over a bump, from still water until nothing moves any more. Sections lie at the middles of the
 *  cells of every grid, so that each cell has its exact bed. */
const GRIDS = [25, 50, 100, 200];
const SECTIONS = 401;

function settle(regime: BumpRegime, cells: number) {
  const exact = bumpFlow(regime, GRAVITY);
  const result = routeChecked(
    buildCase({
      sections: buildSections(0, exact.length, SECTIONS, 0, (x) =>
        openRectanglePoints(1, exact.bed(x)),
      ),
      upstream: { kind: 'inflow', ...steadyFlow(exact.flow) },
      downstream:
        exact.outletStage === null
          ? { kind: 'open' }
          : { kind: 'stage', ...steadyStage(exact.outletStage) },
      initial: { kind: 'still', stage: exact.outletStage ?? 0.66 },
      numerics: { cellSize: exact.length / cells, duration: 400, outputInterval: 400 },
    }),
  );
  return { exact, cells: result.cells };
}

describe('steady flow over a bump', () => {
  it.each<[BumpRegime, number, number, number]>([
    // Regime, mean error of the surface on 200 cells (m), least order, largest departure of the flow (relative).
    ['subcritical', 5e-5, 1.8, 1e-8],
    ['transcritical', 2.2e-4, 1.8, 1e-9],
    ['jump', 1.3e-4, 0.9, 1e-7],
  ])('%s', (regime, limit, leastOrder, flowLimit) => {
    let flowError = NaN;
    const table = orderTable(`Bump ${regime} surface`, GRIDS, (count) => {
      const { exact, cells } = settle(regime, count);
      flowError = Math.max(...cells.finalFlow.map((flow) => Math.abs(flow / exact.flow - 1)));
      const surface = (x: number) => exact.bed(x) + exact.depth(x);
      return errorNorms(cells.chainage, cells.finalStage, surface).mean;
    });
    expect(table.finest).toBeLessThan(limit);
    expect(table.order).toBeGreaterThan(leastOrder);
    expect(flowError).toBeLessThan(flowLimit);
  });

  it('puts the jump within a cell of its place', () => {
    const { exact, cells } = settle('jump', 200);
    const depthBehind = exact.depth(exact.jumpAt! + 1e-6);
    const depthBefore = exact.depth(exact.jumpAt! - 1e-6);
    const i = cells.finalDepth.findIndex(
      (depth, j) => cells.chainage[j] > 11 && depth > (depthBefore + depthBehind) / 2,
    );
    expect(Math.abs(cells.chainage[i] - exact.jumpAt!)).toBeLessThan(0.125);
  });
});
