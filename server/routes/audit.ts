import { pipeline } from 'node:stream/promises';
import { Router } from 'express';
import { auditQuerySchema } from '../../shared/audit/schemas';
import type { Services } from '../composition';
import { actorOf, authorize } from '../middleware/authorize';
import { check } from '../middleware/validate';
import { presentAuditRow } from '../presenters/audit';

export function auditRoutes({ authenticate, auditTrail }: Services): Router {
  const router = Router();

  router.get('/audit', authenticate, authorize('audit.read'), async (req, res) => {
    const query = await check(auditQuerySchema, req.query);
    const { next, rows } = await auditTrail.page(actorOf(res).firmId, query);
    res.json({ rows: rows.map(presentAuditRow), next });
  });

  router.get('/audit.csv', authenticate, authorize('audit.read'), async (req, res) => {
    const query = await check(auditQuerySchema, req.query);
    res.attachment('audit-trail.csv').type('text/csv; charset=utf-8');
    await pipeline(auditTrail.csv(actorOf(res).firmId, query), res);
  });
  return router;
}
