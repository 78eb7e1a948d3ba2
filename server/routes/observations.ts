import { Router } from 'express';
import {
  gaugeSchema,
  markFileSchema,
  markSchema,
  marksSchema,
} from '../../shared/calibration/schemas';
import type { Services } from '../composition';
import { authorize, recordOf, type Loader } from '../middleware/authorize';
import { pathId } from '../middleware/pathId';
import { fileOf, uploadFile } from '../middleware/uploadFile';
import { validate } from '../middleware/validate';
import type { GaugeModel } from '../models/Gauge';
import type { MarkModel } from '../models/Mark';
import type { StudyModel } from '../models/Study';
import { presentGauge, presentMark, presentObservations } from '../presenters/observations';

export function observationRoutes({ authenticate, observations, studies }: Services): Router {
  const { marks, gauges } = observations;
  const router = Router();
  const study: Loader<StudyModel> = (req, actor) => studies.load(pathId(req, 'studyId'), actor);
  const mark: Loader<MarkModel> = (req, actor) => marks.load(pathId(req, 'markId'), actor);
  const gauge: Loader<GaugeModel> = (req, actor) => gauges.load(pathId(req, 'gaugeId'), actor);

  router.get(
    '/studies/:studyId/observations',
    authenticate,
    authorize('observation.read', study),
    async (_req, res) => {
      const { id } = recordOf<StudyModel>(res);
      res.json(presentObservations(await marks.list(id), await gauges.list(id)));
    },
  );

  router.post(
    '/studies/:studyId/marks/read',
    authenticate,
    authorize('observation.change', study),
    uploadFile,
    validate(markFileSchema),
    async (req, res) => {
      res.json(await observations.readMarks(recordOf(res), fileOf(req), req.body.flood));
    },
  );

  router.post(
    '/studies/:studyId/marks',
    authenticate,
    validate(marksSchema),
    authorize('observation.change', study),
    async (req, res) => {
      const made = await marks.add(recordOf(res), req.body.marks);
      res.status(201).json(made.map(presentMark));
    },
  );

  router.patch(
    '/marks/:markId',
    authenticate,
    validate(markSchema),
    authorize('observation.change', mark),
    async (req, res) => {
      res.json(presentMark(await marks.change(recordOf(res), req.body)));
    },
  );

  router.delete(
    '/marks/:markId',
    authenticate,
    authorize('observation.change', mark),
    async (_req, res) => {
      await marks.remove(recordOf(res));
      res.status(204).end();
    },
  );

  router.post(
    '/studies/:studyId/gauges',
    authenticate,
    validate(gaugeSchema),
    authorize('observation.change', study),
    async (req, res) => {
      const made = await gauges.create(recordOf(res), req.body);
      res.status(201).json(presentGauge(made, await gauges.recordOf(made)));
    },
  );

  router.get(
    '/gauges/:gaugeId',
    authenticate,
    authorize('observation.read', gauge),
    async (_req, res) => {
      const record = recordOf<GaugeModel>(res);
      res.json(presentGauge(record, await gauges.recordOf(record)));
    },
  );

  router.put(
    '/gauges/:gaugeId',
    authenticate,
    validate(gaugeSchema),
    authorize('observation.change', gauge),
    async (req, res) => {
      const changed = await gauges.change(recordOf(res), req.body);
      res.json(presentGauge(changed, await gauges.recordOf(changed)));
    },
  );

  router.delete(
    '/gauges/:gaugeId',
    authenticate,
    authorize('observation.change', gauge),
    async (_req, res) => {
      await gauges.remove(recordOf(res));
      res.status(204).end();
    },
  );
  return router;
}
