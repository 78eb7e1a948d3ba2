import { bumpFlow, type BumpRegime } from '../../solvers/exact/bumpFlow';
import {
  caseOf,
  GRAVITY,
  sectionsAtCells,
  steadyFlow,
  steadyStage,
  wideChannel,
} from '../channels';
import type { Bounds, PublishedCase } from '../publishedCase';

/** 0.66 m holds the transcritical flow only until it leaves supercritical. */
const START = 0.66;
/** On either side of the jump, m. */
const DISTURBED = 1;

interface Bump {
  regime: BumpRegime;
  title: string;
  what: string;
  shows: string;
  /** Time until nothing moves any more, s. */
  settled: number;
  bounds: Bounds;
}

function overBump({ regime, title, what, shows, settled, bounds }: Bump): PublishedCase {
  const exact = bumpFlow(regime, GRAVITY);
  const { flow, jumpAt, length } = exact;
  return {
    id: `bump-${regime}`,
    group: 'steady',
    title,
    setup:
      `Frictionless channel of 25 m and unit width with a parabolic bump 0.2 m high between 8 and 12 m; ${flow} m³/s run in, ` +
      `${what}. Started from still water and compared when nothing moves any more.`,
    source:
      'N. Goutal and F. Maurel, editors (1997), Proceedings of the 2nd Workshop on Dam-Break Wave Simulation, EDF report ' +
      'HE-43/97/016/B [parameters from memory]. The surface follows from constant energy, and from constant momentum across ' +
      'the jump.',
    shows,
    doesNotShow: 'Friction; sections that are not rectangles.',
    boundReason:
      'Half as much again as was left when the bounds were set. The flow of a steady state must be the same everywhere; a bed ' +
      'step taken with the wrong sign leaves centimetres.',
    grids: [50, 100, 200],
    bounds: { ...bounds, volume: 1e-12 },
    problem: (cells) => ({
      caseFile: caseOf(title, {
        sections: sectionsAtCells(length, cells, 0, (x) => wideChannel(1, exact.bed(x))),
        upstream: { kind: 'inflow', ...steadyFlow(flow) },
        downstream: { kind: 'stage', ...steadyStage(exact.outletStage ?? START) },
        initial: { kind: 'still', stage: exact.outletStage ?? START },
        numerics: { cellSize: length / cells, duration: settled, outputInterval: settled },
      }),
      exact: (x) => ({ stage: exact.bed(x) + exact.depth(x), flow }),
      jump:
        jumpAt === null
          ? undefined
          : {
              at: jumpAt,
              height: exact.depth(jumpAt + 1e-6) - exact.depth(jumpAt - 1e-6),
              disturbed: DISTURBED,
            },
    }),
  };
}

export const bumps: readonly PublishedCase[] = [
  overBump({
    regime: 'subcritical',
    title: 'Slow flow over a bump',
    what: 'held at 2 m at the outlet',
    shows: 'The dip of the surface over the bump, and the same flow in every cell.',
    settled: 300,
    bounds: { stageL1: 8e-5, flowMax: 5e-8, stageOrder: 1.8 },
  }),
  overBump({
    regime: 'transcritical',
    title: 'Flow through critical depth over a bump',
    what: 'and leave fast',
    shows: 'The passage from slow to fast at the crest, where the control is.',
    settled: 150,
    bounds: { stageL1: 3.3e-4, flowMax: 2e-8, stageOrder: 1.8 },
  }),
  overBump({
    regime: 'jump',
    title: 'Hydraulic jump behind a bump',
    what: 'held at 0.33 m at the outlet',
    shows: 'A standing jump in its place, and the same flow on both sides of it and in it.',
    settled: 450,
    bounds: { stageL1: 1.6e-4, flowMax: 1e-7, stageOrder: 1.7, jumpShift: 1 },
  }),
];
