import { Router } from 'express';
import { AppError } from '../errors';
import { openToAll } from '../middleware/authorize';
import type { Services } from '../composition';

export function healthRoutes({ env, sequelize }: Services): Router {
  const router = Router();
  router.get('/health', openToAll, async (_req, res) => {
    await sequelize.authenticate().catch((cause: unknown) => {
      throw new AppError('unavailable', 'The database does not answer.', { cause });
    });
    res.json({ ok: true, version: env.version });
  });
  return router;
}
