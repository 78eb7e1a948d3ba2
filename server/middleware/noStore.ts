import type { RequestHandler } from 'express';

/** Answers of the API are nobody's to keep unless a route says otherwise. */
export const noStore: RequestHandler = (_req, res, next) => {
  res.setHeader('Cache-Control', 'no-store');
  next();
};
