import { macDonald, type MacDonaldCase } from '../../solvers/exact/macDonald';
import {
  caseOf,
  GRAVITY,
  sectionsAtCells,
  steadyFlow,
  steadyStage,
  trapezoidChannel,
} from '../channels';
import type { Bounds, PublishedCase } from '../publishedCase';

interface Prescribed {
  name: MacDonaldCase;
  title: string;
  what: string;
  shows: string;
  sizes: readonly number[];
  duration: number;
  /** On either side of the jump, m. */
  disturbed?: number;
  boundReason?: string;
  bounds: Bounds;
}

function prescribed(given: Prescribed): PublishedCase {
  const { name, title, what, shows, sizes, duration, disturbed = 0, bounds } = given;
  const exact = macDonald(name, GRAVITY);
  const { flow, jumpAt, manning, width } = exact;
  const length = exact.to - exact.from;
  const place = (chainage: number) => exact.from + chainage;
  return {
    id: `prescribed-${name.toLowerCase()}`,
    group: 'steady',
    title,
    setup:
      `Steady flow of ${flow} m³/s in a rectangle ${width} m wide and ${exact.to} m long, Manning's n ${manning}, on a bed ` +
      `made so that the depth is a chosen function: ${what}.`,
    source:
      'I. MacDonald, M. J. Baines, N. K. Nichols and P. G. Samuels (1997), Analytic benchmark solutions for open-channel ' +
      'flows, ASCE Journal of Hydraulic Engineering 123(11), 1041-1045; the same authors (1995), University of Reading, ' +
      'Numerical Analysis Report 3/95 [constants from memory; the jump relation confirms them to a micrometre].',
    shows,
    doesNotShow: 'Water that rises and falls; sections that change along the reach.',
    boundReason:
      given.boundReason ??
      'A quarter above what was left when the bounds were set. Smooth steady flow must show the second order of the scheme.',
    grids: sizes.map((size) => Math.round(length / size)),
    bounds: { ...bounds, volume: 1e-12 },
    problem: (cells) => ({
      caseFile: caseOf(title, {
        sections: sectionsAtCells(length, cells, manning, (chainage) =>
          trapezoidChannel(width, 0, exact.bed(place(chainage)), 5),
        ),
        upstream: { kind: 'inflow', ...steadyFlow(flow) },
        downstream:
          name === 'B'
            ? { kind: 'open' }
            : { kind: 'stage', ...steadyStage(exact.depth(exact.to)) },
        initial: { kind: 'steady' },
        numerics: { cellSize: length / cells, duration, outputInterval: duration },
      }),
      // C has an approach of 200 m before the published reach.
      from: -exact.from,
      exact: (chainage) => ({
        stage: exact.bed(place(chainage)) + exact.depth(place(chainage)),
        flow,
      }),
      jump:
        jumpAt === null
          ? undefined
          : {
              at: jumpAt - exact.from,
              height: exact.depth(jumpAt + 1e-6) - exact.depth(jumpAt),
              disturbed,
            },
    }),
  };
}

const LONG = [40, 20, 10, 5];

export const prescribedDepths: readonly PublishedCase[] = [
  prescribed({
    name: 'A',
    title: 'Prescribed depth A: slow',
    what: 'slow throughout, close to critical at both ends',
    shows: 'Friction, bed slope and acceleration in balance.',
    sizes: LONG,
    duration: 1200,
    bounds: { stageL1: 2.6e-5, flowMax: 2e-7, stageOrder: 1.8 },
  }),
  prescribed({
    name: 'B',
    title: 'Prescribed depth B: from slow to fast',
    what: 'slow in the upper half, fast in the lower',
    shows: 'The passage through critical depth with friction.',
    sizes: LONG,
    duration: 1200,
    bounds: { stageL1: 1.5e-5, flowMax: 2e-7, stageOrder: 1.8 },
  }),
  prescribed({
    name: 'C',
    title: 'Prescribed depth C: a jump',
    what: 'fast in the upper half, then a jump, then slow',
    shows: 'The place of a jump that friction and bed decide.',
    sizes: LONG,
    duration: 1200,
    disturbed: 50,
    bounds: { stageL1: 8e-6, flowMax: 2e-6, stageOrder: 1.7, jumpShift: 1 },
  }),
  prescribed({
    name: 'D',
    title: 'Prescribed depth D: slow, fast, a jump',
    what: 'slow, through critical depth to fast, then a high jump, all within 100 m',
    shows: 'All of it on a short steep bed.',
    sizes: [4, 2, 1, 0.5],
    duration: 300,
    disturbed: 5,
    boundReason:
      'A quarter above what was left when the bounds were set. The flow goes on flickering a little in the cells of the jump.',
    bounds: { stageL1: 4.5e-5, flowMax: 6e-4, stageOrder: 1.4, jumpShift: 1 },
  }),
];
