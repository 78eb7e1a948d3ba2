import type { RunModel } from '../../models/Run';
import type { Platform } from '../../platform';
import type { Loaded } from '../../policies/subject';

/** Loaders of the routes and lists. Runs come with their study and who asked for them. */
export function buildFindRuns({ models }: Platform) {
  const { Run, Scenario, Study, User } = models;
  const include = [
    { model: Study, as: 'study' },
    { model: User, as: 'requester', attributes: ['name'] },
  ];
  const firmOf = (study: { firmId: number }) => ({ firmId: study.firmId });

  return {
    async load(runId: number): Promise<Loaded<RunModel> | null> {
      const run = await Run.findByPk(runId, { include });
      return run && { record: run, subject: firmOf(run.study!) };
    },
    async loadStudy(studyId: number) {
      const study = await Study.findByPk(studyId);
      return study && { record: study, subject: firmOf(study) };
    },
    async loadScenario(scenarioId: number) {
      const scenario = await Scenario.findByPk(scenarioId);
      const study = scenario && (await Study.findByPk(scenario.studyId));
      return scenario && study && { record: scenario, subject: firmOf(study) };
    },
    /** Newest first. */
    list: (studyId: number): Promise<RunModel[]> =>
      Run.findAll({ where: { studyId }, include, order: [['number', 'DESC']] }),
    again: (runId: number): Promise<RunModel> =>
      Run.findByPk(runId, { include, rejectOnEmpty: true }),
  };
}
