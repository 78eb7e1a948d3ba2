import {
  parabola,
  trapezoid,
  type PrismaticSection,
} from '@/server/solvers/exact/prismaticSection';
import {
  riemannProblem,
  type FlowState,
  type RiemannSolution,
} from '@/server/solvers/exact/riemannProblem';
import { riemannVariable, waveSpeed } from '@/server/solvers/exact/waveSpeed';
import { seededRandom } from '../../helpers/solvers/seededRandom';

/** The five tests of E. F. Toro (2001), Shock-Capturing Methods for Free-Surface Shallow Flows, Wiley: initial
 *  data from memory; states, speeds and profiles computed apart from this program to 8 digits. */
const rectangle = trapezoid(1, 0);
const state = (depth: number, velocity: number): FlowState => ({ depth, velocity });
const TESTS = {
  1: [state(1, 2.5), state(0.1, 0), 10, 7],
  2: [state(1, -5), state(1, 5), 25, 2.5],
  3: [state(1, 0), state(0, 0), 20, 4],
  4: [state(0, 0), state(1, 0), 30, 4],
  5: [state(0.1, -3), state(0.1, 3), 25, 5],
} as const;
type TestNumber = keyof typeof TESTS;
const solveTest = (n: TestNumber, g: number) =>
  riemannProblem(rectangle, g, TESTS[n][0], TESTS[n][1]);

describe("Toro's tests", () => {
  it.each([
    [1, 9.8, 0.6117528, 3.8639801, -0.63049517, 1.4154749, 4.6190282, 4.6190282],
    [2, 9.8, 0.04056369, 0, -8.1304952, -0.63049517, 0.63049517, 8.1304952],
    [1, 9.81, 0.61163807, 3.8651352, -0.63209195, 1.4156109, 4.6205785, 4.6205785],
    [2, 9.81, 0.040727853, 0, -8.132092, -0.63209195, 0.63209195, 8.132092],
  ])('%d with g = %f: star state and wave speeds', (n, g, depth, velocity, ...edges) => {
    const { star, leftWave, rightWave } = solveTest(n as TestNumber, g);
    expect(star!.depth).toBeCloseTo(depth, 7);
    expect(star!.velocity).toBeCloseTo(velocity, 6);
    [...leftWave!, ...rightWave!].forEach((edge, i) => expect(edge).toBeCloseTo(edges[i], 6));
  });

  it('finds the dry places of tests 3, 4 and 5', () => {
    for (const n of [3, 4, 5] as const) expect(solveTest(n, 9.81).star).toBeNull();
    expect(solveTest(4, 9.81).rightWave![0]).toBeCloseTo(-6.2641839, 6);
    expect(solveTest(5, 9.81).leftWave![1]).toBeCloseTo(-1.0190911, 6);
    expect(solveTest(5, 9.81).rightWave![0]).toBeCloseTo(1.0190911, 6);
  });

  it.each([
    [1, 10, 0.86998436, 2.9213946],
    [1, 15, 0.7339547, 3.3975851],
    [1, 35, 0.61163807, 3.8651352],
    [1, 45, 0.1, 0],
    [2, 5, 0.97208181, -4.9119387],
    [2, 22.5, 0.058064659, -0.24527203],
    [2, 35, 0.31387057, 2.245272],
    [3, 25, 0.28476657, 2.9213946],
    [3, 44, 0.00079049876, 6.0880613],
    [4, 6, 0.00079049876, -6.0880613],
    [4, 40, 0.8699843, -0.42139464],
    [5, 6, 0.087591508, -2.8730304],
    [5, 25, 0, 0],
    [5, 44, 0.087591508, 2.8730304],
  ])('%d at x = %f m', (n, x, depth, velocity) => {
    const [, , dam, time] = TESTS[n as TestNumber];
    const found = solveTest(n as TestNumber, 9.81).at((x - dam) / time);
    expect(found.depth).toBeCloseTo(depth, 6);
    expect(found.velocity).toBeCloseTo(velocity, 6);
  });
});

/** Mass and momentum flow into a shock as they flow out, whatever the section; fans keep u ± ω and move at
 *  u ± c. These hold the solver to the equations, with no formula in common with it but the section's. */
describe('any section, random states', () => {
  const random = seededRandom(11);
  const sections = [trapezoid(4, 0), trapezoid(0, 1.5), trapezoid(6, 2.5), parabola(3)];
  const cases = Array.from({ length: 60 }, (_, i) => ({
    section: sections[i % sections.length],
    left: state(0.2 + 5 * random(), 8 * random() - 4),
    right: state(0.2 + 5 * random(), 8 * random() - 4),
  }));
  const G = 9.81;

  it('meets jump conditions at shocks and invariants in fans', () => {
    let shocks = 0;
    let fans = 0;
    for (const { section, left, right } of cases) {
      const solution = riemannProblem(section, G, left, right);
      for (const [side, edges, sign] of [
        [left, solution.leftWave!, 1],
        [right, solution.rightWave!, -1],
      ] as const) {
        if (edges[0] === edges[1]) {
          shocks++;
          checkShock(section, side, solution.star!, edges[0]);
        } else {
          fans++;
          checkFan(section, side, solution, edges, sign);
        }
      }
    }
    expect(shocks).toBeGreaterThan(30);
    expect(fans).toBeGreaterThan(30);
  });

  function checkShock(section: PrismaticSection, a: FlowState, b: FlowState, speed: number) {
    const flux = ({ depth, velocity }: FlowState) => {
      const area = section.area(depth);
      return [
        area * (velocity - speed),
        area * velocity * (velocity - speed) + G * section.thrust(depth),
      ];
    };
    const scale = G * section.thrust(b.depth);
    expect(Math.abs(flux(a)[0] - flux(b)[0])).toBeLessThan(1e-11 * scale);
    expect(Math.abs(flux(a)[1] - flux(b)[1])).toBeLessThan(1e-11 * scale);
    expect(b.depth).toBeGreaterThan(a.depth);
  }

  function checkFan(
    section: PrismaticSection,
    side: FlowState,
    solution: RiemannSolution,
    edges: readonly [number, number],
    sign: 1 | -1,
  ) {
    const invariant = (s: FlowState) => s.velocity + sign * riemannVariable(section, G, s.depth);
    for (const part of [0.1, 0.5, 0.9]) {
      const speed = edges[0] + part * (edges[1] - edges[0]);
      const inside = solution.at(speed);
      expect(inside.velocity - sign * waveSpeed(section, G, inside.depth)).toBeCloseTo(speed, 9);
      expect(invariant(inside)).toBeCloseTo(invariant(side), 9);
    }
    if (solution.star) expect(invariant(solution.star)).toBeCloseTo(invariant(side), 9);
  }

  it('is its own mirror image', () => {
    const mirror = ({ depth, velocity }: FlowState) => state(depth, -velocity);
    for (const { section, left, right } of cases) {
      const there = riemannProblem(section, G, left, right);
      const back = riemannProblem(section, G, mirror(right), mirror(left));
      for (const speed of [-7.3, -2.1, 0.4, 3.3, 9.1]) {
        expect(back.at(-speed).depth).toBeCloseTo(there.at(speed).depth, 9);
        expect(back.at(-speed).velocity).toBeCloseTo(-there.at(speed).velocity, 9);
      }
    }
  });
});
