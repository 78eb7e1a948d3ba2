import { Router } from 'express';
import { reportedSchema, residualsQuerySchema } from '../../shared/calibration/schemas';
import { fromSearchSchema, searchSchema } from '../../shared/calibration/search/schemas';
import type { Services } from '../composition';
import { actorOf, authorize, recordOf, type Loader } from '../middleware/authorize';
import { pathId } from '../middleware/pathId';
import { check, validate } from '../middleware/validate';
import type { RunModel } from '../models/Run';
import { csvLine } from '../results/exports/csvField';
import { residualRows } from '../results/exports/residualRows';
import type { TaskSetModel } from '../models/TaskSet';
import { presentTaskSet } from '../presenters/taskSets';

export function calibrationRoutes({ authenticate, calibration, runs, tasks }: Services): Router {
  const router = Router();
  const run: Loader<RunModel> = (req, actor) => runs.find.load(pathId(req, 'runId'), actor);

  router.get(
    '/runs/:runId/residuals',
    authenticate,
    authorize('calibration.read', run),
    async (req, res) => {
      const { flood } = await check(residualsQuerySchema, req.query);
      res.json(await calibration.residuals.read(recordOf(res), flood));
    },
  );

  router.get(
    '/runs/:runId/residuals.csv',
    authenticate,
    authorize('calibration.read', run),
    async (req, res) => {
      const { flood } = await check(residualsQuerySchema, req.query);
      const record = recordOf<RunModel>(res);
      const residuals = await calibration.residuals.read(record, flood);
      const rows = residualRows(residuals, record.study!.unitSystem);
      res.attachment(`run-${record.number}-residuals.csv`).type('text/csv; charset=utf-8');
      res.send(rows.map(csvLine).join(''));
    },
  );

  router.put(
    '/runs/:runId/observed',
    authenticate,
    validate(reportedSchema),
    authorize('calibration.change', run),
    async (req, res) => {
      const record = recordOf<RunModel>(res);
      await calibration.residuals.report(record, req.body.flood);
      res.json(await calibration.residuals.read(record, req.body.flood ?? undefined));
    },
  );

  router.post(
    '/runs/:runId/calibrations',
    authenticate,
    validate(searchSchema),
    authorize('taskSet.request', run),
    async (req, res) => {
      const actor = actorOf(res);
      const { id } = await calibration.search(actor, recordOf(res), req.body);
      const set = await tasks.find.again(id);
      const [counts, members] = await Promise.all([tasks.find.counts(set), tasks.find.tasks(set)]);
      res.status(201).json(presentTaskSet(set, counts, members, actor));
    },
  );

  router.post(
    '/task-sets/:taskSetId/scenario',
    authenticate,
    validate(fromSearchSchema),
    authorize('calibration.change', (req, actor) =>
      tasks.find.load(pathId(req, 'taskSetId'), actor),
    ),
    async (req, res) => {
      const set = recordOf<TaskSetModel>(res);
      const { scenario, changed } = await calibration.scenarioOf.make(
        set,
        actorOf(res),
        req.body.name,
      );
      res.status(201).json({ scenarioId: scenario.id, changed });
    },
  );
  return router;
}
