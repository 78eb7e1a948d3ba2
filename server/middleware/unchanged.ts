import type { Request, Response } from 'express';

/**
 * For answers that never change under their name: gives them an entity tag, and answers 304 where the asker holds it.
 * They are kept by the asker alone and asked after each time, so that who lost the right does not see them again.
 */
export function unchanged(req: Request, res: Response, ...name: (string | number)[]): boolean {
  res.set({ ETag: `"${name.join('-')}"`, 'Cache-Control': 'private, no-cache' });
  if (!req.fresh) return false;
  res.status(304).end();
  return true;
}
