import { caseOf, sectionsAt, wideChannel } from '../channels';
import type { PublishedCase } from '../publishedCase';

/** Q = C b h^1.5, m³/s, with the volume 2e4 m x 50 m = 1e6 m² of surface. */
const WEIR = 1.7 * 50;
const SURFACE = 1e6;
const LENGTH = 50;
const START = 10;
const DURATION = 7200;

const head = (time: number) => (START ** -0.5 + (WEIR * time) / (2 * SURFACE)) ** -2;

export const poolOverWeir: PublishedCase = {
  id: 'pool-weir',
  group: 'waves',
  title: 'A pool that empties over a weir',
  setup:
    'A pool of 1 km² with 10 m over the crest of a weir 50 m long, Q = 1.7 b h√h as the rating of the outlet; stage and flow until ' +
    'two hours after its opening.',
  source:
    'Level-pool routing, in V. T. Chow, D. R. Maidment and L. W. Mays (1988), Applied Hydrology, McGraw-Hill, section 8.2 ' +
    '[reference from memory]; with this rating in closed form, 1/√h = 1/√h₀ + C b t/(2 A).',
  shows: 'Storage and a rating over hours: the volume that leaves, and when.',
  doesNotShow: 'The slope of the water in a long reservoir.',
  boundReason:
    'Half a thousandth of the head at the start. What is left is the swaying of the pool from its sudden opening, which finer cells ' +
    'damp less; it is compared from half an hour on.',
  grids: [5, 10, 20],
  bounds: { stageMax: 5e-3, flowMax: 2, volume: 1e-12 },
  problem: (cells) => ({
    caseFile: caseOf('A pool that empties over a weir', {
      sections: sectionsAt([0, LENGTH], 0, () => wideChannel(SURFACE / LENGTH, 0)),
      upstream: { kind: 'wall' },
      downstream: {
        kind: 'rating',
        stages: Array.from({ length: 1001 }, (_, i) => i / 100),
        flows: Array.from({ length: 1001 }, (_, i) => WEIR * (i / 100) ** 1.5),
      },
      initial: { kind: 'still', stage: START },
      numerics: { cellSize: LENGTH / cells, duration: DURATION, outputInterval: 300 },
    }),
    read: ({ sections, times }) => {
      const outlet = sections[sections.length - 1];
      return { along: 'time', at: times, bed: null, stage: outlet.stage, flow: outlet.flow };
    },
    from: 1800,
    exact: (time) => ({ stage: head(time), flow: WEIR * head(time) ** 1.5 }),
  }),
};
