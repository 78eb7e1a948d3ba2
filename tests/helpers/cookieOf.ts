import type { Response } from 'supertest';

/** The refresh cookie that an answer sets, as a browser sends it back; null where it sets or keeps none. */
export function cookieOf(answer: Response): string | null {
  const [pair = ''] = setCookieOf(answer).split(';');
  return /^spate_refresh=.+/.test(pair) ? pair : null;
}

/** The whole Set-Cookie line; empty where there is none. */
export const setCookieOf = (answer: Response): string =>
  ((answer.headers['set-cookie'] as unknown as string[] | undefined) ?? []).find((line) =>
    line.startsWith('spate_refresh='),
  ) ?? '';
