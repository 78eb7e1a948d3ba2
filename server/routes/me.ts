import { Router } from 'express';
import { profileSchema } from '../../shared/accounts/schemas';
import type { Services } from '../composition';
import { actorOf, authorize } from '../middleware/authorize';
import { validate } from '../middleware/validate';
import { presentMe } from '../presenters/accounts';

export function meRoutes({ accounts: { users }, authenticate }: Services): Router {
  const router = Router();

  router.get('/me', authenticate, authorize('me.read'), async (_req, res) => {
    res.json(presentMe(await users.me(actorOf(res).id)));
  });

  router.patch(
    '/me',
    authenticate,
    validate(profileSchema),
    authorize('me.change'),
    async (req, res) => {
      res.json(presentMe(await users.changeProfile(actorOf(res).id, req.body)));
    },
  );
  return router;
}
