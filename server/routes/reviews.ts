import { Router, type Response } from 'express';
import {
  answersSchema,
  issueSchema,
  pointEntrySchema,
  pointSchema,
  reasonSchema,
  sendForCheckSchema,
  signSchema,
} from '../../shared/review/schemas';
import type { Services } from '../composition';
import { actorOf, authorize, recordOf, type Loader } from '../middleware/authorize';
import { pathId } from '../middleware/pathId';
import { validate } from '../middleware/validate';
import type { RunModel } from '../models/Run';
import type { PointOfRun } from '../services/review/findReviews';

export function reviewRoutes({ authenticate, limits, reviews, runs }: Services): Router {
  const router = Router();
  const run: Loader<RunModel> = (req, actor) => reviews.load(pathId(req, 'runId'), actor);
  const point: Loader<PointOfRun> = (req, actor) =>
    reviews.loadPoint(pathId(req, 'pointId'), actor);
  const runOf = (res: Response) => recordOf<RunModel>(res);
  /** The check as it stands now. */
  const present = async (res: Response, { id }: { id: number }) => {
    res.json(await reviews.read(await runs.find.again(id), actorOf(res)));
  };

  router.get('/reviews/queue', authenticate, authorize('review.queue'), async (_req, res) => {
    res.json(await reviews.queue.list(actorOf(res)));
  });

  router.get(
    '/reviews/recipients',
    authenticate,
    authorize('review.recipients'),
    async (_req, res) => {
      res.json(await reviews.queue.recipients(actorOf(res)));
    },
  );

  router.get(
    '/runs/:runId/review',
    authenticate,
    authorize('review.read', run),
    async (_req, res) => present(res, runOf(res)),
  );

  router.post(
    '/runs/:runId/review',
    authenticate,
    validate(sendForCheckSchema),
    authorize('review.send', run),
    async (req, res) => {
      await reviews.send(runOf(res), actorOf(res), req.body);
      await present(res, runOf(res));
    },
  );

  router.put(
    '/runs/:runId/review/answers',
    authenticate,
    validate(answersSchema),
    authorize('review.answer', run),
    async (req, res) => {
      await reviews.answer(runOf(res), actorOf(res), req.body);
      await present(res, runOf(res));
    },
  );

  router.post(
    '/runs/:runId/review/points',
    authenticate,
    validate(pointSchema),
    authorize('review.raise', run),
    async (req, res) => {
      await reviews.points.raise(runOf(res), actorOf(res), req.body);
      await present(res, runOf(res));
    },
  );

  for (const [path, action, kind] of [
    ['answer', 'review.answer', 'answer'],
    ['close', 'review.close', 'closed'],
    ['reopen', 'review.close', 'reopened'],
  ] as const)
    router.post(
      `/points/:pointId/${path}`,
      authenticate,
      validate(pointEntrySchema),
      authorize(action, point),
      async (req, res) => {
        const found = recordOf<PointOfRun>(res);
        await reviews.points.write(found, actorOf(res), kind, req.body);
        await present(res, found.run);
      },
    );

  router.post(
    '/runs/:runId/review/return',
    authenticate,
    validate(reasonSchema),
    authorize('review.return', run),
    async (req, res) => {
      await reviews.giveBack(runOf(res), actorOf(res), req.body);
      await present(res, runOf(res));
    },
  );

  router.post(
    '/runs/:runId/review/sign',
    authenticate,
    limits.sign,
    validate(signSchema),
    authorize('review.sign', run),
    async (req, res) => {
      await reviews.sign(runOf(res), actorOf(res), req.body);
      await present(res, runOf(res));
    },
  );

  router.post(
    '/runs/:runId/review/issue',
    authenticate,
    validate(issueSchema),
    authorize('review.issue', run),
    async (req, res) => {
      await reviews.issue(runOf(res), actorOf(res), req.body);
      await present(res, runOf(res));
    },
  );

  router.post(
    '/runs/:runId/review/withdraw',
    authenticate,
    validate(reasonSchema),
    authorize('review.withdraw', run),
    async (req, res) => {
      await reviews.withdraw(runOf(res), actorOf(res), req.body);
      await present(res, runOf(res));
    },
  );

  router.post(
    '/runs/:runId/review/outlet-probe',
    authenticate,
    authorize('review.probe', run),
    async (_req, res) => {
      await reviews.probeOutlet(runOf(res), actorOf(res));
      await present(res, runOf(res));
    },
  );
  return router;
}
