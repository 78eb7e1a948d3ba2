import type { Request, RequestHandler, Response } from 'express';

/** Whether the token of a request that goes on for long holds still: asks the database anew. */
export const stillSignedIn = (
  authenticate: RequestHandler,
  req: Request,
  res: Response,
): Promise<boolean> =>
  new Promise((resolve) => void authenticate(req, res, (error?: unknown) => resolve(!error)));
