import { rateLimit } from 'express-rate-limit';
import { tooMany } from '../errors';

interface Limit {
  minutes: number;
  /** Requests of one address in that time. */
  requests: number;
  /** Only what fails counts. */
  failuresOnly?: boolean;
}

const byAddress = ({ minutes, requests, failuresOnly = false }: Limit) =>
  rateLimit({
    windowMs: minutes * 60_000,
    limit: requests,
    skipSuccessfulRequests: failuresOnly,
    standardHeaders: false,
    legacyHeaders: false,
    handler: (req, _res, next) => {
      const { resetTime } =
        (req as typeof req & { rateLimit?: { resetTime?: Date } }).rateLimit ?? {};
      const left = resetTime ? resetTime.getTime() - Date.now() : minutes * 60_000;
      next(tooMany(Math.max(1, Math.ceil(left / 1000))));
    },
  });

/** Limits by address, mostly of what needs no sign-in, one set a server. Those by account are in `auth/attempts.ts`. */
export const buildRateLimits = () => ({
  signIn: byAddress({ minutes: 10, requests: 30, failuresOnly: true }),
  refresh: byAddress({ minutes: 1, requests: 120 }),
  resetRequest: byAddress({ minutes: 60, requests: 20 }),
  links: byAddress({ minutes: 10, requests: 30, failuresOnly: true }),
  sign: byAddress({ minutes: 10, requests: 20, failuresOnly: true }),
  verification: byAddress({ minutes: 10, requests: 60 }),
  verificationMisses: byAddress({ minutes: 10, requests: 10, failuresOnly: true }),
});
