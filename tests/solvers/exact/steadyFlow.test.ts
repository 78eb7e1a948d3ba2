import { surfaceProfile } from '@/server/solvers/exact/graduallyVariedFlow';
import { prismaticReach } from '@/server/solvers/exact/prismaticReach';
import { trapezoid } from '@/server/solvers/exact/prismaticSection';
import { solveOde } from '@/server/solvers/exact/tools/solveOde';
import { criticalDepth, normalDepth, sequentDepth } from '@/server/solvers/exact/uniformFlow';
import { Solver } from 'odex';

const G = 9.81;
const FOOT = 0.3048;

describe('normal and critical depth', () => {
  it.each([
    // b, z, Q, n, S0, y_n, y_c; computed apart from this program
    [6.096, 2, 11.3267, 0.025, 0.0016, 1.024454, 0.654712],
    [10, 2, 30, 0.013, 0.001, 1.091302, 0.911583], // Chaudhry, Open-Channel Flow: 1.09, 0.91 [from memory]
    [10, 0, 50, 0.03, 0.001, 3.084024, 1.365915],
    [3, 1.5, 12, 0.025, 0.0009, 1.73126, 0.99031],
    [0, 3, 5, 0.03, 0.002, 1.256458, 0.892507],
    [4, 0, 20, 0.02, 0.02, 0.948706, 1.365915],
  ])('b %f m, z %f, Q %f m³/s', (b, z, flow, manning, slope, normal, critical) => {
    const section = trapezoid(b, z);
    expect(normalDepth(section, manning, slope, flow)).toBeCloseTo(normal, 5);
    expect(criticalDepth(section, G, flow)).toBeCloseTo(critical, 5);
  });

  it("agrees with Chow's worked examples", () => {
    // Chow (1959), ex. 6-2 and 4-2: b 20 ft, z 2, S0 0.0016, n 0.025, 400 cfs: 3.36 ft and 2.15 ft [from memory].
    const section = trapezoid(20 * FOOT, 2);
    const flow = 400 * FOOT ** 3;
    expect(normalDepth(section, 0.025, 0.0016, flow) / FOOT).toBeCloseTo(3.36, 2);
    expect(criticalDepth(section, G, flow) / FOOT).toBeCloseTo(2.15, 2);
  });

  it.each([
    [5, 1, 20, 0.5, 1.9929432],
    [10, 2, 60, 0.8, 2.2081649],
    [0, 2, 10, 0.9, 2.0249439],
  ])('sequent depth, b %f m, z %f', (b, z, flow, before, after) => {
    const section = trapezoid(b, z);
    expect(sequentDepth(section, G, flow, before)).toBeCloseTo(after, 6);
    expect(sequentDepth(section, G, flow, after)).toBeCloseTo(before, 6);
  });
});

describe('gradually varied flow', () => {
  const depths = (
    reach: ReturnType<typeof prismaticReach>,
    slope: number,
    upstream: number[],
    depth: number,
  ) =>
    surfaceProfile(
      reach,
      G,
      upstream.map((x) => -x),
      depth,
    ).map((eta, i) => eta - slope * upstream[i]);

  it('is the backwater of Chow (1959), example 10-1, at fixed distances', () => {
    // The example in SI with α = 1; depths computed apart from this program from the exact integral.
    const reach = prismaticReach(trapezoid(6.096, 2), 0.025, 0.0016, () => 11.3267);
    const places = [0, 50, 100, 200, 300, 400, 500, 600, 800, 1000, 1200];
    const expected = [
      1.524, 1.460166, 1.399392, 1.289271, 1.198231, 1.129632, 1.08341, 1.055548, 1.03224, 1.026298,
      1.024885,
    ];
    const found = depths(reach, 0.0016, places, 1.524);
    found.forEach((depth, i) => expect(depth).toBeCloseTo(expected[i], 5));
  });

  it('is the drawdown to a free overfall', () => {
    const reach = prismaticReach(trapezoid(10, 0), 0.03, 0.001, () => 50);
    const expected = [1.37, 1.45845, 1.56535, 1.74107, 2.09812, 2.62148, 3.00592];
    const found = depths(reach, 0.001, [0, 1, 5, 20, 100, 500, 2000], 1.37);
    found.forEach((depth, i) => expect(depth).toBeCloseTo(expected[i], 4));
  });

  it('without friction keeps the energy, with lateral inflow the momentum equation', () => {
    const bump = prismaticReach(trapezoid(3, 0), 0, 0.01, () => 6);
    const [, below] = surfaceProfile(bump, G, [0, 40], 2);
    const head = (stage: number, depth: number) => stage + (6 / (3 * depth)) ** 2 / (2 * G);
    expect(head(below, below + 0.4)).toBeCloseTo(head(2, 2), 9);
    // Level, frictionless, Q = q x: Q²/(gA) + I1 is constant (Chow 1959, sec. 12-3).
    const collecting = prismaticReach(
      trapezoid(3, 0),
      0,
      0,
      (x) => 0.1 * x,
      () => 0.1,
    );
    const [, end] = surfaceProfile(collecting, G, [10, 50], 2);
    const force = (flow: number, depth: number) => flow ** 2 / (G * 3 * depth) + 1.5 * depth ** 2;
    expect(force(5, end)).toBeCloseTo(force(1, 2), 9);
    // Water that leaves sideways takes its own momentum, and the energy head of the rest stays.
    const losing = prismaticReach(
      trapezoid(3, 0),
      0,
      0,
      (x) => 6 - 0.1 * x,
      () => -0.1,
    );
    const [, left] = surfaceProfile(losing, G, [0, 40], 2);
    const energy = (flow: number, depth: number) => depth + (flow / (3 * depth)) ** 2 / (2 * G);
    expect(energy(2, left)).toBeCloseTo(energy(6, 2), 9);
  });
});

describe('the integrator', () => {
  it('agrees with an extrapolation method of another hand', () => {
    const slope = (x: number, y: number) => Math.cos(3 * x) - y * y;
    const solver = new Solver(1);
    solver.absoluteTolerance = 1e-12;
    solver.relativeTolerance = 1e-12;
    const { y } = solver.solve((x, [value]) => [slope(x, value)], 0, [0.3], 5);
    expect(solveOde(slope, 0, 5, 0.3)).toBeCloseTo(y[0], 9);
  });

  it('says where the equation is singular', () => {
    expect(() => solveOde((_x, y) => 1 / (1 - y), 0, 3, 0)).toThrow(/singular/);
  });
});
