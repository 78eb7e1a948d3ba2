import { keepSession, whenSessionEnds } from '@/components/queries/accessToken';
import type { Session } from '@/shared/accounts/types';
import { api } from '@/components/queries/apiClient';

type Answer = { status: number; body?: unknown };

/** A network that answers by path, and remembers what was asked. */
function network(answer: (path: string, token: string | null) => Answer | 'down') {
  const calls: string[] = [];
  global.fetch = jest.fn(async (input: RequestInfo | URL, init: RequestInit = {}) => {
    const path = String(input);
    const headers = init.headers as Record<string, string> | undefined;
    calls.push(`${init.method} ${path}`);
    const given = answer(path, headers?.Authorization ?? null);
    if (given === 'down') throw new TypeError('Failed to fetch');
    return {
      ok: given.status < 400,
      status: given.status,
      json: async () => {
        if (given.body === undefined) throw new SyntaxError('no body');
        return given.body;
      },
    } as Response;
  });
  return calls;
}
const refused = (code: string) => ({ error: { code, message: code } });
const sessionOf = (id: number, accessToken: string): Session => ({
  accessToken,
  expiresIn: 600,
  me: {
    id,
    email: 'a@firm.example',
    name: 'A',
    roles: ['modeller'],
    firm: { id: 1, name: 'Firm' },
    qualification: null,
    registrationNumber: null,
  },
});

afterEach(() => {
  keepSession(null);
  whenSessionEnds(() => undefined);
});

test('a token that ran out is renewed once for all calls under way, and the calls are made again', async () => {
  keepSession(sessionOf(1, 'old'));
  const calls = network((path, token) => {
    if (path === '/api/auth/refresh') return { status: 200, body: sessionOf(1, 'new') };
    return token === 'Bearer new'
      ? { status: 200, body: path }
      : { status: 401, body: refused('unauthenticated') };
  });
  const answers = await Promise.all([api.get('/studies'), api.get('/me')]);
  expect(answers).toEqual(['/api/studies', '/api/me']);
  expect(calls.filter((call) => call === 'POST /api/auth/refresh')).toHaveLength(1);
});

test('when there is nothing to renew by, the application is told and the call fails', async () => {
  keepSession(sessionOf(1, 'old'));
  const ended = jest.fn();
  whenSessionEnds(ended);
  network(() => ({ status: 401, body: refused('unauthenticated') }));
  await expect(api.get('/studies')).rejects.toMatchObject({ code: 'unauthenticated' });
  expect(ended).toHaveBeenCalledTimes(1);
});

test('a renewal that brings somebody else sends nothing in their name', async () => {
  keepSession(sessionOf(1, 'old'));
  const ended = jest.fn();
  whenSessionEnds(ended);
  const calls = network((path) =>
    path === '/api/auth/refresh'
      ? { status: 200, body: sessionOf(2, 'other') }
      : { status: 401, body: refused('unauthenticated') },
  );
  await expect(api.post('/studies', {})).rejects.toMatchObject({ code: 'unauthenticated' });
  expect(calls).toEqual(['POST /api/studies', 'POST /api/auth/refresh']);
  expect(ended).toHaveBeenCalledTimes(1);
});

test('a server that does not answer the renewal does not end the session', async () => {
  keepSession(sessionOf(1, 'old'));
  const ended = jest.fn();
  whenSessionEnds(ended);
  network((path) =>
    path === '/api/auth/refresh' ? 'down' : { status: 401, body: refused('unauthenticated') },
  );
  await expect(api.get('/studies')).rejects.toMatchObject({ code: 'unreachable' });
  expect(ended).not.toHaveBeenCalled();
});

test('a wrong password is an answer, not a session that ended', async () => {
  const calls = network(() => ({ status: 401, body: refused('signInFailed') }));
  await expect(api.post('/auth/sign-in', {})).rejects.toMatchObject({ code: 'signInFailed' });
  expect(calls).toEqual(['POST /api/auth/sign-in']);
});

test('faults, details and reference come with the error', async () => {
  network(() => ({
    status: 422,
    body: {
      error: {
        code: 'invalid',
        message: 'Not taken.',
        faults: [{ path: 'title', message: 'Give the study a title.' }],
        requestId: 'r-1',
      },
    },
  }));
  await expect(api.post('/studies', {})).rejects.toMatchObject({
    faults: [{ path: 'title', message: 'Give the study a title.' }],
    requestId: 'r-1',
  });
});

test('an answer without a body of ours is still an error in words', async () => {
  network(() => ({ status: 502 }));
  await expect(api.get('/studies')).rejects.toMatchObject({ code: 'unavailable' });
});

test('the query leaves out what is not known; 204 has no body', async () => {
  const calls = network(() => ({ status: 204 }));
  await expect(
    api.get('/runs/1/series', { query: { chainage: 10_600, at: undefined } }),
  ).resolves.toBeUndefined();
  expect(calls).toEqual(['GET /api/runs/1/series?chainage=10600']);
});
