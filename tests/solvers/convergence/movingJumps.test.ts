import { trapezoid } from '@/server/solvers/exact/prismaticSection';
import {
  buildCase,
  buildSections,
  GRAVITY,
  steadyFlow,
  trapezoidPoints,
} from '../../helpers/solvers/caseBuilders';
import { routeChecked } from '../../helpers/solvers/routeChecked';

/** A jump that moves keeps volume and momentum, which gives its speed: S = [Q]/[A] = [Q u + g I1]/[Q] (Rankine and
 *  Hugoniot; V. T. Chow 1959, ch. 19; J. J. Stoker 1957, sec. 10.7). A scheme that does not conserve both moves it at
 *  another speed. Level frictionless channel, the jump alone between two even states, far from both ends. */
const LENGTH = 1200;
const CELL = 3;
const PATH = 300;

interface Shape {
  bottom: number;
  side: number;
}
const RECTANGLE: Shape = { bottom: 1, side: 0 };
const TRAPEZOID: Shape = { bottom: 10, side: 2 };
const TRIANGLE: Shape = { bottom: 0, side: 2 };

/** Velocity behind and speed of a jump that runs downstream into depth h1 at velocity u1, depth h2 > h1 behind it. */
function jumpInto({ bottom, side }: Shape, h1: number, u1: number, h2: number) {
  const section = trapezoid(bottom, side);
  const [a1, a2] = [section.area(h1), section.area(h2)];
  const thrust = GRAVITY * (section.thrust(h2) - section.thrust(h1));
  const u2 = u1 + Math.sqrt((thrust * (a2 - a1)) / (a1 * a2));
  return { u2, speed: (a2 * u2 - a1 * u1) / (a2 - a1) };
}

/** Routes the jump from its initial place over PATH metres, outputs on the way; its measured speed (m/s) between the first
 *  and the last output, and the state left behind at the end. */
function follow(shape: Shape, h1: number, u1: number, h2: number, upstream: boolean) {
  const { u2, speed } = jumpInto(shape, h1, u1, h2);
  const area = trapezoid(shape.bottom, shape.side).area;
  const start = LENGTH / 2 - (upstream ? -1 : 1) * (PATH / 2);
  const [behind, ahead] = [
    { stage: h2, flow: area(h2) * u2 },
    { stage: h1, flow: area(h1) * u1 },
  ];
  const states = upstream
    ? [ahead, behind].map(({ stage, flow }) => ({ stage, flow: -flow }))
    : [behind, ahead];
  const duration = PATH / Math.abs(speed);
  const places: number[] = [];
  const middle = (h1 + h2) / 2;
  const { cells } = routeChecked(
    buildCase({
      sections: buildSections(0, LENGTH, 2, 0, () =>
        trapezoidPoints(shape.bottom, shape.side, 0, 2 * h2),
      ),
      upstream: u1 === 0 ? { kind: 'wall' } : { kind: 'inflow', ...steadyFlow(-ahead.flow) },
      downstream: { kind: 'wall' },
      initial: {
        kind: 'profile',
        chainages: [0, start - 1e-6, start + 1e-6, LENGTH],
        stages: [states[0], states[0], states[1], states[1]].map(({ stage }) => stage),
        flows: [states[0], states[0], states[1], states[1]].map(({ flow }) => flow),
      },
      numerics: { cellSize: CELL, duration, outputInterval: duration / 4 },
    }),
    {
      // The jump is where the stage crosses the mean of both sides, nearest to where it should be.
      onOutput: ({ stage, time }) => {
        const expected = start + (upstream ? -1 : 1) * speed * time;
        let place = NaN;
        for (let i = 1; i < stage.length; i++) {
          const share = (middle - stage[i - 1]) / (stage[i] - stage[i - 1]);
          if (!(share >= 0 && share < 1)) continue;
          const x = (i - 0.5 + share) * CELL;
          if (!(Math.abs(place - expected) < Math.abs(x - expected))) place = x;
        }
        places.push(place);
      },
    },
  );
  const measured = (places[4] - places[1]) / (duration * 0.75);
  const wanted = (upstream ? -1 : 1) * speed;
  const end = start + (upstream ? -PATH : PATH);
  const near = cells.chainage.findIndex((x) => x > end + (upstream ? 40 : -40));
  return {
    measured,
    wanted,
    speed,
    u2,
    depth: cells.finalDepth[near],
    flow: cells.finalFlow[near],
  };
}

describe('a moving jump', () => {
  // Into still water: depth ahead and behind, speed, velocity behind; computed apart from this program to 8 digits.
  const BORES: [number, number, number, number][] = [
    [1, 1.2, 3.5984997, 0.59974995],
    [1, 2, 5.4249424, 2.7124712],
    [2, 3, 6.06527, 2.0217567],
    [0.5, 2, 7.0035705, 5.2526779],
    [0.1, 0.4, 3.132092, 2.349069],
  ];
  it.each(BORES)('from %f m to %f m runs at %f m/s, both ways', (h1, h2, speed, u2) => {
    for (const upstream of [false, true]) {
      const found = follow(RECTANGLE, h1, 0, h2, upstream);
      expect(found.speed).toBeCloseTo(speed, 6);
      expect(found.u2).toBeCloseTo(u2, 6);
      // Half as much again as measured: a twentieth of a cell over 225 m.
      expect(Math.abs(found.measured / found.wanted - 1)).toBeLessThan(8e-4);
      expect(Math.abs(found.depth / h2 - 1)).toBeLessThan(2e-3);
      expect(Math.abs(Math.abs(found.flow / (h2 * u2)) - 1)).toBeLessThan(2e-3);
    }
  });

  // Surges that a gate sends upstream when it closes, wholly or in part: depth and velocity before, velocity and depth
  // after, speed upstream; computed apart from this program. Seen from a moving frame they are bores.
  it.each([
    [1.5, 1, 0, 1.914065, 3.6226192],
    [2, 2, 0, 2.9884767, 4.0466304],
    [2, 2, 1, 2.4748777, 3.2116107],
    [3, 1.5, 0.5, 3.5767392, 4.7016581],
  ])('runs up against %f m at %f m/s that is slowed to %f m/s', (h1, v1, v2, h2, speed) => {
    const found = follow(RECTANGLE, h1, -v1, h2, true);
    expect(found.u2).toBeCloseTo(-v2, 6);
    expect(found.speed).toBeCloseTo(speed, 6);
    expect(Math.abs(found.measured / found.wanted - 1)).toBeLessThan(8e-4);
  });

  it.each<[string, Shape, number, number]>([
    ['trapezoid', TRAPEZOID, 1, 2],
    ['triangle', TRIANGLE, 2, 3],
  ])('in a %s runs at [Q]/[A]', (_name, shape, h1, h2) => {
    for (const upstream of [false, true]) {
      const found = follow(shape, h1, 0, h2, upstream);
      expect(Math.abs(found.measured / found.wanted - 1)).toBeLessThan(8e-4);
      expect(Math.abs(found.depth / h2 - 1)).toBeLessThan(2e-3);
    }
  });
});
