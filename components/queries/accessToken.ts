import type { Session } from '@/shared/accounts/types';
import { ApiError } from './ApiError';

/** The access token lives in memory alone; the refresh token in a cookie that no script can read. */
let current: Pick<Session, 'accessToken' | 'me'> | null = null;
let renewing: Promise<Session> | null = null;
let onEnded: () => void = () => undefined;

export const getAccessToken = (): string | null => current?.accessToken ?? null;

/** Whose session this page goes on with; null forgets it. */
export function keepSession(session: Session | null): void {
  current = session;
}

/** Called when the session ends without the person asking for it. */
export function whenSessionEnds(listener: () => void): void {
  onEnded = listener;
}

/** One refresh at a time over all tabs: the refresh token rotates, and the use of an old one ends the session. */
async function withLock<T>(task: () => Promise<T>): Promise<T> {
  return 'locks' in navigator ? navigator.locks.request('spate-refresh', task) : task();
}

async function refresh(): Promise<Session> {
  // Kept alive over a reload in its middle: the successor of a token that was used must not be lost.
  const response = await fetch('/api/auth/refresh', { method: 'POST', keepalive: true }).catch(
    () => {
      throw ApiError.unreachable();
    },
  );
  if (!response.ok) throw await ApiError.of(response);
  return (await response.json()) as Session;
}

/** A new session by the cookie. Throws ApiError: `unauthenticated` when there is none to go on with. */
export function renewSession(): Promise<Session> {
  renewing ??= withLock(refresh).finally(() => {
    renewing = null;
  });
  return renewing;
}

/** The same in the middle of a call: tells the application when the session is over. */
export async function renewInFlight(): Promise<void> {
  const owner = current?.me.id;
  try {
    const session = await renewSession();
    // Somebody else has signed in from another tab: what this page holds must not be sent in their name.
    if (session.me.id !== owner)
      throw new ApiError('unauthenticated', 'Another person has signed in.');
    current = session;
  } catch (error) {
    if (error instanceof ApiError && error.code === 'unauthenticated') {
      current = null;
      onEnded();
    }
    throw error;
  }
}
