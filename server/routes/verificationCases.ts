import { Router } from 'express';
import { paperQuerySchema } from '../../shared/reports/schemas';
import {
  caseQuerySchema,
  runCasesSchema,
  type RunCasesBody,
} from '../../shared/verificationCases/schemas';
import type { Services } from '../composition';
import { actorOf, authorize } from '../middleware/authorize';
import { check, validate } from '../middleware/validate';

/** Published cases: every firm computes its own, with the solver that routes its floods. */
export function verificationCaseRoutes({ authenticate, verificationCases }: Services): Router {
  const { annex, csv, find, request } = verificationCases;
  const router = Router();
  const mayRead = authorize('verificationCase.read');

  router.get('/verification-cases', authenticate, mayRead, async (_req, res) => {
    res.json(await find.list(actorOf(res).firmId));
  });

  router.get('/verification-cases/result', authenticate, mayRead, async (req, res) => {
    const { caseId } = await check(caseQuerySchema, req.query);
    res.json(await find.detail(actorOf(res).firmId, caseId));
  });

  router.get('/verification-cases/values.csv', authenticate, mayRead, async (req, res) => {
    const { caseId } = await check(caseQuerySchema, req.query);
    const text = await csv(actorOf(res).firmId, caseId);
    res.attachment(`${caseId}.csv`).type('text/csv; charset=utf-8').send(text);
  });

  router.get('/verification-cases/annex.pdf', authenticate, mayRead, async (req, res) => {
    const { paper } = await check(paperQuerySchema, req.query);
    const pdf = await annex(actorOf(res).firmId, paper);
    res.attachment('published-cases.pdf').type('application/pdf').send(pdf);
  });

  router.post(
    '/verification-cases/runs',
    authenticate,
    authorize('verificationCase.run'),
    validate(runCasesSchema),
    async (req, res) => {
      const actor = actorOf(res);
      await request(actor, (req.body as RunCasesBody).caseIds);
      res.status(201).json(await find.list(actor.firmId));
    },
  );
  return router;
}
