import type { PreparedSection } from './preparedSection';
import type { ZoneRules } from './zoneRules';

/** What lies over each segment of a surveyed section. */
export interface SegmentParts {
  /** Crest (m) of the embankment that guards it; null: none */
  crest: (number | null)[];
  isStorage: boolean[];
  /** Stage (m) above which a storage part flows; null: never, or no storage */
  flowsAbove: (number | null)[];
  /** Lowest bed of the section (m) */
  bed: number;
}

/** Rules of the segments of a section between two surveyed ones. */
export interface SegmentRules {
  guarded: number[];
  same(k: number, l: number): boolean;
  /** Those of the given segments */
  rulesOf(segments: readonly number[]): ZoneRules;
}

export function segmentPartsOf(section: PreparedSection, x: number[], z: number[]): SegmentParts {
  const { left, right } = section.embankments;
  const parts: SegmentParts = { crest: [], isStorage: [], flowsAbove: [], bed: section.bed };
  for (let k = 0; k + 1 < x.length; k++) {
    // A wall belongs to the side on which the water stands against it.
    const isWall = x[k + 1] <= x[k];
    const descending = z[k + 1] <= z[k];
    const at = isWall ? x[k] : 0.5 * (x[k] + x[k + 1]);
    const rightOf = (offset: number): boolean =>
      at > offset || (at === offset && isWall && descending);
    const crest = left && !rightOf(left.offset) ? left.crest : null;
    const storage = section.storage.find(({ from, to }) => rightOf(from) && !rightOf(to));
    parts.crest.push(crest ?? (right && rightOf(right.offset) ? right.crest : null));
    parts.isStorage.push(storage !== undefined);
    parts.flowsAbove.push(storage?.flowsAbove ?? null);
  }
  return parts;
}

/**
 * The rules at weight w between two sections (0 is a, 1 is b). Ground that is guarded, or storage, on one of them only is
 * so by its weight. Crests and levels of both are joined by straight lines; of one alone they keep their height above
 * the lowest bed.
 */
export function segmentRulesAt(a: SegmentParts, b: SegmentParts, w: number): SegmentRules {
  const bed = (1 - w) * a.bed + w * b.bed;
  const levelOf = (la: number | null, lb: number | null): number => {
    if (la !== null && lb !== null) return la === lb ? la : (1 - w) * la + w * lb;
    if (la !== null) return w === 0 ? la : la - a.bed + bed;
    if (lb !== null) return w === 1 ? lb : lb - b.bed + bed;
    return 0;
  };
  const shareOf = (inA: boolean, inB: boolean): number =>
    inA && inB ? 1 : inA ? 1 - w : inB ? w : 0;
  const segments = a.crest.map((_, k) => {
    const rises = shareOf(a.flowsAbove[k] !== null, b.flowsAbove[k] !== null);
    return {
      guarded: shareOf(a.crest[k] !== null, b.crest[k] !== null),
      crest: levelOf(a.crest[k], b.crest[k]),
      flowing: shareOf(!a.isStorage[k], !b.isStorage[k]),
      waking: rises,
      flowsAbove: levelOf(a.flowsAbove[k], b.flowsAbove[k]),
    };
  });
  return {
    guarded: segments.map(({ guarded }) => guarded),
    same: (k, l) =>
      (Object.keys(segments[k]) as (keyof (typeof segments)[number])[]).every(
        (key) => segments[k][key] === segments[l][key],
      ),
    rulesOf(chosen) {
      const of = (key: keyof (typeof segments)[number]): Float64Array =>
        Float64Array.from(chosen, (k) => segments[k][key]);
      return {
        guarded: of('guarded'),
        crest: of('crest'),
        flowing: of('flowing'),
        waking: of('waking'),
        flowsAbove: of('flowsAbove'),
      };
    },
  };
}
