import { Router } from 'express';
import { comparisonQuerySchema } from '../../shared/comparison/schemas';
import type { Services } from '../composition';
import { authorize, recordOf } from '../middleware/authorize';
import { pathId } from '../middleware/pathId';
import { check } from '../middleware/validate';

export function comparisonRoutes({ authenticate, comparison, studies }: Services): Router {
  const router = Router();
  router.get(
    '/studies/:studyId/comparison',
    authenticate,
    authorize('run.read', (req, actor) => studies.load(pathId(req, 'studyId'), actor)),
    async (req, res) => {
      const { runs } = await check(comparisonQuerySchema, req.query);
      res.json(await comparison(recordOf(res), runs));
    },
  );
  return router;
}
