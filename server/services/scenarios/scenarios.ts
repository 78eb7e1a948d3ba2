import { fn, col, type Transaction } from 'sequelize';
import { LIMITS } from '../../../shared/limits';
import { changeScenario, type ScenarioChange } from '../../../shared/scenarios/changeScenario';
import { inflowOf, peakOf } from '../../../shared/scenarios/hydrographs';
import { newScenario } from '../../../shared/scenarios/proposals';
import type { ScenarioBody } from '../../../shared/scenarios/schemas';
import type { Section } from '../../../shared/surveys/types';
import type { UnitSystem } from '../../../shared/units/units';
import { unpackJson } from '../../database/packedJson';
import { conflict, invalid } from '../../errors';
import type { ScenarioModel } from '../../models/Scenario';
import type { StudyModel } from '../../models/Study';
import type { Platform } from '../../platform';
import type { Actor, Loaded } from '../../policies/subject';
import { studySubject } from '../studies/studySubject';
import { touchStudy } from '../studies/touchStudy';
import { countFaults } from './countFaults';

/** Scenarios: stored as they are typed, complete or not. */
export function buildScenarios(platform: Platform) {
  const { audit, models, sequelize } = platform;
  const { Reach, Run, Scenario, Study } = models;

  /** For `authorize`. */
  async function load(id: number, actor: Actor): Promise<Loaded<ScenarioModel> | null> {
    const scenario = await Scenario.findByPk(id, { include: 'updater' });
    const study = scenario && (await Study.findByPk(scenario.studyId));
    return study && { record: scenario, subject: await studySubject(models, study, actor) };
  }

  /** Last changed first. */
  const list = (study: StudyModel): Promise<ScenarioModel[]> =>
    Scenario.findAll({
      where: { studyId: study.id },
      include: 'updater',
      order: [
        ['updatedAt', 'DESC'],
        ['id', 'DESC'],
      ],
    });

  /** Of each scenario the number of its runs. */
  async function runCounts(scenarioIds: number[]): Promise<Map<number, number>> {
    const rows = await Run.unscoped().findAll({
      where: { scenarioId: scenarioIds },
      attributes: ['scenarioId', [fn('COUNT', col('id')), 'number']],
      group: ['scenarioId'],
    });
    return new Map(rows.map((row) => [row.scenarioId, Number(row.number)]));
  }

  /** What its study is shown and typed in. */
  async function unitSystemOf({ studyId }: ScenarioModel): Promise<UnitSystem> {
    return (await Study.findByPk(studyId, { rejectOnEmpty: true })).unitSystem;
  }

  /** The sections that a scenario is routed on. */
  async function sectionsOf({ reachId }: { reachId: number }, transaction?: Transaction) {
    const reach = await Reach.scope('withSections').findByPk(reachId, {
      transaction,
      rejectOnEmpty: true,
    });
    return unpackJson<Section[]>(reach.sections);
  }

  /** Begins with what fits the reach. Throws `invalid` where the reach is not of the study. */
  async function create(
    study: StudyModel,
    actor: Actor,
    { name, reachId }: { name: string; reachId: number },
  ): Promise<ScenarioModel> {
    const sections = await sectionsOfStudy(study.id, reachId, 'reachId');
    return store(study.id, actor, newScenario(name, reachId, sections, study.unitSystem), sections);
  }

  /** The same under another name, with a change where one is given; runs stay with the original. */
  async function duplicate(
    scenario: ScenarioModel,
    actor: Actor,
    name: string,
    change: (body: ScenarioBody) => ScenarioBody = (body) => body,
  ) {
    const body = change({ ...scenario.body, name });
    return store(scenario.studyId, actor, body, await sectionsOf(scenario));
  }

  /** The same with one of the usual changes. Throws `invalid` where the scenario has nothing to change so. */
  async function duplicateChanged(
    scenario: ScenarioModel,
    actor: Actor,
    name: string,
    change: ScenarioChange | null,
  ) {
    if (change === null) return duplicate(scenario, actor, name);
    const sections = await sectionsOf(scenario);
    const reach = { from: sections[0].chainage, to: sections[sections.length - 1].chainage };
    const { faults } = changeScenario(scenario.body, change, reach);
    if (faults.length > 0) throw invalid(faults);
    return duplicate(scenario, actor, name, (body) => changeScenario(body, change, reach).body);
  }

  /**
   * Stores the body as it is. Throws `conflict` where the scenario has changed since `version`, `invalid` where the
   * reach is not of the study.
   */
  async function save(
    scenario: ScenarioModel,
    actor: Actor,
    { version, body }: { version: number; body: ScenarioBody },
  ): Promise<ScenarioModel> {
    const sections = await sectionsOfStudy(scenario.studyId, body.reachId, 'body.reachId');
    await sequelize.transaction(async (transaction) => {
      const current = await Scenario.findByPk(scenario.id, {
        transaction,
        lock: transaction.LOCK.UPDATE,
        rejectOnEmpty: true,
      });
      if (current.version !== version)
        throw conflict(
          'Somebody else has saved this scenario meanwhile. Load it again; what you typed is still here.',
          { version: current.version },
        );
      await current.update(
        { ...told(body, sections), version: version + 1, updatedBy: actor.id },
        { transaction },
      );
      await touchStudy(platform, scenario.studyId, transaction);
      await tell('changed', current, actor, transaction);
    });
    return scenario.reload({ include: 'updater' });
  }

  /** Throws `conflict` where it has runs: they stand on it. */
  async function remove(scenario: ScenarioModel, actor: Actor): Promise<void> {
    await sequelize.transaction(async (transaction) => {
      await Scenario.findByPk(scenario.id, { transaction, lock: transaction.LOCK.UPDATE });
      const runs = await Run.count({ where: { scenarioId: scenario.id }, transaction });
      if (runs > 0)
        throw conflict(
          `${scenario.name} has ${runs === 1 ? 'a run' : `${runs} runs`}, which would lose their inputs. It stays.`,
        );
      await scenario.destroy({ transaction });
      await tell('removed', scenario, actor, transaction);
    });
  }

  async function store(studyId: number, actor: Actor, body: ScenarioBody, sections: Section[]) {
    const scenario = await sequelize.transaction(async (transaction) => {
      const made = await Scenario.create(
        { ...told(body, sections), studyId, updatedBy: actor.id },
        { transaction },
      );
      await touchStudy(platform, studyId, transaction);
      await tell('made', made, actor, transaction);
      return made;
    });
    return scenario.reload({ include: 'updater' });
  }

  const tell = (
    what: 'made' | 'changed' | 'removed',
    { id, name }: ScenarioModel,
    actor: Actor,
    transaction: Transaction,
  ) =>
    audit.note(
      {
        action: `scenario.${what}`,
        words: `Scenario ${what}: ${name}`,
        record: { kind: 'scenario', id },
        actor,
      },
      transaction,
    );

  /** The columns that follow from the body. */
  const told = (body: ScenarioBody, sections: Section[]) => ({
    name: body.name.slice(0, LIMITS.textShort),
    reachId: body.reachId,
    body,
    peakInflow: peakOf(inflowOf(body.upstream))?.flow ?? null,
    faultCount: countFaults(body, sections),
  });

  async function sectionsOfStudy(studyId: number, reachId: number, path: string) {
    const count = await Reach.count({ where: { id: reachId, studyId } });
    if (count === 0)
      throw invalid([{ path, message: 'The reach is not of this study. Choose another.' }]);
    return sectionsOf({ reachId });
  }

  return {
    load,
    list,
    runCounts,
    sectionsOf,
    unitSystemOf,
    create,
    duplicate,
    duplicateChanged,
    save,
    remove,
  };
}

export type ScenariosService = ReturnType<typeof buildScenarios>;
