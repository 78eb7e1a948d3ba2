import { Router } from 'express';
import { stationSchema } from '../../shared/studies/schemas';
import type { Services } from '../composition';
import { authorize, recordOf, type Loader } from '../middleware/authorize';
import { pathId } from '../middleware/pathId';
import { validate } from '../middleware/validate';
import type { StationModel } from '../models/Station';
import type { StudyModel } from '../models/Study';
import { presentStation } from '../presenters/studies';

export function stationRoutes({ authenticate, stations, studies }: Services): Router {
  const router = Router();
  const study: Loader<StudyModel> = (req, actor) => studies.load(pathId(req, 'studyId'), actor);
  const station: Loader<StationModel> = (req, actor) =>
    stations.load(pathId(req, 'stationId'), actor);

  router.get(
    '/studies/:studyId/stations',
    authenticate,
    authorize('station.read', study),
    async (_req, res) => {
      res.json((await stations.list(recordOf<StudyModel>(res).id)).map(presentStation));
    },
  );

  router.post(
    '/studies/:studyId/stations',
    authenticate,
    validate(stationSchema),
    authorize('station.change', study),
    async (req, res) => {
      res.status(201).json(presentStation(await stations.create(recordOf(res), req.body)));
    },
  );

  router.patch(
    '/stations/:stationId',
    authenticate,
    validate(stationSchema),
    authorize('station.change', station),
    async (req, res) => {
      res.json(presentStation(await stations.change(recordOf(res), req.body)));
    },
  );

  router.delete(
    '/stations/:stationId',
    authenticate,
    authorize('station.change', station),
    async (_req, res) => {
      await stations.remove(recordOf(res));
      res.status(204).end();
    },
  );
  return router;
}
