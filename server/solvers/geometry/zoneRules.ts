/**
 * What the zones of a section with embankments, storage parts or factors of roughness do otherwise than plain ones. One
 * entry a zone. Between two surveyed sections a zone can be guarded or storage by a share: see ruledSurface.ts.
 */
export interface ZoneRules {
  /** Share that an embankment keeps dry up to `crest` (m); it fills over FILLING above it */
  guarded: Float64Array;
  crest: Float64Array;
  /** Share that flows at any stage … */
  flowing: Float64Array;
  /** … and share that begins to above `flowsAbove` (m); the rest never flows */
  waking: Float64Array;
  flowsAbove: Float64Array;
}

/** Height (m) above the crest of an embankment over which the ground behind it fills. */
export const FILLING = 0.2;
/** Height (m) over which a part that has begun to flow comes to flow in full. */
export const WAKING = 0.5;

const ramp = (height: number, over: number): number => Math.min(1, Math.max(0, height / over));

/** Share of zone q that holds water at `stage`. */
export function filledAt({ guarded, crest }: ZoneRules, q: number, stage: number): number {
  return 1 - guarded[q] * (1 - ramp(stage - crest[q], FILLING));
}

/** Its growth just above `stage` (1/m). */
export function fillingAt({ guarded, crest }: ZoneRules, q: number, stage: number): number {
  return stage >= crest[q] && stage < crest[q] + FILLING ? guarded[q] / FILLING : 0;
}

/**
 * The pieces of a zone that come to flow together: their share of the zone, by what share they flow at a stage, and the
 * growth of that just above it (1/m).
 */
export interface Piece {
  share: number;
  flows: number;
  growth: number;
}

export function piecesAt(rules: ZoneRules, q: number, stage: number): Piece[] {
  const { guarded, crest, flowing, waking, flowsAbove } = rules;
  const over = waked(stage, crest[q] + FILLING);
  const above = waked(stage, flowsAbove[q]);
  const both = {
    flows: over.flows * above.flows,
    growth: over.growth * above.flows + over.flows * above.growth,
  };
  return [
    { share: (1 - guarded[q]) * flowing[q], flows: 1, growth: 0 },
    { share: (1 - guarded[q]) * waking[q], ...above },
    { share: guarded[q] * flowing[q], ...over },
    { share: guarded[q] * waking[q], ...both },
  ].filter(({ share }) => share > 0);
}

function waked(stage: number, from: number): { flows: number; growth: number } {
  return {
    flows: ramp(stage - from, WAKING),
    growth: stage >= from && stage < from + WAKING ? 1 / WAKING : 0,
  };
}

/** Stages (m) at which the section changes by its rules, the most telling first. */
export function markedStages({ guarded, crest, flowing, waking, flowsAbove }: ZoneRules): number[] {
  const marks: number[][] = [[], [], []];
  const wakes = (from: number): void => {
    marks[0].push(from, from + WAKING);
    marks[1].push(from + 0.25 * WAKING);
    marks[2].push(from + 0.1 * WAKING, from + 0.5 * WAKING, from + 0.75 * WAKING);
  };
  for (let q = 0; q < guarded.length; q++) {
    if (guarded[q] > 0) {
      marks[0].push(crest[q]);
      marks[2].push(crest[q] + 0.5 * FILLING);
      if (flowing[q] > 0) wakes(crest[q] + FILLING);
      else marks[0].push(crest[q] + FILLING);
    }
    if (waking[q] > 0) wakes(flowsAbove[q]);
  }
  return [...new Set(marks.flat())];
}
