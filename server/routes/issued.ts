import { Router } from 'express';
import { paperQuerySchema } from '../../shared/reports/schemas';
import type { Services } from '../composition';
import { actorOf, authorize, recordOf, type Loader } from '../middleware/authorize';
import { pathId } from '../middleware/pathId';
import { check } from '../middleware/validate';
import type { RunModel } from '../models/Run';
import type { StudyModel } from '../models/Study';

export function issuedRoutes({ authenticate, issued, reports, studies }: Services): Router {
  const router = Router();
  const study: Loader<StudyModel> = (req, actor) => studies.load(pathId(req, 'studyId'), actor);
  const run: Loader<RunModel> = (req, actor) => issued.load(pathId(req, 'runId'), actor);

  router.get(
    '/studies/:studyId/issued',
    authenticate,
    authorize('issued.list', study),
    async (_req, res) => {
      res.json(await issued.list(recordOf<StudyModel>(res), actorOf(res)));
    },
  );

  router.get(
    '/issued/:runId/report.pdf',
    authenticate,
    authorize('issued.report', run),
    async (req, res) => {
      const { paper } = await check(paperQuerySchema, req.query);
      const record = recordOf<RunModel>(res);
      const pdf = await reports.pdf(record, { paper, annex: false });
      res.attachment(`run-${record.number}-report.pdf`).type('application/pdf').send(pdf);
    },
  );

  router.post(
    '/issued/:runId/read',
    authenticate,
    authorize('issued.confirm', run),
    async (_req, res) => {
      await issued.confirmRead(recordOf<RunModel>(res), actorOf(res));
      res.status(204).end();
    },
  );
  return router;
}
