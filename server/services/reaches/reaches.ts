import { describeChange } from '../../../shared/reaches/edit/describeChange';
import type { SectionsChangeBody } from '../../../shared/reaches/schemas';
import type { Section } from '../../../shared/surveys/types';
import { unpackJson } from '../../database/packedJson';
import type { ReachModel } from '../../models/Reach';
import type { StudyModel } from '../../models/Study';
import type { Platform } from '../../platform';
import type { Actor, Loaded } from '../../policies/subject';
import { studySubject } from '../studies/studySubject';
import { changeSections } from './changeSections';
import { buildReachVersions } from './reachVersions';
import { buildWorkingGeometries } from './workingGeometries';

const INCLUDE = ['survey', 'updater'];

/** Reaches: the sections of accepted surveys with the modeller's bank marks and roughness. */
export function buildReaches(platform: Platform) {
  const { models } = platform;
  const { Reach, Study } = models;
  const versions = buildReachVersions(platform);

  /** For `authorize`. */
  async function load(id: number, actor: Actor): Promise<Loaded<ReachModel> | null> {
    const reach = await Reach.scope('withSections').findByPk(id, { include: INCLUDE });
    const study = reach && (await Study.findByPk(reach.studyId));
    return study && { record: reach, subject: await studySubject(models, study, actor) };
  }

  /** Newest first. */
  const list = (study: StudyModel): Promise<ReachModel[]> =>
    Reach.findAll({ where: { studyId: study.id }, include: INCLUDE, order: [['id', 'DESC']] });

  /** Of a reach that was read with its sections. */
  const sectionsOf = (reach: ReachModel): Promise<Section[]> => unpackJson(reach.sections);

  /**
   * Sets banks and roughness of some sections, all or none. Throws `invalid` where they do not fit a section, and
   * `conflict` where the reach has changed since the version that the change was made on.
   */
  async function change(
    reach: ReachModel,
    actor: Actor,
    body: SectionsChangeBody,
  ): Promise<ReachModel> {
    const { unitSystem } = await Study.findByPk(reach.studyId, { rejectOnEmpty: true });
    await versions.next(reach, actor, body.version, (before) => {
      const sections = changeSections(before, body, unitSystem);
      return { sections, told: { words: describeChange(before, sections) } };
    });
    return reach.reload({ include: INCLUDE });
  }

  return { load, list, sectionsOf, change, working: buildWorkingGeometries(platform) };
}

export type ReachesService = ReturnType<typeof buildReaches>;
