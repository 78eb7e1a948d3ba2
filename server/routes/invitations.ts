import { Router } from 'express';
import {
  invitationAcceptSchema,
  invitationLookSchema,
  invitationSchema,
} from '../../shared/accounts/schemas';
import { setRefreshCookie } from '../auth/refreshCookie';
import type { Services } from '../composition';
import { actorOf, authorize, openToAll, recordOf, type Loader } from '../middleware/authorize';
import { pathId } from '../middleware/pathId';
import { validate } from '../middleware/validate';
import type { InvitationModel } from '../models/Invitation';
import { presentInvitationRow, presentSession } from '../presenters/accounts';

export function invitationRoutes({ accounts, authenticate, env, limits }: Services): Router {
  const { invitations } = accounts;
  const router = Router();
  const load: Loader<InvitationModel> = (req) => invitations.load(pathId(req, 'invitationId'));

  router.get('/invitations', authenticate, authorize('invitation.list'), async (_req, res) => {
    res.json((await invitations.list(actorOf(res))).map(presentInvitationRow));
  });

  router.post(
    '/invitations',
    authenticate,
    validate(invitationSchema),
    authorize('invitation.create'),
    async (req, res) => {
      const invitation = await invitations.create(actorOf(res), req.body);
      res.status(201).json(presentInvitationRow(invitation));
    },
  );

  router.delete(
    '/invitations/:invitationId',
    authenticate,
    authorize('invitation.change', load),
    async (_req, res) => {
      await invitations.withdraw(recordOf(res));
      res.status(204).end();
    },
  );

  router.post(
    '/invitations/:invitationId/resend',
    authenticate,
    authorize('invitation.change', load),
    async (_req, res) => {
      await invitations.resend(recordOf(res));
      res.status(204).end();
    },
  );

  router.post(
    '/invitations/look',
    openToAll,
    limits.links,
    validate(invitationLookSchema),
    async (req, res) => {
      res.json(await invitations.look(req.body.token));
    },
  );

  router.post(
    '/invitations/accept',
    openToAll,
    limits.links,
    validate(invitationAcceptSchema),
    async (req, res) => {
      const tokens = await accounts.acceptInvitation(req.body);
      setRefreshCookie(res, env.publicUrl, tokens.refreshToken, tokens.refreshExpiresAt);
      res.json(presentSession(tokens));
    },
  );
  return router;
}
