import type { Transaction } from 'sequelize';
import type { Section } from '../../../shared/surveys/types';
import { packJson, unpackJson } from '../../database/packedJson';
import { conflict } from '../../errors';
import type { ReachModel } from '../../models/Reach';
import type { Platform } from '../../platform';
import type { Actor } from '../../policies/subject';
import { countFaults } from '../scenarios/countFaults';
import { touchStudy } from '../studies/touchStudy';

/** What is told of a new version. */
export interface Told {
  words: string;
  steps?: string[];
}

/** Versions of a reach: each is made from the one that the person saw, or not at all. */
export function buildReachVersions(platform: Platform) {
  const { audit, models, now, sequelize } = platform;
  const { Reach, ReachChange, Scenario } = models;

  /**
   * Makes the next version of a reach out of its sections. Throws `conflict` where it has changed since `version`, and
   * whatever `make` throws; then nothing is stored.
   */
  async function next(
    reach: ReachModel,
    actor: Actor,
    version: number,
    make: (sections: Section[]) => { sections: Section[]; told: Told },
  ): Promise<void> {
    await sequelize.transaction(async (transaction) => {
      const current = await Reach.scope('withSections').findByPk(reach.id, {
        transaction,
        lock: transaction.LOCK.UPDATE,
        rejectOnEmpty: true,
      });
      if (current.version !== version)
        throw conflict(
          'Somebody else has changed this reach meanwhile. Load it again; what you typed is still here.',
          { version: current.version },
        );
      const { sections, told } = make(await unpackJson<Section[]>(current.sections));
      await current.update(
        {
          ...extentOf(sections),
          sections: await packJson(sections),
          version: version + 1,
          updatedBy: actor.id,
        },
        { transaction },
      );
      await remember(current, actor, told, transaction);
      await recount(reach.id, sections, transaction);
      await touchStudy(platform, reach.studyId, transaction);
      const words = `${reach.name}, version ${current.version}: ${told.words}`;
      const record = { kind: 'reach', id: reach.id };
      await audit.note({ action: 'reach.changed', words, record, actor }, transaction);
    });
  }

  /** A line of the reach's own history. */
  const remember = (
    reach: ReachModel,
    actor: Actor,
    { words, steps = [] }: Told,
    transaction: Transaction,
  ) =>
    ReachChange.create(
      {
        reachId: reach.id,
        version: reach.version,
        words,
        steps,
        changedBy: actor.id,
        changedAt: now(),
      },
      { transaction },
    );

  /** What a scenario lacks may have been in the reach. */
  async function recount(reachId: number, sections: Section[], transaction: Transaction) {
    for (const scenario of await Scenario.findAll({ where: { reachId }, transaction }))
      await scenario.update(
        { faultCount: countFaults(scenario.body, sections) },
        { transaction, silent: true },
      );
  }

  return { next, remember };
}

/** The columns that follow from the sections. */
export const extentOf = (sections: Section[]) => ({
  sectionCount: sections.length,
  firstChainage: sections[0].chainage,
  lastChainage: sections[sections.length - 1].chainage,
});
