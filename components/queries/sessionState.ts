import type { Me, Session } from '@/shared/accounts/types';

/** Where a person stands with the server. */
export type SessionState =
  /** Asking whether the cookie still holds. */
  | { is: 'starting' }
  /** The server did not answer that. */
  | { is: 'unreachable'; error: unknown }
  /** `byChoice`: the next to sign in need not be led back to where this person was. */
  | { is: 'signedOut'; byChoice: boolean }
  | { is: 'signedIn'; me: Me }
  /** Ended under the hands: screens stay as they are until the person is back. */
  | { is: 'interrupted'; me: Me };

export type SessionEvent =
  | { type: 'start' }
  | { type: 'opened'; session: Session }
  | { type: 'noSession' }
  | { type: 'left' }
  | { type: 'failed'; error: unknown }
  | { type: 'ended' }
  | { type: 'changed'; me: Me };

export function sessionReducer(state: SessionState, event: SessionEvent): SessionState {
  switch (event.type) {
    case 'start':
      return { is: 'starting' };
    case 'opened':
      return { is: 'signedIn', me: event.session.me };
    case 'noSession':
      return { is: 'signedOut', byChoice: false };
    case 'left':
      return { is: 'signedOut', byChoice: true };
    case 'failed':
      return { is: 'unreachable', error: event.error };
    case 'ended':
      return state.is === 'signedIn' ? { is: 'interrupted', me: state.me } : state;
    case 'changed':
      return state.is === 'signedIn' ? { ...state, me: event.me } : state;
  }
}
