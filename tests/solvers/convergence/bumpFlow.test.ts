import { bumpFlow, type BumpRegime } from '@/server/solvers/exact/bumpFlow';
import {
  buildCase,
  buildSectionsAtCells,
  GRAVITY,
  openRectanglePoints,
  steadyFlow,
  steadyStage,
} from '../../helpers/solvers/caseBuilders';
import { errorNorms } from '../../helpers/solvers/errorNorms';
import { orderTable } from '../../helpers/solvers/orderTable';
import { routeChecked } from '../../helpers/solvers/routeChecked';

/** Frictionless flow over a bump, from still water until nothing moves any more. */
const GRIDS = [50, 100, 200];
/** Time until the flow is even, s. */
const SETTLED = { subcritical: 300, transcritical: 150, jump: 450 };

function settle(regime: BumpRegime, cells: number) {
  const exact = bumpFlow(regime, GRAVITY);
  const result = routeChecked(
    buildCase({
      sections: buildSectionsAtCells(exact.length, cells, 0, (x) =>
        openRectanglePoints(1, exact.bed(x)),
      ),
      upstream: { kind: 'inflow', ...steadyFlow(exact.flow) },
      // 0.66 m holds the transcritical flow only until it leaves supercritical.
      downstream: { kind: 'stage', ...steadyStage(exact.outletStage ?? 0.66) },
      initial: { kind: 'still', stage: exact.outletStage ?? 0.66 },
      numerics: { cellSize: exact.length / cells, duration: SETTLED[regime], outputInterval: 50 },
    }),
  );
  return { exact, cells: result.cells };
}

type Run = ReturnType<typeof settle>;

/** m of surface. */
function surfaceError({ exact, cells }: Run, within: (x: number) => boolean): number {
  const surface = (x: number) => exact.bed(x) + exact.depth(x);
  return errorNorms(cells.chainage, cells.finalStage, surface, within).mean;
}

describe('steady flow over a bump', () => {
  it.each<[BumpRegime, number, number, number]>([
    // Regime; limits on 200 cells of the mean error of the surface (m; beside the jump, if there is one), of its order,
    // and of the departure of the flow (relative). Half as much again as measured; friction or a bed step taken with
    // the wrong sign leaves centimetres.
    ['subcritical', 8e-5, 1.8, 1e-8],
    ['transcritical', 3.3e-4, 1.8, 1e-8],
    ['jump', 2e-4, 1.7, 5e-7],
  ])('%s', (regime, limit, leastOrder, flowLimit) => {
    const runs = GRIDS.map((count) => settle(regime, count));
    const { exact } = runs[0];
    const beside = (x: number) => Math.abs(x - (exact.jumpAt ?? -Infinity)) > 1;
    const table = orderTable(`Bump ${regime} surface`, GRIDS, (count) =>
      surfaceError(runs[GRIDS.indexOf(count)], beside),
    );
    expect(table.finest).toBeLessThan(limit);
    expect(table.order).toBeGreaterThan(leastOrder);
    const finest = runs[runs.length - 1];
    const departures = finest.cells.finalFlow.map((flow) => Math.abs(flow / exact.flow - 1));
    expect(Math.max(...departures)).toBeLessThan(flowLimit);
    if (exact.jumpAt !== null) {
      // All in all the jump is out of place by less than a cell.
      const height = exact.depth(exact.jumpAt + 1e-6) - exact.depth(exact.jumpAt - 1e-6);
      const cells = finest.cells.chainage.length;
      expect(surfaceError(finest, () => true)).toBeLessThan(height / cells);
    }
  });
});
