import type { Upstream } from '../../../shared/case/caseFile';
import { trapezoid } from '../../solvers/exact/prismaticSection';
import { riemannProblem } from '../../solvers/exact/riemannProblem';
import { caseOf, GRAVITY, sectionsAt, steadyFlow, wideChannel } from '../channels';
import type { Bounds, PublishedCase } from '../publishedCase';

/** A channel of 50 m, here with 20 m more at both ends so that no end disturbs it. */
const LENGTH = 50;
const MARGIN = 20;
const WALL: Upstream = { kind: 'wall' };

interface TwoStates {
  number: number;
  title: string;
  what: string;
  /** Depth, m, and velocity, m/s. */
  left: [number, number];
  right: [number, number];
  middle: number;
  time: number;
  upstream?: Upstream;
  bounds: Bounds;
}

const inWords = ([depth, velocity]: [number, number]) =>
  depth === 0 ? 'dry bed' : `${depth} m at ${velocity} m/s`;

function twoStates(given: TwoStates): PublishedCase {
  const { number, what, left, right, middle, time, upstream = WALL, bounds } = given;
  const title = `Test ${number}: ${given.title}`;
  const state = ([depth, velocity]: [number, number]) => ({ depth, velocity });
  const exact = riemannProblem(trapezoid(1, 0), GRAVITY, state(left), state(right));
  const length = LENGTH + 2 * MARGIN;
  const at = MARGIN + middle;
  return {
    id: `states-${number}`,
    group: 'states',
    title,
    setup:
      `Two states side by side in a level frictionless channel of unit width: ${inWords(left)} on the left, ` +
      `${inWords(right)} on the right. Compared after ${time} s over the 50 m about them.`,
    source:
      'E. F. Toro (2001), Shock-Capturing Methods for Free-Surface Shallow Flows, Wiley, table of five tests [set-up from ' +
      'memory]; here with g = 9.81 m/s². Exact states recomputed to 30 digits.',
    shows: what,
    doesNotShow: 'Bed, friction and sections that change: each is in another case.',
    boundReason:
      'A quarter above what this solver left when the bounds were set. A plain second-order scheme with the same wave ' +
      'speeds leaves about as much on the finest grid.',
    grids: [100, 200, 400, 800].map((cells) => (cells * length) / LENGTH),
    bounds: { ...bounds, stageOrder: 0.85, flowOrder: 0.8, volume: 1e-12 },
    problem: (cells) => ({
      caseFile: caseOf(title, {
        sections: sectionsAt([0, length], 0, () => wideChannel(1, 0)),
        upstream,
        downstream: { kind: 'wall' },
        initial: {
          kind: 'profile',
          chainages: [0, at - 1e-6, at + 1e-6, length],
          stages: [left[0], left[0], right[0], right[0]],
          flows: [left, left, right, right].map(([depth, velocity]) => depth * velocity),
        },
        numerics: {
          cellSize: length / cells,
          duration: time,
          outputInterval: time,
          dryDepth: 1e-6,
        },
      }),
      from: MARGIN,
      to: MARGIN + LENGTH,
      exact: (x) => {
        const { depth, velocity } = exact.at((x - at) / time);
        return { stage: depth, flow: depth * velocity };
      },
    }),
  };
}

export const riemannTests: readonly PublishedCase[] = [
  twoStates({
    number: 1,
    title: 'sonic fan and shock',
    what: 'A fan that passes through critical flow opens without a false jump in it.',
    left: [1, 2.5],
    right: [0.1, 0],
    middle: 10,
    time: 7,
    upstream: { kind: 'inflow', ...steadyFlow(2.5) },
    bounds: { stageL1: 7.4e-4, flowL1: 2.95e-3 },
  }),
  twoStates({
    number: 2,
    title: 'two fans, nearly dry between',
    what: 'Water that parts leaves a thin film, and depths stay positive.',
    left: [1, -5],
    right: [1, 5],
    middle: 25,
    time: 2.5,
    bounds: { stageL1: 2.2e-3, flowL1: 9.9e-3 },
  }),
  twoStates({
    number: 3,
    title: 'dry below',
    what: 'A front over dry ground, downstream.',
    left: [1, 0],
    right: [0, 0],
    middle: 20,
    time: 4,
    bounds: { stageL1: 9.6e-4, flowL1: 2.55e-3 },
  }),
  twoStates({
    number: 4,
    title: 'dry above',
    what: 'The same front upstream: the scheme knows no direction.',
    left: [0, 0],
    right: [1, 0],
    middle: 30,
    time: 4,
    bounds: { stageL1: 9.6e-4, flowL1: 2.55e-3 },
  }),
  twoStates({
    number: 5,
    title: 'the bed falls dry between',
    what: 'Thin water that parts leaves dry ground behind, and no water is made there.',
    left: [0.1, -3],
    right: [0.1, 3],
    middle: 25,
    time: 5,
    bounds: { stageL1: 2.8e-4, flowL1: 6.7e-4 },
  }),
];
