import { Router } from 'express';
import { sectionsChangeSchema } from '../../shared/reaches/schemas';
import type { Services } from '../composition';
import { actorOf, authorize, recordOf, type Loader } from '../middleware/authorize';
import { pathId } from '../middleware/pathId';
import { validate } from '../middleware/validate';
import type { ReachModel } from '../models/Reach';
import type { StudyModel } from '../models/Study';
import { presentReach, presentReachRow } from '../presenters/reaches';

export function reachRoutes({ authenticate, reaches, studies }: Services): Router {
  const router = Router();
  const study: Loader<StudyModel> = (req, actor) => studies.load(pathId(req, 'studyId'), actor);
  const reach: Loader<ReachModel> = (req, actor) => reaches.load(pathId(req, 'reachId'), actor);
  const present = async (record: ReachModel) =>
    presentReach(record, await reaches.sectionsOf(record));

  router.get(
    '/studies/:studyId/reaches',
    authenticate,
    authorize('reach.read', study),
    async (_req, res) => {
      res.json((await reaches.list(recordOf(res))).map(presentReachRow));
    },
  );

  router.get(
    '/reaches/:reachId',
    authenticate,
    authorize('reach.read', reach),
    async (_req, res) => {
      res.json(await present(recordOf(res)));
    },
  );

  router.patch(
    '/reaches/:reachId/sections',
    authenticate,
    validate(sectionsChangeSchema),
    authorize('reach.change', reach),
    async (req, res) => {
      res.json(await present(await reaches.change(recordOf(res), actorOf(res), req.body)));
    },
  );
  return router;
}
