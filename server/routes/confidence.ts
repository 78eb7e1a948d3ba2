import { Router, type Response } from 'express';
import {
  CONFIDENCE_KINDS,
  CONFIDENCE_SCHEMAS,
  confidenceCsvQuerySchema,
} from '../../shared/confidence/schemas';
import type { Services } from '../composition';
import { actorOf, authorize, recordOf, type Loader } from '../middleware/authorize';
import { pathId } from '../middleware/pathId';
import { check, validate } from '../middleware/validate';
import type { RunModel } from '../models/Run';
import type { TaskSetModel } from '../models/TaskSet';
import { presentTaskSet } from '../presenters/taskSets';

/** Convergence, sensitivity and ensembles of a run; what goes for sets of every kind stands in `taskSets.ts`. */
export function confidenceRoutes({
  authenticate,
  confidence,
  models,
  runs,
  tasks,
}: Services): Router {
  const router = Router();
  const run: Loader<RunModel> = (req, actor) => runs.find.load(pathId(req, 'runId'), actor);
  const taskSet: Loader<TaskSetModel> = (req, actor) =>
    tasks.find.load(pathId(req, 'taskSetId'), actor);
  const setOf = (res: Response) => recordOf<TaskSetModel>(res);

  router.get(
    '/runs/:runId/confidence',
    authenticate,
    authorize('taskSet.read', run),
    async (_req, res) => {
      res.json(await confidence.options(recordOf<RunModel>(res)));
    },
  );

  for (const kind of CONFIDENCE_KINDS)
    router.post(
      `/runs/:runId/confidence/${kind}`,
      authenticate,
      validate(CONFIDENCE_SCHEMAS[kind]),
      authorize('taskSet.request', run),
      async (req, res) => {
        const actor = actorOf(res);
        const { id } = await confidence.request(actor, recordOf<RunModel>(res), kind, req.body);
        const set = await tasks.find.again(id);
        const [counts, members] = await Promise.all([
          tasks.find.counts(set),
          tasks.find.tasks(set),
        ]);
        res.status(201).json(presentTaskSet(set, counts, members, actor));
      },
    );

  router.get(
    '/task-sets/:taskSetId/result.csv',
    authenticate,
    authorize('taskSet.read', taskSet),
    async (req, res) => {
      const set = setOf(res);
      const { part } = await check(confidenceCsvQuerySchema, req.query);
      const result = await confidence.read.result(set);
      const study = await models.Study.findByPk(set.studyId!, { rejectOnEmpty: true });
      const name = part === 'members' ? 'members' : 'result';
      res.attachment(`${set.kind}-${set.id}-${name}.csv`).type('text/csv; charset=utf-8');
      res.send(confidence.csv(result, study.unitSystem, part));
    },
  );

  router.get(
    '/task-sets/:taskSetId/members/:taskId/case.json',
    authenticate,
    authorize('taskSet.read', taskSet),
    async (req, res) => {
      const set = setOf(res);
      const { label, text } = await confidence.read.memberCase(set, pathId(req, 'taskId'));
      const name = label.toLowerCase().replace(/[^a-z0-9]+/g, '-');
      res.attachment(`${set.kind}-${set.id}-${name}-case.json`).type('application/json');
      res.send(text);
    },
  );
  return router;
}
