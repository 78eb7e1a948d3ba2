import { monoclinalWave } from '../../solvers/exact/monoclinalWave';
import { trapezoid } from '../../solvers/exact/prismaticSection';
import { caseOf, GRAVITY, sectionsAt, trapezoidChannel } from '../channels';
import type { PublishedCase } from '../publishedCase';

const [LENGTH, SLOPE, MANNING, BOTTOM, SIDE] = [12_000, 0.001, 0.03, 20, 2];
const [BEHIND, AHEAD] = [3, 1.5];
/** Where the middle of the front starts (m), and for how long it runs (s). */
const [START, DURATION] = [4000, 1800];

export const floodFront: PublishedCase = {
  id: 'flood-front',
  group: 'waves',
  title: 'Flood front of constant form',
  setup:
    `A flood raises the water from ${AHEAD} m to ${BEHIND} m in a trapezoidal channel ${BOTTOM} m wide at the bottom, with sides of ` +
    `1:${SIDE}, a slope of ${SLOPE} and Manning's n ${MANNING}. Between both uniform flows the surface keeps its form and moves at ` +
    'one speed. The hydrograph of the front is given at the inlet and its stage at the outlet; compared after half an hour.',
  source:
    'V. T. Chow (1959), Open-Channel Hydraulics, McGraw-Hill, uniformly progressive flow; F. M. Henderson (1966), Open Channel Flow, ' +
    'Macmillan, chapter 9 [chapters from memory]. The profile is integrated from its differential equation to 12 digits.',
  shows:
    'Water that rises, with friction, slope, thrust and inertia all in play: an exact answer to a flood itself.',
  doesNotShow: 'Sections that change along the reach, and a flood that flattens on its way.',
  boundReason:
    'A quarter above what was left when the bounds were set. Smooth flow must show the second order of the scheme; on the finest ' +
    'grid the tables of the section, good to some 1e-4 of the conveyance, already count.',
  grids: [60, 120, 240, 480],
  bounds: { stageL1: 2.6e-6, flowL1: 1.3e-4, stageOrder: 1.6, flowOrder: 1.6, volume: 1e-12 },
  problem: (cells) => {
    const wave = monoclinalWave(trapezoid(BOTTOM, SIDE), GRAVITY, MANNING, SLOPE, BEHIND, AHEAD);
    const bed = (x: number) => SLOPE * (LENGTH - x);
    const place = (x: number, time: number) => x - START - wave.speed * time;
    const stage = (x: number, time: number) => bed(x) + wave.depth(place(x, time));
    const flow = (x: number, time: number) => wave.flow(place(x, time));
    const times = Array.from({ length: cells + 1 }, (_, i) => (i * DURATION) / cells);
    const middles = Array.from({ length: cells }, (_, i) => ((i + 0.5) * LENGTH) / cells);
    const chainages = [0, ...middles, LENGTH];
    return {
      caseFile: caseOf('Flood front of constant form', {
        sections: sectionsAt([0, LENGTH], MANNING, (x) =>
          trapezoidChannel(BOTTOM, SIDE, bed(x), 8),
        ),
        upstream: { kind: 'inflow', times, flows: times.map((time) => flow(0, time)) },
        downstream: { kind: 'stage', times, stages: times.map((time) => stage(LENGTH, time)) },
        initial: {
          kind: 'profile',
          chainages,
          stages: chainages.map((x) => stage(x, 0)),
          flows: chainages.map((x) => flow(x, 0)),
        },
        numerics: { cellSize: LENGTH / cells, duration: DURATION, outputInterval: DURATION },
      }),
      exact: (x) => ({ stage: stage(x, DURATION), flow: flow(x, DURATION) }),
    };
  },
};
