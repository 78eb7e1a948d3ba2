import type { SectionsChangeBody } from '../../../shared/reaches/schemas';
import type { Section } from '../../../shared/surveys/types';
import { packJson, unpackJson } from '../../database/packedJson';
import { conflict } from '../../errors';
import type { ReachModel } from '../../models/Reach';
import type { StudyModel } from '../../models/Study';
import type { Platform } from '../../platform';
import type { Actor, Loaded } from '../../policies/subject';
import { countFaults } from '../scenarios/countFaults';
import { studySubject } from '../studies/studySubject';
import { touchStudy } from '../studies/touchStudy';
import { changeSections } from './changeSections';

const INCLUDE = ['survey', 'updater'];

/** Reaches: the sections of accepted surveys with the modeller's bank marks and roughness. */
export function buildReaches(platform: Platform) {
  const { audit, models, sequelize } = platform;
  const { Reach, Scenario, Study } = models;

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
    await sequelize.transaction(async (transaction) => {
      const current = await Reach.scope('withSections').findByPk(reach.id, {
        transaction,
        lock: transaction.LOCK.UPDATE,
        rejectOnEmpty: true,
      });
      if (current.version !== body.version)
        throw conflict(
          'Somebody else has changed this reach meanwhile. Load it again; what you typed is still here.',
          { version: current.version },
        );
      const sections = changeSections(await sectionsOf(current), body);
      await current.update(
        { sections: await packJson(sections), version: current.version + 1, updatedBy: actor.id },
        { transaction },
      );
      // What a scenario lacks may have been this.
      const scenarios = await Scenario.findAll({ where: { reachId: reach.id }, transaction });
      for (const scenario of scenarios)
        await scenario.update(
          { faultCount: countFaults(scenario.body, sections) },
          { transaction, silent: true },
        );
      await touchStudy(platform, reach.studyId, transaction);
      const words = `Banks or roughness changed: ${reach.name}, version ${current.version}`;
      const record = { kind: 'reach', id: reach.id };
      await audit.note({ action: 'reach.changed', words, record, actor }, transaction);
    });
    return reach.reload({ include: INCLUDE });
  }

  return { load, list, sectionsOf, change };
}

export type ReachesService = ReturnType<typeof buildReaches>;
