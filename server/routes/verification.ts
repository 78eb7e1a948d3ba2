import { Router } from 'express';
import type { Services } from '../composition';
import { openToAll } from '../middleware/authorize';

export function verificationRoutes({ limits, verify }: Services): Router {
  const router = Router();

  router.get(
    '/verification/:code',
    openToAll,
    limits.verification,
    limits.verificationMisses,
    async (req, res) => {
      res.json(await verify(String(req.params['code'])));
    },
  );
  return router;
}
