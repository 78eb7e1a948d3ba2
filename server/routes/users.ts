import { Router } from 'express';
import { userChangeSchema } from '../../shared/accounts/schemas';
import type { Services } from '../composition';
import { actorOf, authorize, recordOf } from '../middleware/authorize';
import { pathId } from '../middleware/pathId';
import { validate } from '../middleware/validate';
import type { UserModel } from '../models/User';
import { presentUserRow } from '../presenters/accounts';

export function userRoutes({ accounts: { users }, authenticate }: Services): Router {
  const router = Router();

  router.get('/users', authenticate, authorize('user.list'), async (_req, res) => {
    res.json((await users.list(actorOf(res))).map(presentUserRow));
  });

  router.patch(
    '/users/:userId',
    authenticate,
    validate(userChangeSchema),
    authorize('user.change', (req) => users.load(pathId(req, 'userId'))),
    async (req, res) => {
      res.json(presentUserRow(await users.change(recordOf<UserModel>(res), req.body)));
    },
  );
  return router;
}
