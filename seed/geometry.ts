import { changeBetween } from '../shared/reaches/edit/geometryChange';
import { fillBetween } from '../shared/reaches/edit/interpolateSections';
import { thinPoints } from '../shared/reaches/edit/thinPoints';
import type { Section } from '../shared/surveys/types';
import type { Services } from '../server/composition';
import type { StudyModel } from '../server/models/Study';
import type { UserModel } from '../server/models/User';

export const MEADOW_NAME = 'Mill meadow lowered';

/** Offsets of the meadow right of the river, m, by section. */
const MEADOW: Record<string, [from: number, to: number]> = {
  'XS-28': [175, 310],
  'XS-29': [180, 310],
};
const LOWERED = 0.5;
const SPACING = 100;
const TOLERANCE = 0.03;

/** What was done, and why: the history tells it in these words. */
const STEPS = [
  `Right flood plain lowered by 0.50 m in XS-28 and XS-29: the meadow that the mill's owner offers as storage`,
  'Sections put between XS-27 and XS-29, at most 100 m apart: the lowered ground begins and ends within a cell or two',
  'Points of XS-30 thinned to 0.03 m: scatter of the scan on the ploughed plain',
];

/** The reach with the meadow at Sallow Mill lowered: a measure to be compared with the river as it is. */
export function lowerMeadow(sections: readonly Section[]): Section[] {
  const lowered = sections.map((section) => {
    const meadow = MEADOW[section.id];
    if (!meadow) return section;
    const [from, to] = meadow;
    const points = section.points.map(([y, z]): [number, number] =>
      y >= from && y <= to ? [y, Math.round(100 * (z - LOWERED)) / 100] : [y, z],
    );
    return { ...section, points };
  });
  const filled = fillBetween(lowered, new Set(['XS-27', 'XS-28', 'XS-29']), SPACING);
  return filled.map((section) =>
    section.id === 'XS-30' ? thinPoints(section, TOLERANCE) : section,
  );
}

/** A working geometry of the surveyed reach with a few explained changes, where the study has none. */
export async function seedGeometry(
  { models, reaches }: Services,
  study: StudyModel,
  modeller: UserModel,
): Promise<void> {
  const known = await models.Reach.scope('withSections').findAll({
    where: { studyId: study.id },
    order: ['id'],
  });
  const surveyed = known.find(({ copiedFrom }) => copiedFrom === null);
  const begun = known.find(({ name }) => name === MEADOW_NAME);
  if (!surveyed || known.some(({ copiedFrom, id }) => copiedFrom !== null && id !== begun?.id))
    return;
  const copy =
    begun ??
    (await reaches.working.copy(study, modeller, { name: MEADOW_NAME, copyOf: surveyed.id }));
  // Changed already, by an earlier start or by a person.
  if (copy.version > 1) return;
  const sections = await reaches.sectionsOf(copy);
  const change = changeBetween(sections, lowerMeadow(sections));
  await reaches.working.save(copy, modeller, {
    version: copy.version,
    ...change,
    steps: STEPS,
  });
}
