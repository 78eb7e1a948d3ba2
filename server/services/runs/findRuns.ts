import type { RunModel } from '../../models/Run';
import type { Platform } from '../../platform';
import type { Actor, Loaded } from '../../policies/subject';
import { studySubject } from '../studies/studySubject';

/** What tells where the checking of a run stands. */
const CHECKING = ['review', 'triedFor', 'signOff', 'issue', 'withdrawal'].map((association) => ({
  association,
  attributes: association === 'review' ? ['id', 'state'] : ['id'],
}));

/** Runs by id or study. They come with their study, who asked for them, and how their checking stands. */
export function buildFindRuns({ models }: Platform) {
  const { Run, Study, User } = models;
  const include = [
    { model: Study, as: 'study' },
    { model: User, as: 'requester', attributes: ['id', 'name', 'email'] },
    ...CHECKING,
  ];
  return {
    /** For `authorize`. */
    async load(runId: number, actor: Actor): Promise<Loaded<RunModel> | null> {
      const run = await Run.findByPk(runId, { include });
      return run && { record: run, subject: await studySubject(models, run.study!, actor) };
    },
    /** Newest first. */
    list: (studyId: number): Promise<RunModel[]> =>
      Run.findAll({ where: { studyId }, include, order: [['number', 'DESC']] }),
    again: (runId: number): Promise<RunModel> =>
      Run.findByPk(runId, { include, rejectOnEmpty: true }),
  };
}
