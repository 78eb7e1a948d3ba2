import { Router, type Response } from 'express';
import type { PlanCollection } from '../../shared/reaches/plan/geoJson';
import type { Services } from '../composition';
import { authorize, recordOf } from '../middleware/authorize';
import { pathId } from '../middleware/pathId';
import type { ReachModel } from '../models/Reach';
import type { RunModel } from '../models/Run';

/** Plans of reaches and of runs as GeoJSON. */
export function planRoutes({ authenticate, plans, reaches, runs }: Services): Router {
  const router = Router();
  const send = (res: Response, name: string, plan: PlanCollection) =>
    res.attachment(name).type('application/geo+json').send(JSON.stringify(plan));

  router.get(
    '/reaches/:reachId/plan.geojson',
    authenticate,
    authorize('reach.read', (req, actor) => reaches.load(pathId(req, 'reachId'), actor)),
    async (_req, res) => {
      const reach = recordOf<ReachModel>(res);
      send(res, `reach-${reach.id}-plan.geojson`, await plans.ofReach(reach));
    },
  );

  router.get(
    '/runs/:runId/plan.geojson',
    authenticate,
    authorize('run.read', (req, actor) => runs.find.load(pathId(req, 'runId'), actor)),
    async (_req, res) => {
      const run = recordOf<RunModel>(res);
      send(res, `run-${run.number}-plan.geojson`, await plans.ofRun(run));
    },
  );
  return router;
}
