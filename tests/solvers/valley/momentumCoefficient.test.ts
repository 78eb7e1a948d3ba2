import type { CaseFile, SectionInput } from '@/shared/case/caseFile';
import { createCellState } from '@/server/solvers/geometry/cellState';
import { createCellTables } from '@/server/solvers/geometry/cellTables';
import { shapedGrid } from '@/server/solvers/geometry/grid';
import { partedSweep } from '@/server/solvers/geometry/partedSweep';
import { ruledSurface, sectionAt } from '@/server/solvers/geometry/ruledSurface';
import { createSectionWaves } from '@/server/solvers/geometry/sectionWaves';
import { createWorkspace } from '@/server/solvers/workspace';
import { findRoot } from '@/server/solvers/exact/tools/findRoot';
import { solveOde } from '@/server/solvers/exact/tools/solveOde';
import { buildCase, GRAVITY, steadyFlow, steadyStage } from '../../helpers/solvers/caseBuilders';
import { naturalReach } from '../../helpers/solvers/naturalReach';
import { routeChecked } from '../../helpers/solvers/routeChecked';
import { compound } from '../unit/sections';

/** The compound section of the tables of published values: see beta below. */
const at = (chainage: number, bed: number): SectionInput => ({
  ...compound(),
  id: `C${chainage}`,
  chainage,
  points: compound().points.map(([x, z]) => [x, z + bed]),
});

/** By hand: channel 20 m wide in 3 m walls, n = 0.03; plains of 100 m on both sides, n = 0.06, outer walls wetted. */
function hand(stage: number) {
  const channel = 20 * stage;
  const plain = 100 * Math.max(0, stage - 3);
  const kc = (channel * (channel / (20 + 2 * Math.min(stage, 3))) ** (2 / 3)) / 0.03;
  const kp = plain > 0 ? (plain * (plain / (97 + stage)) ** (2 / 3)) / 0.06 : 0;
  const area = channel + 2 * plain;
  const k = kc + 2 * kp;
  const squares = kc ** 2 / channel + (plain > 0 ? (2 * kp ** 2) / plain : 0);
  return { area, k, beta: (area * squares) / k ** 2, width: stage > 3 ? 220 : 20 };
}

describe('the momentum coefficient of compound sections', () => {
  it.each([
    // stage, β: Chow (1959), chapter 2: β = Σ(K_k²/A_k)/(K²/A); values computed from it for this section.
    [2, 1],
    [3.5, 1.660896],
    [4, 1.58125],
    [5, 1.35791],
    [6, 1.247835],
  ])('at %d m is %d', (stage, beta) => {
    const shape = sectionAt(ruledSurface(compound(), compound()), 0);
    expect(partedSweep(shape, Float64Array.of(stage), true).beta[0]).toBeCloseTo(beta, 5);
    expect(partedSweep(shape, Float64Array.of(stage), false).beta[0]).toBe(1);
  });

  it('sets the waves: the eigenvalues of the Jacobian of the fluxes', () => {
    const numerics = { cellSize: 50, momentum: 'compound' } as CaseFile['numerics'];
    const grid = shapedGrid({ sections: [at(0, 0), at(100, 0)], numerics } as CaseFile);
    const workspace = createWorkspace(grid, GRAVITY, 1e-3);
    const tables = createCellTables(workspace);
    createCellState(workspace, tables);
    const waves = createSectionWaves(workspace, tables);
    for (const stage of [2.2, 3.4, 4.3, 6.5]) {
      const area = tables.areaAt(1, stage);
      const flow = 1.2 * area;
      // d/dA of βQ²/A + g I1 by differences at constant Q, and d/dQ; independent of how p is written.
      const force = (a: number, q: number) => {
        const eta = tables.stageOf(1, a);
        return waves.carriedAt(1, eta, a, q) + GRAVITY * tables.thrustAt(1, eta);
      };
      const h = 1e-5 * area;
      const byArea = (force(area + h, flow) - force(area - h, flow)) / (2 * h);
      const byFlow = (force(area, flow + h) - force(area, flow - h)) / (2 * h);
      const half = Math.sqrt((byFlow / 2) ** 2 + byArea);
      expect(waves.driftAt(1, stage, area, flow)).toBeCloseTo(byFlow / 2, 6);
      expect(waves.celerityAt(1, stage, area, flow)).toBeCloseTo(half, 4);
      // Critical is the flow whose wave stands.
      const critical = waves.criticalFlowAt(1, stage);
      expect(waves.driftAt(1, stage, area, critical)).toBeCloseTo(
        waves.celerityAt(1, stage, area, critical),
        6,
      );
    }
  });

  it('in a backwater against an integration of the profile with it', () => {
    // d(βQ²/A)/dx + gA dη/dx + gAQ²/K² = 0 in a prismatic reach: dy/dx = (S0 - Q²/K²)/(1 + Q² d(β/A)/dy /(gA)).
    const slope = 0.0006;
    const length = 4000;
    const flow = 300;
    const flux = (y: number) => hand(y).beta / hand(y).area;
    const rise = (_x: number, y: number): number => {
      const { area, k } = hand(y);
      const h = 1e-5;
      const growth = (flux(y + h) - flux(y - h)) / (2 * h);
      return (slope - (flow / k) ** 2) / (1 + (flow ** 2 * growth) / (GRAVITY * area));
    };
    const normal = findRoot((y) => hand(y).k * Math.sqrt(slope) - flow, 3.01, 9);
    const outlet = normal - 0.35;
    const steady = (momentum: 'uniform' | 'compound') =>
      routeChecked(
        buildCase({
          sections: [at(0, slope * length), at(length, 0)],
          upstream: { kind: 'inflow', ...steadyFlow(flow) },
          downstream: { kind: 'stage', ...steadyStage(outlet) },
          initial: { kind: 'steady' },
          numerics: { cellSize: 20, duration: 600, outputInterval: 600, momentum },
        }),
      ).cells;
    const withBeta = steady('compound');
    const without = steady('uniform');
    expect(Math.max(...withBeta.finalFlow.map((q) => Math.abs(q / flow - 1)))).toBeLessThan(1e-6);
    const places = [3990, 3910, 3710, 3310, 2510, 1010];
    const errors = places.map((x) => {
      const exact = solveOde(rise, length, x, outlet);
      return Math.abs(withBeta.finalDepth[(x - 10) / 20] - exact);
    });
    expect(Math.max(...errors)).toBeLessThan(2e-3);
    // Without β the drawdown at the outlet is told otherwise by more than that.
    const apart = withBeta.finalDepth.map((y, i) => Math.abs(y - without.finalDepth[i]));
    expect(Math.max(...apart)).toBeGreaterThan(5e-3);
  });

  it('leaves still water still', () => {
    const sections = naturalReach(11, { length: 2000, spacing: 200, slope: 0.002 });
    for (const stage of [1.5, 4.5]) {
      const { cells } = routeChecked(
        buildCase({
          sections,
          upstream: { kind: 'wall' },
          downstream: { kind: 'wall' },
          initial: { kind: 'still', stage },
          numerics: { cellSize: 25, duration: 900, outputInterval: 900, momentum: 'compound' },
        }),
      );
      const moved = cells.finalStage.map((eta, i) => Math.abs(eta - cells.initialStage[i]));
      expect(Math.max(...moved)).toBeLessThan(1e-12);
      expect(Math.max(...cells.peakFlow.map(Math.abs))).toBeLessThan(1e-9);
    }
  });
});
