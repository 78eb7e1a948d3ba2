import { pipeline } from 'node:stream/promises';
import { Router, type Response } from 'express';
import { alongQuerySchema, seriesQuerySchema, surfaceQuerySchema } from '../../shared/runs/schemas';
import type { Services } from '../composition';
import { actorOf, authorize, recordOf } from '../middleware/authorize';
import { eventStream } from '../middleware/eventStream';
import { pathId } from '../middleware/pathId';
import { sendCompressed } from '../middleware/sendCompressed';
import { stillSignedIn } from '../middleware/stillSignedIn';
import { unchanged } from '../middleware/unchanged';
import { check } from '../middleware/validate';
import type { RunModel } from '../models/Run';
import type { ScenarioModel } from '../models/Scenario';
import type { StudyModel } from '../models/Study';
import { may } from '../policies/decide';
import { presentRun, presentRunRow } from '../presenters/runs';

export function runRoutes({
  authenticate,
  calibration,
  runs,
  scenarios,
  studies,
}: Services): Router {
  const { find, change, results, exports } = runs;
  const router = Router();
  const readRun = authorize('run.read', (req, actor) => find.load(pathId(req, 'runId'), actor));
  const changeRun = authorize('run.change', (req, actor) => find.load(pathId(req, 'runId'), actor));
  const runOf = (res: Response) => recordOf<RunModel>(res);

  router.get(
    '/studies/:studyId/runs',
    authenticate,
    authorize('run.read', (req, actor) => studies.load(pathId(req, 'studyId'), actor)),
    async (_req, res) => {
      res.json((await find.list(recordOf<StudyModel>(res).id)).map(presentRunRow));
    },
  );

  router.post(
    '/scenarios/:scenarioId/runs',
    authenticate,
    authorize('run.request', (req, actor) => scenarios.load(pathId(req, 'scenarioId'), actor)),
    async (_req, res) => {
      const actor = actorOf(res);
      const { id } = await runs.request(actor, recordOf<ScenarioModel>(res));
      res.status(201).json(presentRun(await find.again(id), actor));
    },
  );

  router.get('/runs/:runId', authenticate, readRun, (_req, res) => {
    res.json(presentRun(runOf(res), actorOf(res)));
  });

  router.post('/runs/:runId/cancel', authenticate, changeRun, async (_req, res) => {
    await change.cancel(runOf(res));
    res.json(presentRun(await find.again(runOf(res).id), actorOf(res)));
  });

  router.post('/runs/:runId/retry', authenticate, changeRun, async (_req, res) => {
    await change.retry(runOf(res));
    res.json(presentRun(await find.again(runOf(res).id), actorOf(res)));
  });

  router.get('/runs/:runId/events', authenticate, readRun, (req, res) => {
    const run = runOf(res);
    const stream = eventStream(res, () => stop());
    const stop = runs.watch(run.id, {
      send: (event) => {
        if (event.type === 'ended' || !stream.isBehind()) stream.send(event);
      },
      stillAllowed: async () => {
        if (!(await stillSignedIn(authenticate, req, res))) return false;
        const now = await find.load(run.id, actorOf(res));
        return now !== null && may(actorOf(res), 'run.read', now.subject);
      },
      close: stream.close,
    });
  });

  router.get('/runs/:runId/summary', authenticate, readRun, async (_req, res) => {
    res.json(await results.summary(runOf(res)));
  });

  router.get('/runs/:runId/series', authenticate, readRun, async (req, res) => {
    const { chainage } = await check(seriesQuerySchema, req.query);
    const run = runOf(res);
    results.open(run);
    if (unchanged(req, res, run.caseHash, run.id, 'series', chainage)) return;
    res.json(await results.series(run, chainage));
  });

  router.get('/runs/:runId/along', authenticate, readRun, async (req, res) => {
    res.json(await results.along(runOf(res), await check(alongQuerySchema, req.query)));
  });

  router.get('/runs/:runId/structures/:structure', authenticate, readRun, async (req, res) => {
    const structure = pathId(req, 'structure');
    const run = runOf(res);
    results.open(run);
    if (unchanged(req, res, run.caseHash, run.id, 'structure', structure)) return;
    res.json(await results.structure(run, structure - 1));
  });

  router.get('/runs/:runId/reservoir', authenticate, readRun, async (req, res) => {
    const run = runOf(res);
    results.open(run);
    if (unchanged(req, res, run.caseHash, run.id, 'reservoir')) return;
    res.json(await results.reservoir(run));
  });

  router.get('/runs/:runId/surface', authenticate, readRun, async (req, res) => {
    const wanted = await check(surfaceQuerySchema, req.query);
    const run = runOf(res);
    results.open(run);
    const { places, moments } = wanted;
    if (unchanged(req, res, run.caseHash, run.id, 'surface', places, moments)) return;
    await sendCompressed(req, res, Buffer.from(await results.surface(run, wanted)));
  });

  router.get('/runs/:runId/case.json', authenticate, readRun, async (req, res) => {
    const run = runOf(res);
    if (unchanged(req, res, run.caseHash)) return;
    res.attachment(`run-${run.number}-case.json`).type('application/json');
    res.send(await exports.caseFile(run));
  });

  router.get('/runs/:runId/results.csv', authenticate, readRun, async (_req, res) => {
    const run = runOf(res);
    const rows = await exports.csv(run);
    res.attachment(`run-${run.number}-results.csv`).type('text/csv; charset=utf-8');
    await pipeline(rows, res);
  });

  router.get('/runs/:runId/levels.csv', authenticate, readRun, async (_req, res) => {
    const run = runOf(res);
    const text = await exports.levelsCsv(run);
    res.attachment(`run-${run.number}-levels.csv`).type('text/csv; charset=utf-8').send(text);
  });

  router.get('/runs/:runId/structures.csv', authenticate, readRun, async (_req, res) => {
    const run = runOf(res);
    const rows = await exports.structuresCsv(run);
    res.attachment(`run-${run.number}-structures.csv`).type('text/csv; charset=utf-8');
    await pipeline(rows, res);
  });

  router.get('/runs/:runId/results.xlsx', authenticate, readRun, async (_req, res) => {
    const run = runOf(res);
    results.open(run);
    const workbook = await exports.workbook(run, await calibration.residuals.ofReport(run));
    res.attachment(`run-${run.number}-results.xlsx`).send(workbook);
  });

  return router;
}
