import { Router } from 'express';
import {
  geometryChangeSchema,
  geometryNameSchema,
  newGeometrySchema,
  sectionsChangeSchema,
} from '../../shared/reaches/schemas';
import type { Services } from '../composition';
import { actorOf, authorize, recordOf, type Loader } from '../middleware/authorize';
import { pathId } from '../middleware/pathId';
import { validate } from '../middleware/validate';
import type { ReachModel } from '../models/Reach';
import type { StudyModel } from '../models/Study';
import { presentReach, presentReachChange, presentReachRow } from '../presenters/reaches';

export function reachRoutes({ authenticate, reaches, studies }: Services): Router {
  const router = Router();
  const { working } = reaches;
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

  router.post(
    '/studies/:studyId/reaches',
    authenticate,
    validate(newGeometrySchema),
    authorize('reach.change', study),
    async (req, res) => {
      const made = await working.copy(recordOf(res), actorOf(res), req.body);
      res.status(201).json(await present(made));
    },
  );

  router.put(
    '/reaches/:reachId/geometry',
    authenticate,
    validate(geometryChangeSchema),
    authorize('reach.change', reach),
    async (req, res) => {
      res.json(await present(await working.save(recordOf(res), actorOf(res), req.body)));
    },
  );

  router.patch(
    '/reaches/:reachId',
    authenticate,
    validate(geometryNameSchema),
    authorize('reach.change', reach),
    async (req, res) => {
      const renamed = await working.rename(recordOf(res), actorOf(res), req.body.name);
      res.json(await present(renamed));
    },
  );

  router.delete(
    '/reaches/:reachId',
    authenticate,
    authorize('reach.change', reach),
    async (_req, res) => {
      await working.remove(recordOf(res), actorOf(res));
      res.status(204).end();
    },
  );

  router.get(
    '/reaches/:reachId/changes',
    authenticate,
    authorize('reach.read', reach),
    async (_req, res) => {
      res.json((await working.history(recordOf(res))).map(presentReachChange));
    },
  );
  return router;
}
