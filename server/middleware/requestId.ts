import { randomUUID } from 'node:crypto';
import type { RequestHandler } from 'express';

/** A name for the request, in its answer and in the log. */
export const requestId: RequestHandler = (_req, res, next) => {
  res.locals['requestId'] = randomUUID();
  res.setHeader('X-Request-Id', res.locals['requestId']);
  next();
};
