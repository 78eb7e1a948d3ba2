import { gridConvergence } from '@/shared/confidence/gridConvergence';
import {
  buildCase,
  buildSection,
  steadyFlow,
  steadyStage,
  trapezoidPoints,
} from '../../helpers/solvers/caseBuilders';
import { routeChecked } from '../../helpers/solvers/routeChecked';

/** The grid convergence index (P. J. Roache 1994, J. Fluids Eng. 116, 405-413) on the solver itself, where the true error is
 *  known: backwater of V. T. Chow (1959), example 10-1, in SI with α = 1. Distance above the dam and depth (m), integrated apart
 *  from this program. */
const STATIONS: [number, number][] = [
  [200, 1.289271],
  [300, 1.198231],
  [400, 1.129632],
  [500, 1.08341],
  [600, 1.055548],
];
const LENGTH = 1200;

function depthsOn(cellSize: number, order: 1 | 2): number[] {
  const distances = [LENGTH, ...STATIONS.map(([distance]) => distance).reverse(), 0];
  const { sections } = routeChecked(
    buildCase({
      sections: distances.map((distance) =>
        buildSection(LENGTH - distance, trapezoidPoints(6.096, 2, 0.0016 * distance, 8), 0.025),
      ),
      upstream: { kind: 'inflow', ...steadyFlow(11.3267) },
      downstream: { kind: 'stage', ...steadyStage(1.524) },
      initial: { kind: 'steady' },
      numerics: { cellSize, duration: 2400, outputInterval: 2400, order },
    }),
  );
  return sections
    .slice(1, -1)
    .map(({ depth }) => depth[depth.length - 1])
    .reverse();
}

describe('the grid convergence index of the depth', () => {
  it.each<[1 | 2, [number, number, number]]>([
    [1, [10, 20, 40]],
    [2, [25, 50, 100]],
  ])('finds order %d on cells of %j m and covers the true error', (order, sizes) => {
    const grids = sizes.map((size) => depthsOn(size, order));
    STATIONS.forEach(([distance, exact], i) => {
      const values = grids.map((depths) => depths[i]) as [number, number, number];
      const found = gridConvergence(values, sizes);
      const error = Math.abs(values[0] - exact);
      expect(found.kind).toBe('monotone');
      expect(Math.abs(found.order! - order)).toBeLessThan(0.35);
      expect(error).toBeLessThan(found.gciFine! * values[0]);
      expect(Math.abs(found.extrapolated! - exact)).toBeLessThan(0.5 * error);
    });
  });
});
