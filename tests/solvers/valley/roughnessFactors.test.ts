import type { RoughnessFactor, SectionInput } from '@/shared/case/caseFile';
import { findRoot } from '@/server/solvers/exact/tools/findRoot';
import { solveOde } from '@/server/solvers/exact/tools/solveOde';
import {
  buildCase,
  buildSections,
  GRAVITY,
  openRectanglePoints,
  steadyFlow,
  steadyStage,
  trapezoidPoints,
} from '../../helpers/solvers/caseBuilders';
import { routeChecked } from '../../helpers/solvers/routeChecked';

const WIDTH = 40;
const LENGTH = 3000;
const SLOPE = 0.001;
const MANNING = 0.03;
const FLOW = 120;

/** A wide rectangle without walls: R is the depth. */
const wide = buildSections(0, LENGTH, 4, MANNING, (x) =>
  openRectanglePoints(WIDTH, SLOPE * (LENGTH - x)),
);

const over = (parts: Partial<RoughnessFactor>): RoughnessFactor => ({
  from: 0,
  to: LENGTH,
  part: 'all',
  depths: [0],
  factors: [1],
  ...parts,
});

function depths(sections: SectionInput[], factors: RoughnessFactor[], outlet?: number): number[] {
  const { cells } = routeChecked(
    buildCase({
      sections,
      upstream: { kind: 'inflow', ...steadyFlow(FLOW) },
      downstream:
        outlet === undefined
          ? { kind: 'normalDepth', slope: SLOPE }
          : { kind: 'stage', ...steadyStage(outlet) },
      initial: { kind: 'steady' },
      numerics: { cellSize: 25, duration: 600, outputInterval: 600 },
      roughnessFactors: factors,
    }),
  );
  expect(Math.max(...cells.finalFlow.map((q) => Math.abs(q / FLOW - 1)))).toBeLessThan(1e-7);
  return cells.finalDepth;
}

describe("factors of Manning's n", () => {
  it('n × 1.2 raises the uniform depth of a wide channel by 11.56 %', () => {
    // y ~ n^(3/5) at the same flow: 1.2^0.6 = 1.1156 (Manning's formula with R = y, computed).
    const before = depths(wide, []);
    const after = depths(wide, [over({ factors: [1.2] })]);
    after.forEach((depth, i) => expect(Math.abs(depth / before[i] - 1.1156)).toBeLessThan(2e-4));
  });

  it('several multiply', () => {
    const twice = depths(wide, [over({ factors: [1.5] }), over({ factors: [0.8] })]);
    expect(twice[60]).toBeCloseTo(depths(wide, [over({ factors: [1.2] })])[60], 10);
  });

  it('by depth: uniform depth is the root of Q = A R^(2/3) √S/(n f(y))', () => {
    const walled = buildSections(0, LENGTH, 2, MANNING, (x) =>
      trapezoidPoints(WIDTH, 0, SLOPE * (LENGTH - x), 6),
    );
    const factor = (y: number) => 1.6 + ((y - 1) / 2) * (0.9 - 1.6);
    const carried = (y: number) => {
      const area = WIDTH * y;
      return (area * (area / (WIDTH + 2 * y)) ** (2 / 3) * Math.sqrt(SLOPE)) / MANNING;
    };
    const exact = findRoot((y) => carried(y) / factor(y) - FLOW, 1, 3);
    const found = depths(walled, [over({ depths: [1, 3], factors: [1.6, 0.9] })]);
    // 0.1 mm: V = K/A is a quadratic within each of some fifty levels of the table.
    expect(Math.abs(found[60] - exact)).toBeLessThan(1e-4);
    // Beyond the given depths the factor is held.
    const held = depths(wide, [over({ depths: [0.2, 0.4], factors: [3, 1.2] })]);
    const constant = depths(wide, [over({ factors: [1.2] })])[60];
    expect(Math.abs(held[60] - constant)).toBeLessThan(1e-3);
  });

  it('on the overbank only: uniform stage of a compound section by its two conveyances', () => {
    const compound = [0, 1500, 3000].map((chainage): SectionInput => {
      const bed = SLOPE * (LENGTH - chainage);
      return {
        id: `C${chainage}`,
        chainage,
        points: [
          [0, bed + 6],
          [0, bed + 2],
          [60, bed + 2],
          [60, bed],
          [80, bed],
          [80, bed + 2],
          [140, bed + 2],
          [140, bed + 6],
        ],
        roughness: [
          [0, 0.05],
          [60, 0.03],
          [80, 0.05],
        ],
        banks: [60, 80],
      };
    });
    const stageFor = (overbank: number): number =>
      findRoot(
        (y) => {
          const channel = (20 * y * ((20 * y) / 24) ** (2 / 3)) / 0.03;
          const area = 60 * (y - 2);
          const plain = (area * (area / (58 + y)) ** (2 / 3)) / (0.05 * overbank);
          return (channel + 2 * plain) * Math.sqrt(SLOPE) - FLOW;
        },
        2,
        5,
      );
    const factors = [over({ part: 'overbank', depths: [0.5, 1.5], factors: [1.8, 1.8] })];
    expect(Math.abs(depths(compound, factors)[60] - stageFor(1.8))).toBeLessThan(2e-3);
    expect(Math.abs(depths(compound, [])[60] - stageFor(1))).toBeLessThan(2e-3);
    expect(stageFor(1.8) - stageFor(1)).toBeGreaterThan(0.1);
  });

  it('on a stretch: backwater through it against an integration of the profile', () => {
    // dy/dx = (S0 - Sf)/(1 - Fr²), Chow (1959) chapter 9, by the ODE solver of the tests; rough from 1000 to 2000 m.
    const factor = (y: number) => 2 - 0.4 * Math.min(3, Math.max(1, y));
    const q = FLOW / WIDTH;
    const rise =
      (isRough: boolean) =>
      (_x: number, y: number): number => {
        const n = MANNING * (isRough ? factor(y) : 1);
        const friction = (q * q * n * n) / y ** (10 / 3);
        return (SLOPE - friction) / (1 - (q * q) / (GRAVITY * y ** 3));
      };
    const atOutlet = 2.6;
    const at2000 = solveOde(rise(false), LENGTH, 2000, atOutlet);
    const found = depths(
      wide,
      [over({ from: 1000, to: 2000, depths: [1, 3], factors: [1.6, 0.8] })],
      atOutlet,
    );
    for (const chainage of [112.5, 612.5, 1112.5, 1612.5, 2112.5, 2612.5]) {
      const exact =
        chainage > 2000
          ? solveOde(rise(false), LENGTH, chainage, atOutlet)
          : chainage > 1000
            ? solveOde(rise(true), 2000, chainage, at2000)
            : solveOde(rise(false), 1000, chainage, solveOde(rise(true), 2000, 1000, at2000));
      // Where n jumps the surface has an edge within one cell.
      expect(Math.abs(found[Math.round((chainage - 12.5) / 25)] - exact)).toBeLessThan(1e-3);
    }
  });
});
