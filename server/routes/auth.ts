import { Router, type Response } from 'express';
import {
  passwordChangeSchema,
  passwordResetConfirmSchema,
  passwordResetRequestSchema,
  signInSchema,
} from '../../shared/accounts/schemas';
import { clearRefreshCookie, readRefreshCookie, setRefreshCookie } from '../auth/refreshCookie';
import type { Tokens } from '../auth/sessions';
import type { Services } from '../composition';
import { unauthenticated } from '../errors';
import { authorize, openToAll, signedInOf } from '../middleware/authorize';
import { validate } from '../middleware/validate';
import { presentSession } from '../presenters/accounts';

export function authRoutes({ accounts, authenticate, env, limits, sessions }: Services): Router {
  const router = Router();
  const answer = (res: Response, tokens: Tokens) => {
    setRefreshCookie(res, env.publicUrl, tokens.refreshToken, tokens.refreshExpiresAt);
    res.json(presentSession(tokens));
  };

  router.post('/auth/sign-in', openToAll, limits.signIn, validate(signInSchema), async (req, res) =>
    answer(res, await accounts.signIn(req.body)),
  );

  router.post('/auth/refresh', openToAll, limits.refresh, async (req, res) => {
    const token = readRefreshCookie(req);
    if (!token) throw unauthenticated('Nobody is signed in here.');
    answer(res, await sessions.refresh(token));
  });

  router.post('/auth/sign-out', openToAll, limits.refresh, async (req, res) => {
    const token = readRefreshCookie(req);
    if (token) await sessions.end(token);
    clearRefreshCookie(res, env.publicUrl);
    res.status(204).end();
  });

  router.post(
    '/auth/sign-out-everywhere',
    authenticate,
    authorize('me.change'),
    async (_req, res) => {
      await accounts.users.signOutEverywhere(signedInOf(res).id);
      clearRefreshCookie(res, env.publicUrl);
      res.status(204).end();
    },
  );

  router.post(
    '/auth/password',
    authenticate,
    validate(passwordChangeSchema),
    authorize('me.change'),
    async (req, res) => {
      await accounts.passwords.change(signedInOf(res), req.body);
      res.status(204).end();
    },
  );

  router.post(
    '/auth/password-reset/request',
    openToAll,
    limits.resetRequest,
    validate(passwordResetRequestSchema),
    (req, res) => {
      accounts.passwords.requestReset(req.body.email);
      res.status(202).end();
    },
  );

  router.post(
    '/auth/password-reset/confirm',
    openToAll,
    limits.links,
    validate(passwordResetConfirmSchema),
    async (req, res) => {
      await accounts.passwords.confirmReset(req.body);
      clearRefreshCookie(res, env.publicUrl);
      res.status(204).end();
    },
  );
  return router;
}
