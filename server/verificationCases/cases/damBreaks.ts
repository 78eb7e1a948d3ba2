import { damBreak } from '../../solvers/exact/damBreak';
import { trapezoid } from '../../solvers/exact/prismaticSection';
import { caseOf, GRAVITY, sectionsAt, trapezoidChannel, wideChannel } from '../channels';
import type { Bounds, PublishedCase } from '../publishedCase';

/** Sudden and total failure in a level frictionless channel of 1 km, dam in the middle, before a wave meets an end. */
const DAM = 500;

const RITTER =
  'A. Ritter (1892), Die Fortpflanzung der Wasserwellen, Zeitschrift des VDI 36(33), 947-954.';
const STOKER = 'J. J. Stoker (1957), Water Waves, Interscience, section 10.8.';
const ANY_SECTION =
  'For sections that are no rectangle the wave speed and the thrust of the section stand in place of those of the ' +
  'rectangle; states recomputed to 30 digits.';

interface Failure {
  id: string;
  title: string;
  bottom: number;
  side: number;
  above: number;
  /** 0: dry. */
  below: number;
  time: number;
  bounds: Bounds;
}

function failure({ id, title, bottom, side, above, below, time, bounds }: Failure): PublishedCase {
  const section = trapezoid(bottom, side);
  const isRectangle = side === 0;
  const exact = damBreak(section, GRAVITY, above, below);
  const shape = isRectangle
    ? 'rectangular channel of unit width'
    : bottom === 0
      ? `triangular channel with sides of 1:${side}`
      : `trapezoidal channel, ${bottom} m wide at the bottom, with sides of 1:${side}`;
  return {
    id,
    group: 'dam',
    title,
    setup:
      `A dam in the middle of a level, frictionless ${shape}, 1 km long, is gone at once. Above it stand ` +
      `${above} m of water, below it ${below > 0 ? `${below} m` : 'none'}. Compared ${time} s later.`,
    source: [below > 0 ? STOKER : RITTER, isRectangle ? '' : ANY_SECTION].filter(Boolean).join(' '),
    shows:
      below > 0
        ? 'The height and the speed of the bore, and the fan of lowered water behind it.'
        : 'How water runs out over dry ground, and the flow at the dam, which stays the same for all time.',
    doesNotShow:
      'Friction, which holds back the tip of a real wave, and a breach that takes time to form.',
    boundReason:
      'A quarter above what this solver left when the bounds were set. A shock or a dry front holds every scheme to first ' +
      'order in the mean, and the largest difference, in the cell of the front, hardly falls. A plain second-order scheme leaves ' +
      'about as much; a term with the wrong sign leaves fifty times as much.',
    grids: [100, 200, 400, 800],
    bounds: { stageOrder: 0.85, flowOrder: 0.8, ...bounds, volume: 1e-12 },
    problem: (cells) => ({
      caseFile: caseOf(title, {
        sections: sectionsAt([0, 2 * DAM], 0, () =>
          isRectangle ? wideChannel(bottom, 0) : trapezoidChannel(bottom, side, 0, above + 1),
        ),
        upstream: { kind: 'wall' },
        downstream: { kind: 'wall' },
        initial: {
          kind: 'dam',
          chainage: DAM,
          stageAbove: above,
          stageBelow: below > 0 ? below : null,
        },
        numerics: {
          cellSize: (2 * DAM) / cells,
          duration: time,
          outputInterval: time,
          dryDepth: 1e-6 * above,
        },
      }),
      exact: (x) => {
        const { depth, velocity } = exact.at((x - DAM) / time);
        return { stage: depth, flow: section.area(depth) * velocity };
      },
    }),
  };
}

const RECTANGLE = { bottom: 1, side: 0 };
const TRIANGLE = { bottom: 0, side: 2 };
const TRAPEZOID = { bottom: 20, side: 2 };

export const damBreaks: readonly PublishedCase[] = [
  failure({
    id: 'dam-ritter',
    title: 'Dam break onto a dry bed',
    ...RECTANGLE,
    above: 10,
    below: 0,
    time: 15,
    bounds: { stageL1: 9.5e-3, flowL1: 0.078 },
  }),
  failure({
    id: 'dam-stoker-5',
    title: 'Dam break, 10 m over 5 m',
    ...RECTANGLE,
    above: 10,
    below: 5,
    time: 20,
    bounds: { stageL1: 6.7e-3, flowL1: 0.06 },
  }),
  failure({
    id: 'dam-stoker-1',
    title: 'Dam break, 10 m over 1 m',
    ...RECTANGLE,
    above: 10,
    below: 1,
    time: 20,
    bounds: { stageL1: 8.4e-3, flowL1: 0.061 },
  }),
  failure({
    id: 'dam-stoker-thin',
    title: 'Dam break, 1 m over 1 cm',
    ...RECTANGLE,
    above: 1,
    below: 0.01,
    time: 60,
    bounds: { stageL1: 8.4e-4, flowL1: 2e-3 },
  }),
  failure({
    id: 'dam-triangle-dry',
    title: 'Dam break in a triangle, dry bed',
    ...TRIANGLE,
    above: 5,
    below: 0,
    time: 20,
    bounds: { stageL1: 0.0132, flowL1: 0.204, stageOrder: 0.65 },
  }),
  failure({
    id: 'dam-triangle-wet',
    title: 'Dam break in a triangle, 5 m over 1 m',
    ...TRIANGLE,
    above: 5,
    below: 1,
    time: 30,
    bounds: { stageL1: 3.5e-3, flowL1: 0.18 },
  }),
  failure({
    id: 'dam-trapezoid-dry',
    title: 'Dam break in a trapezoid, dry bed',
    ...TRAPEZOID,
    above: 5,
    below: 0,
    time: 25,
    bounds: { stageL1: 4.8e-3, flowL1: 0.745 },
  }),
  failure({
    id: 'dam-trapezoid-wet',
    title: 'Dam break in a trapezoid, 5 m over 1 m',
    ...TRAPEZOID,
    above: 5,
    below: 1,
    time: 30,
    bounds: { stageL1: 4e-3, flowL1: 0.64 },
  }),
];
