import { QueryClientProvider } from '@tanstack/react-query';
import { act, fireEvent, render, screen } from '@testing-library/react';
import { keepSession } from '@/components/queries/accessToken';
import { api } from '@/components/queries/apiClient';
import { createQueryClient } from '@/components/queries/queryClient';
import { SessionProvider, useSession } from '@/components/queries/SessionProvider';
import type { Session } from '@/shared/accounts/types';

const session: Session = {
  accessToken: 'a',
  expiresIn: 600,
  me: {
    id: 1,
    email: 'ines@pykemorrow.example',
    name: 'Ines Corrow',
    roles: ['modeller'],
    firm: { id: 1, name: 'Pyke Morrow Hydraulics' },
    qualification: null,
    registrationNumber: null,
  },
};

/** Answers by path; null: no connection. */
function server(answers: Record<string, { status: number; body: unknown } | null>) {
  global.fetch = jest.fn(async (input: RequestInfo | URL) => {
    const answer = answers[String(input)];
    if (!answer) throw new TypeError('Failed to fetch');
    return {
      ok: answer.status < 400,
      status: answer.status,
      json: async () => answer.body,
    } as Response;
  });
}
const unauthenticated = { status: 401, body: { error: { code: 'unauthenticated', message: '' } } };
const renewed = { status: 200, body: session };

function Bench() {
  const { state, start, signOut } = useSession();
  return (
    <>
      <p>{state.is}</p>
      <button onClick={start}>again</button>
      <button onClick={() => void signOut()}>sign out</button>
    </>
  );
}
const show = () =>
  render(
    <QueryClientProvider client={createQueryClient()}>
      <SessionProvider>
        <Bench />
      </SessionProvider>
    </QueryClientProvider>,
  );

afterEach(() => keepSession(null));

test('a cookie that holds opens the session', async () => {
  server({ '/api/auth/refresh': renewed });
  show();
  expect(screen.getByText('starting')).toBeTruthy();
  expect(await screen.findByText('signedIn')).toBeTruthy();
});

test('without one nobody is signed in', async () => {
  server({ '/api/auth/refresh': unauthenticated });
  show();
  expect(await screen.findByText('signedOut')).toBeTruthy();
});

test('a server that is away is asked again on request', async () => {
  server({});
  show();
  expect(await screen.findByText('unreachable')).toBeTruthy();
  server({ '/api/auth/refresh': renewed });
  fireEvent.click(screen.getByText('again'));
  expect(await screen.findByText('signedIn')).toBeTruthy();
});

test('a session that ends in the middle of a call interrupts, it does not throw out', async () => {
  server({ '/api/auth/refresh': renewed });
  show();
  await screen.findByText('signedIn');
  server({ '/api/auth/refresh': unauthenticated, '/api/studies': unauthenticated });
  await act(() => api.get('/studies').catch(() => undefined));
  expect(screen.getByText('interrupted')).toBeTruthy();
});

test('signing out forgets the session', async () => {
  server({ '/api/auth/refresh': renewed, '/api/auth/sign-out': { status: 204, body: null } });
  show();
  await screen.findByText('signedIn');
  fireEvent.click(screen.getByText('sign out'));
  expect(await screen.findByText('signedOut')).toBeTruthy();
});
