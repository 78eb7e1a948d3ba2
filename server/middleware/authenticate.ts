import type { RequestHandler } from 'express';
import type { buildPassport, SignedIn } from '../auth/passport';
import { unauthenticated } from '../errors';

/** Takes the bearer token; what it says about the person waits in `actorOf(res)`. */
export const authenticateWith =
  (passport: ReturnType<typeof buildPassport>): RequestHandler =>
  (req, res, next) => {
    const answered = (error: unknown, signedIn: SignedIn | false) => {
      if (error) return next(error);
      if (!signedIn) return next(unauthenticated());
      res.locals['actor'] = signedIn;
      next();
    };
    (passport.authenticate('jwt', { session: false }, answered) as RequestHandler)(req, res, next);
  };
