import { Router, type Response } from 'express';
import { taskSetsQuerySchema } from '../../shared/tasks/schemas';
import type { Services } from '../composition';
import { actorOf, authorize, recordOf, type Loader } from '../middleware/authorize';
import { pathId } from '../middleware/pathId';
import { check } from '../middleware/validate';
import type { StudyModel } from '../models/Study';
import type { TaskSetModel } from '../models/TaskSet';
import { presentTaskSet, presentTaskSetRow } from '../presenters/taskSets';

/** Sets of any kind; those who ask for a set have routes of their own. */
export function taskSetRoutes({ authenticate, studies, tasks }: Services): Router {
  const { find, change } = tasks;
  const router = Router();
  const taskSet: Loader<TaskSetModel> = (req, actor) => find.load(pathId(req, 'taskSetId'), actor);
  const setOf = (res: Response) => recordOf<TaskSetModel>(res);
  const present = async (res: Response) => {
    const set = await find.again(setOf(res).id);
    const [counts, members] = await Promise.all([find.counts(set), find.tasks(set)]);
    res.json(presentTaskSet(set, counts, members, actorOf(res)));
  };

  router.get(
    '/studies/:studyId/task-sets',
    authenticate,
    authorize('taskSet.read', (req, actor) => studies.load(pathId(req, 'studyId'), actor)),
    async (req, res) => {
      const { kind } = await check(taskSetsQuerySchema, req.query);
      const studyId = recordOf<StudyModel>(res).id;
      const sets = await find.list({ studyId, ...(kind && { kind }) });
      res.json(sets.map(presentTaskSetRow));
    },
  );

  router.get(
    '/task-sets/:taskSetId',
    authenticate,
    authorize('taskSet.read', taskSet),
    async (_req, res) => present(res),
  );

  router.get(
    '/task-sets/:taskSetId/result',
    authenticate,
    authorize('taskSet.read', taskSet),
    async (_req, res) => {
      res.json(await find.result(setOf(res)));
    },
  );

  router.post(
    '/task-sets/:taskSetId/cancel',
    authenticate,
    authorize('taskSet.change', taskSet),
    async (_req, res) => {
      await change.cancel(setOf(res));
      await present(res);
    },
  );

  router.post(
    '/task-sets/:taskSetId/retry',
    authenticate,
    authorize('taskSet.change', taskSet),
    async (_req, res) => {
      await change.retry(setOf(res));
      await present(res);
    },
  );
  return router;
}
