import { Router } from 'express';
import { reportedSchema, residualsQuerySchema } from '../../shared/calibration/schemas';
import type { Services } from '../composition';
import { authorize, recordOf, type Loader } from '../middleware/authorize';
import { pathId } from '../middleware/pathId';
import { check, validate } from '../middleware/validate';
import type { RunModel } from '../models/Run';

export function calibrationRoutes({ authenticate, calibration, runs }: Services): Router {
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
  return router;
}
