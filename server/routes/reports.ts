import { Router } from 'express';
import { reportQuerySchema } from '../../shared/reports/schemas';
import type { Services } from '../composition';
import { authorize, recordOf } from '../middleware/authorize';
import { pathId } from '../middleware/pathId';
import { check } from '../middleware/validate';
import type { RunModel } from '../models/Run';

export function reportRoutes({ authenticate, reports, runs }: Services): Router {
  const router = Router();
  const readRun = authorize('run.read', (req, actor) =>
    runs.find.load(pathId(req, 'runId'), actor),
  );

  router.get('/runs/:runId/report.pdf', authenticate, readRun, async (req, res) => {
    const wanted = await check(reportQuerySchema, req.query);
    const run = recordOf<RunModel>(res);
    if (wanted.annex) res.locals['detail'] = 'with the annex of published cases';
    const pdf = await reports.pdf(run, wanted);
    const name = wanted.annex ? 'report-with-annex' : 'report';
    res.attachment(`run-${run.number}-${name}.pdf`).type('application/pdf').send(pdf);
  });

  router.get('/runs/:runId/reports', authenticate, readRun, async (_req, res) => {
    res.json(await reports.list(recordOf<RunModel>(res)));
  });

  return router;
}
