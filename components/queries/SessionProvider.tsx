import { useQueryClient } from '@tanstack/react-query';
import {
  createContext,
  useCallback,
  useContext,
  useEffect,
  useMemo,
  useReducer,
  type ReactNode,
} from 'react';
import type { Me, Session } from '@/shared/accounts/types';
import { keepSession, renewSession, whenSessionEnds } from './accessToken';
import { api } from './apiClient';
import { isApiError } from './ApiError';
import { sessionReducer, type SessionState } from './sessionState';

interface SessionDoor {
  state: SessionState;
  /** After signing in, or accepting an invitation. */
  open: (session: Session) => void;
  /** Ends this session at the server, here and in the other tabs. */
  signOut: () => Promise<void>;
  /** Forgets the session, which the server has ended already. */
  forget: () => void;
  /** Asks the server again whether there is a session. */
  start: () => void;
  /** The person's own record has changed. */
  setMe: (me: Me) => void;
}

const SessionContext = createContext<SessionDoor | null>(null);
const CHANNEL = 'spate-session';

export function SessionProvider({ children }: { children: ReactNode }) {
  const [state, dispatch] = useReducer(sessionReducer, { is: 'starting' });
  const queryClient = useQueryClient();

  const start = useCallback(() => {
    dispatch({ type: 'start' });
    renewSession().then(
      (session) => {
        keepSession(session);
        dispatch({ type: 'opened', session });
      },
      (error: unknown) =>
        dispatch(
          isApiError(error, 'unauthenticated') ? { type: 'noSession' } : { type: 'failed', error },
        ),
    );
  }, []);

  const clear = useCallback(() => {
    keepSession(null);
    queryClient.clear();
    dispatch({ type: 'left' });
  }, [queryClient]);

  useEffect(() => {
    whenSessionEnds(() => dispatch({ type: 'ended' }));
    start();
  }, [start]);

  useEffect(() => {
    if (!('BroadcastChannel' in window)) return;
    const channel = new BroadcastChannel(CHANNEL);
    channel.onmessage = clear;
    return () => channel.close();
  }, [clear]);

  const door = useMemo<SessionDoor>(() => {
    const forget = () => {
      clear();
      if ('BroadcastChannel' in window) {
        const channel = new BroadcastChannel(CHANNEL);
        channel.postMessage('signedOut');
        channel.close();
      }
    };
    return {
      state,
      start,
      forget,
      open: (session) => {
        keepSession(session);
        dispatch({ type: 'opened', session });
      },
      signOut: async () => {
        await api.post('/auth/sign-out');
        forget();
      },
      setMe: (me) => dispatch({ type: 'changed', me }),
    };
  }, [state, start, clear]);
  return <SessionContext.Provider value={door}>{children}</SessionContext.Provider>;
}

export function useSession(): SessionDoor {
  const door = useContext(SessionContext);
  if (!door) throw new Error('useSession stands outside SessionProvider');
  return door;
}

/** The person who is signed in; only on screens behind the sign-in. */
export function useMe(): Me {
  const { state } = useSession();
  if (state.is !== 'signedIn' && state.is !== 'interrupted') {
    throw new Error('useMe stands outside the signed-in screens');
  }
  return state.me;
}
