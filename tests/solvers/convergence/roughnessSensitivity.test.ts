import type { RoughnessFactor } from '@/shared/case/caseFile';
import {
  buildCase,
  buildSections,
  GRAVITY,
  openRectanglePoints,
  steadyFlow,
} from '../../helpers/solvers/caseBuilders';
import { routeChecked } from '../../helpers/solvers/routeChecked';

/** What a change of Manning's n does to uniform flow in a wide channel: depth ~ n^0.6, velocity and celerity ~ n^-0.6 (Manning's
 *  formula with R = h); the shares were computed apart from this program. Runs with n ± 20 % are common practice. */
const [LENGTH, SLOPE, FLOW, MANNING] = [2000, 0.001, 2, 0.03];

function uniform(manning: number, roughnessFactors?: RoughnessFactor[]) {
  const { cells } = routeChecked(
    buildCase({
      sections: buildSections(0, LENGTH, 2, manning, (x) =>
        openRectanglePoints(1, SLOPE * (LENGTH - x)),
      ),
      upstream: { kind: 'inflow', ...steadyFlow(FLOW) },
      downstream: { kind: 'normalDepth', slope: SLOPE },
      ...(roughnessFactors ? { roughnessFactors } : {}),
      initial: { kind: 'steady' },
      numerics: { cellSize: 50, duration: 600, outputInterval: 600 },
    }),
  );
  const middle = cells.finalDepth.length / 2;
  const depth = cells.finalDepth[middle];
  return { depth, velocity: cells.finalFlow[middle] / depth };
}

describe('uniform flow with another roughness', () => {
  const base = uniform(MANNING);

  it('stands at (n q/√S)^0.6 with the roughness as given', () => {
    expect(Math.abs(base.depth / ((MANNING * FLOW) / Math.sqrt(SLOPE)) ** 0.6 - 1)).toBeLessThan(
      3e-4,
    );
    expect(base.velocity / Math.sqrt(GRAVITY * base.depth)).toBeCloseTo(0.35881, 3);
  });

  it.each([
    [-30, -19.27, 23.86],
    [-20, -12.53, 14.33],
    [-10, -6.13, 6.53],
    [10, 5.89, -5.56],
    [20, 11.56, -10.36],
    [30, 17.05, -14.57],
    [50, 27.54, -21.59],
  ])('%d %% of n: %f %% of depth, %f %% of velocity', (change, deeper, faster) => {
    const factor = 1 + change / 100;
    const given = uniform(MANNING * factor);
    const multiplied = uniform(MANNING, [
      { from: 0, to: LENGTH, part: 'all', depths: [0], factors: [factor] },
    ]);
    for (const { depth, velocity } of [given, multiplied]) {
      expect(Math.abs(100 * (depth / base.depth - 1) - deeper)).toBeLessThan(0.03);
      expect(Math.abs(100 * (velocity / base.velocity - 1) - faster)).toBeLessThan(0.03);
    }
  });
});
