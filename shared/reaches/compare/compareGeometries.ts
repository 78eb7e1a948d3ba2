import type { Section } from '../../surveys/types';
import { changesOf } from '../edit/describeChange';
import { plain } from '../edit/geometryChange';
import { areaBelow, bankfullStage, thalwegOf } from '../sectionGeometry';

export const SECTION_FATES = ['same', 'changed', 'moved', 'renamed', 'added', 'removed'] as const;
/** What became of a section; one that was moved may be changed besides, which `changes` tells. */
export type SectionFate = (typeof SECTION_FATES)[number];

/** One section in two geometries; `before` null where it is new, `after` null where it is gone. */
export interface SectionComparison {
  fate: SectionFate;
  before: Section | null;
  after: Section | null;
  /** `points`, `bank marks`, … */
  changes: string[];
  /** Elevation below which areas are compared: the lower bank of the earlier section, or its lower end, m. */
  level: number | null;
  /** After less before, m² and m; null where one is missing. Area between the banks of the earlier section. */
  areaChange: number | null;
  areaBefore: number | null;
  thalwegChange: number | null;
}

/** Chainages nearer than this (m) are one place. */
const SAME_PLACE = 0.005;

/** Two geometries section by section, paired by name and, where a name is gone, by place; along the reach. */
export function compareGeometries(
  before: readonly Section[],
  after: readonly Section[],
): SectionComparison[] {
  const byId = new Map(after.map((section) => [section.id, section]));
  const earlier = new Set(before.map(({ id }) => id));
  const fresh = after.filter(({ id }) => !earlier.has(id));
  const paired = new Set<Section>();
  const rows = before.map((was) => {
    const now = byId.get(was.id) ?? fresh.find((made) => !paired.has(made) && near(was, made));
    if (now) paired.add(now);
    return compare(was, now ?? null);
  });
  const added = after.filter((made) => !paired.has(made)).map((made) => compare(null, made));
  const place = ({ after: a, before: b }: SectionComparison) => (a ?? b)!.chainage;
  return [...rows, ...added].sort((a, b) => place(a) - place(b));
}

const near = (a: Section, b: Section) => Math.abs(a.chainage - b.chainage) <= SAME_PLACE;

function compare(before: Section | null, after: Section | null): SectionComparison {
  if (!before || !after)
    return {
      fate: before ? 'removed' : 'added',
      before,
      after,
      changes: [],
      level: null,
      areaChange: null,
      areaBefore: null,
      thalwegChange: null,
    };
  const changes = changesOf(plain(before), plain({ ...after, id: before.id }));
  const level = bankfullStage(before);
  const span = before.banks ?? undefined;
  const areaBefore = areaBelow(before, level, span);
  return {
    fate: fateOf(before, after, changes),
    before,
    after,
    changes,
    level,
    areaBefore,
    areaChange: areaBelow(after, level, span) - areaBefore,
    thalwegChange: thalwegOf(after) - thalwegOf(before),
  };
}

function fateOf(before: Section, after: Section, changes: string[]): SectionFate {
  if (!near(before, after)) return 'moved';
  if (before.id !== after.id) return 'renamed';
  return changes.length > 0 ? 'changed' : 'same';
}
