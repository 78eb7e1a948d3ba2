import type { BreachInput } from '../../../shared/case/structures';
import { caseOf, sectionsAt, trapezoidChannel } from '../channels';
import type { PublishedCase } from '../publishedCase';

/** 1 km² of pool, 10 m over the sill; the breach grows to 50 m in half an hour; Q = 1.7 b h^1.5. */
const SURFACE = 1e6;
const SILL = 20;
const HEAD = 10;
const WIDTH = 50;
const GROWTH = 1800;
const WEIR = 1.7;
const DURATION = 14_400;
const LENGTH = 2000;

/** ∫ b dt, m·s: the width grows evenly, then stays. */
const opened = (time: number) =>
  time < GROWTH ? (WIDTH * time * time) / (2 * GROWTH) : WIDTH * (time - GROWTH / 2);
const head = (time: number) => (HEAD ** -0.5 + (WEIR * opened(time)) / (2 * SURFACE)) ** -2;
const flow = (time: number) => WEIR * WIDTH * Math.min(1, time / GROWTH) * head(time) ** 1.5;

const dam: BreachInput = {
  kind: 'breach',
  id: 'dam',
  chainage: 0,
  crest: [
    [0, 30],
    [200, 30],
  ],
  trigger: { kind: 'time', time: 0 },
  mode: 'overtopping',
  growth: 'linear',
  formationTime: GROWTH,
  bottomWidth: WIDTH,
  bottomLevel: SILL,
  startLevel: SILL,
  sideSlope: 0,
  weirCoefficient: WEIR,
};

export const levelPoolBreach: PublishedCase = {
  id: 'pool-breach',
  group: 'waves',
  title: 'A breach that grows in the dam of a pool',
  setup:
    'A rectangular breach opens from nothing to 50 m in half an hour down to a sill 10 m below a pool of 1 km²; the reach lies far ' +
    'below. Stage of the pool and flow through the breach for four hours.',
  source:
    'Level-pool routing with the law of the broad-crested weir, Q = 1.7 b h√h, in V. T. Chow, D. R. Maidment and L. W. Mays ' +
    '(1988), Applied Hydrology, McGraw-Hill, section 8.2 [reference from memory]; with b = b1 t/t_f in closed form, 1/√h = 1/√h₀ + ' +
    'C ∫b dt/(2 A), h over the sill.',
  shows: 'The peak of the flow out of a failing dam, its time, and the emptying of the pool.',
  doesNotShow:
    'How wide a real breach becomes, and how fast: that is the largest uncertainty of a dam-break study. Tailwater that drowns ' +
    'the breach.',
  boundReason:
    'A thousandth of the head and of the peak flow. The pool has no cells: the steps of time leave what is left.',
  grids: [20, 40, 80],
  bounds: { stageMax: 1e-3 * HEAD, flowMax: 1.9, volume: 1e-12 },
  problem: (cells) => ({
    caseFile: caseOf('A breach that grows in the dam of a pool', {
      sections: sectionsAt([0, LENGTH], 0.03, (x) =>
        trapezoidChannel(200, 0, -10 - (10 * x) / LENGTH, 20),
      ),
      structures: [dam],
      upstream: {
        kind: 'reservoir',
        stages: [SILL, SILL + 20],
        volumes: [0, 20 * SURFACE],
        initialStage: SILL + HEAD,
        inflow: { times: [0], flows: [0] },
      },
      downstream: { kind: 'criticalDepth' },
      initial: { kind: 'still', stage: -50 },
      numerics: { cellSize: LENGTH / cells, duration: DURATION, outputInterval: 100 },
    }),
    read: ({ times, reservoir, structures }) => ({
      along: 'time',
      at: times,
      bed: null,
      stage: reservoir!.stage,
      flow: structures!.find(({ id }) => id === dam.id)!.flow,
    }),
    exact: (time) => ({ stage: SILL + head(time), flow: flow(time) }),
  }),
};
