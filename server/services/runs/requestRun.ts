import type { CaseFile } from '../../../shared/case/caseFile';
import { faultsIn } from '../../../shared/case/validate/faults';
import { validateCase } from '../../../shared/case/validateCase';
import type { Fault } from '../../../shared/errors';
import { buildCase } from '../../../shared/scenarios/buildCase';
import { checkScenario } from '../../../shared/scenarios/checkScenario';
import type { Section } from '../../../shared/surveys/types';
import { unpackJson } from '../../database/packedJson';
import { AppError, conflict } from '../../errors';
import type { RunModel } from '../../models/Run';
import type { ScenarioModel } from '../../models/Scenario';
import type { Platform } from '../../platform';
import { inflowOutline } from '../../results/inflowOutline';
import { SOLVER_VERSION } from '../../solvers';
import { touchStudy } from '../studies/touchStudy';
import { freezeCase } from './freezeCase';
import type { StudyModel } from '../../models/Study';

/** What a run is made of beside its case. */
interface RunOf {
  studyId: number;
  scenarioId: number;
  reachId: number;
  scenarioName: string;
  startsAt: Date | null;
}

/** Puts runs into the queue. `queued` is called once one stands there. */
export function buildRequestRun(platform: Platform, queued: () => void) {
  const { audit, sequelize, models, now } = platform;
  const { Reach, Run, Scenario, Study } = models;

  /** Freezes a case and puts it into the queue as the study's next run. */
  async function requestCase(
    actor: { id: number; firmId: number },
    of: RunOf,
    caseFile: CaseFile,
  ): Promise<RunModel> {
    const { studyId } = of;
    const frozen = await freezeCase(caseFile);
    const run = await sequelize.transaction(async (transaction) => {
      // Whoever holds the study gives the next number.
      const lock = transaction.LOCK.UPDATE;
      await Study.findByPk(studyId, { lock, transaction });
      if (!(await Scenario.findByPk(of.scenarioId, { lock, transaction })))
        throw conflict(`${of.scenarioName} was deleted meanwhile. Nothing was started.`);
      const last = (await Run.max('number', { where: { studyId }, transaction })) as number | null;
      await touchStudy(platform, studyId, transaction);
      const made = await Run.create(
        {
          ...of,
          number: (last ?? 0) + 1,
          state: 'queued',
          ...frozen,
          solverVersion: SOLVER_VERSION,
          duration: caseFile.numerics.duration,
          inflow: inflowOutline(caseFile),
          requestedBy: actor.id,
          requestedAt: now(),
        },
        { transaction },
      );
      const words = `Run ${made.number} asked for: ${made.scenarioName}`;
      const record = { kind: 'run', id: made.id };
      await audit.note({ action: 'run.requested', words, record, actor }, transaction);
      return made;
    });
    queued();
    return run;
  }

  /** The same of a scenario. Throws `scenarioIncomplete` with every fault where it cannot be routed. */
  async function request(
    actor: { id: number; firmId: number },
    scenario: ScenarioModel,
  ): Promise<RunModel> {
    const { studyId, reachId, body } = scenario;
    const [reach, study] = await Promise.all([
      Reach.scope('withSections').findByPk(reachId, { rejectOnEmpty: true }),
      Study.findByPk(studyId, { rejectOnEmpty: true }),
    ]);
    const sections = await unpackJson<Section[]>(reach.sections);
    const caseFile = caseOf(scenario, sections, study);
    const startsAt = body.startsAt === null ? null : new Date(body.startsAt);
    const of = { studyId, scenarioId: scenario.id, reachId, scenarioName: scenario.name, startsAt };
    return requestCase(actor, of, caseFile);
  }

  return { request, requestCase };
}

function caseOf({ body, name }: ScenarioModel, sections: Section[], study: StudyModel): CaseFile {
  const { faults } = checkScenario(body, sections, study.unitSystem);
  if (faults.length > 0) throw incomplete(faults);
  const caseFile = buildCase(body, sections, `${study.title}: ${name}`);
  // The solver's own check has the last word.
  const refused = validateCase(caseFile);
  if (refused.faults.length > 0) throw incomplete(faultsIn(study.unitSystem, refused.faults));
  return caseFile;
}

const incomplete = (faults: Fault[]) =>
  new AppError(
    'scenarioIncomplete',
    `The scenario cannot be routed yet: ${faults.length === 1 ? 'one thing is' : `${faults.length} things are`} ` +
      'missing or wrong. Nothing was started; mend what is marked and ask again.',
    { faults },
  );
