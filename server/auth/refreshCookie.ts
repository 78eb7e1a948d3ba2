import type { CookieOptions, Request, Response } from 'express';

const NAME = 'spate_refresh';

/** Seen by no script, sent to no other site, and to the routes of signing in alone. */
const optionsFor = (publicUrl: string): CookieOptions => ({
  httpOnly: true,
  sameSite: 'strict',
  secure: publicUrl.startsWith('https:'),
  path: '/api/auth',
});

export const setRefreshCookie = (res: Response, publicUrl: string, token: string, expires: Date) =>
  res.cookie(NAME, token, { ...optionsFor(publicUrl), expires });

export const clearRefreshCookie = (res: Response, publicUrl: string) =>
  res.clearCookie(NAME, optionsFor(publicUrl));

export const readRefreshCookie = (req: Request): string | null => {
  const value = (req.cookies as Record<string, unknown> | undefined)?.[NAME];
  return typeof value === 'string' && value.length > 0 && value.length <= 200 ? value : null;
};
