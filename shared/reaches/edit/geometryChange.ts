import type { Section } from '../../surveys/types';

/** What was done to a geometry: sections that are new or different, and the names of those that are gone. */
export interface GeometryChange {
  sections: Section[];
  removed: string[];
}

/** Sections compare by what they hold; an untouched one is the same object most of the time. */
export const isSame = (a: Section, b: Section): boolean =>
  a === b || JSON.stringify(plain(a)) === JSON.stringify(plain(b));

/** From one geometry to another. */
export function changeBetween(
  before: readonly Section[],
  after: readonly Section[],
): GeometryChange {
  const old = new Map(before.map((section) => [section.id, section]));
  const kept = new Set(after.map(({ id }) => id));
  return {
    sections: after.flatMap((section) => {
      const was = old.get(section.id);
      return was && isSame(was, section) ? [] : [plain(section)];
    }),
    removed: before.flatMap(({ id }) => (kept.has(id) ? [] : [id])),
  };
}

/** The geometry with the change made, along the reach. */
export function applyChange(before: readonly Section[], change: GeometryChange): Section[] {
  const gone = new Set([...change.removed, ...change.sections.map(({ id }) => id)]);
  return [...before.filter(({ id }) => !gone.has(id)), ...change.sections].sort(
    (a, b) => a.chainage - b.chainage,
  );
}

/** Only what is stored of a section, in one order of keys; what the server tells of it besides is left out. */
export function plain(section: Section): Section {
  const { id, chainage, points, roughness, banks, coordinates, storage, embankments } = section;
  return {
    id,
    chainage,
    points,
    roughness,
    banks,
    coordinates,
    ...(storage && storage.length > 0 && { storage: storage.map(storagePart) }),
    ...(embankments &&
      (embankments.left || embankments.right) && {
        embankments: {
          ...(embankments.left && { left: embankment(embankments.left) }),
          ...(embankments.right && { right: embankment(embankments.right) }),
        },
      }),
  };
}

type Part = NonNullable<Section['storage']>[number];
const storagePart = ({ from, to, flowsAbove }: Part): Part => ({
  from,
  to,
  ...(flowsAbove !== undefined && { flowsAbove }),
});
const embankment = ({ offset, crest }: { offset: number; crest: number }) => ({ offset, crest });
