import type { CaseFile } from '../../../shared/case/caseFile';
import { caseOf, sectionsAt, steadyFlow, wideChannel } from '../channels';
import type { Bounds, PublishedCase } from '../publishedCase';

/** One state runs into another behind a jump of speed S: S [h] = [hu], S [hu] = [h u² + g h²/2]. */
interface Bore {
  id: string;
  title: string;
  setup: string;
  source: string;
  shows: string;
  ends: Pick<CaseFile, 'upstream' | 'downstream'>;
  /** Depth, m, and flow, m³/s, in the unit width. */
  ahead: [number, number];
  behind: [number, number];
  /** m/s, downstream positive. */
  speed: number;
  /** Where it starts, m. */
  from: number;
  time: number;
  bounds: Bounds;
}

const LENGTH = 1000;

function bore(given: Bore): PublishedCase {
  const { id, title, setup, source, shows, ends, ahead, behind, speed, time, bounds } = given;
  const front = given.from + speed * time;
  return {
    id,
    group: 'waves',
    title,
    setup,
    source,
    shows,
    doesNotShow: 'The ripples on the back of a weak bore, which need a theory of short waves.',
    boundReason:
      'A quarter above what was left when the bounds were set; the largest difference stands in the cell of the front.',
    grids: [100, 200, 400, 800],
    bounds: { ...bounds, stageOrder: 0.7, flowOrder: 0.7, volume: 1e-12 },
    problem: (cells) => ({
      caseFile: caseOf(title, {
        sections: sectionsAt([0, LENGTH], 0, () => wideChannel(1, 0)),
        ...ends,
        initial: {
          kind: 'profile',
          chainages: [0, LENGTH],
          stages: [ahead[0], ahead[0]],
          flows: [ahead[1], ahead[1]],
        },
        numerics: { cellSize: LENGTH / cells, duration: time, outputInterval: time },
      }),
      exact: (x) => {
        const [stage, flow] = x < front === speed > 0 ? behind : ahead;
        return { stage, flow };
      },
    }),
  };
}

const SOURCE =
  'The jump conditions of mass and momentum: J. J. Stoker (1957), Water Waves, Interscience, chapter 10; V. T. Chow (1959), ' +
  'Open-Channel Hydraulics, McGraw-Hill, chapter 19. Values recomputed to 8 digits.';

export const bores: readonly PublishedCase[] = [
  bore({
    id: 'bore-inflow',
    title: 'A bore from a sudden inflow',
    setup:
      'Into still water 1 m deep in a level channel 5.4249424 m³/s run in at once: a bore of 2 m must run down at 5.4249424 m/s.',
    source: SOURCE,
    shows: 'The height and the speed of a bore that an inflow makes.',
    ends: { upstream: { kind: 'inflow', ...steadyFlow(5.4249424) }, downstream: { kind: 'wall' } },
    ahead: [1, 0],
    behind: [2, 5.4249424],
    speed: 5.4249424,
    from: 0,
    time: 110,
    bounds: { stageL1: 1.45e-3, flowL1: 7.9e-3 },
  }),
  bore({
    id: 'surge-gate',
    title: 'A surge from a closed gate',
    setup:
      'A gate closes at once on water 1.5 m deep that flows at 1 m/s: a surge of 1.914065 m must run up at 3.6226192 m/s.',
    source: SOURCE,
    shows: 'A wave that runs against the flow, and the wall that throws it back.',
    ends: { upstream: { kind: 'inflow', ...steadyFlow(1.5) }, downstream: { kind: 'wall' } },
    ahead: [1.5, 1.5],
    behind: [1.914065, 0],
    speed: -3.6226192,
    from: LENGTH,
    time: 140,
    bounds: { stageL1: 5.4e-4, flowL1: 2.2e-3 },
  }),
];
