import { sessionReducer, type SessionState } from '@/components/queries/sessionState';
import type { Me, Session } from '@/shared/accounts/types';

const me: Me = {
  id: 1,
  email: 'ines@pykemorrow.example',
  name: 'Ines Corrow',
  roles: ['modeller'],
  firm: { id: 1, name: 'Pyke Morrow Hydraulics' },
  qualification: null,
  registrationNumber: null,
};
const session: Session = { accessToken: 'a', expiresIn: 600, me };
const signedIn: SessionState = { is: 'signedIn', me };

test('a session that ends under the hands keeps the screen, and signing in again goes on', () => {
  const interrupted = sessionReducer(signedIn, { type: 'ended' });
  expect(interrupted).toEqual({ is: 'interrupted', me });
  expect(sessionReducer(interrupted, { type: 'opened', session })).toEqual(signedIn);
});

test('who was never in is not interrupted', () => {
  expect(sessionReducer({ is: 'signedOut' }, { type: 'ended' })).toEqual({ is: 'signedOut' });
});

test('no answer is not the same as no session', () => {
  const error = new Error('down');
  expect(sessionReducer({ is: 'starting' }, { type: 'failed', error })).toEqual({
    is: 'unreachable',
    error,
  });
  expect(sessionReducer({ is: 'starting' }, { type: 'noSession' })).toEqual({ is: 'signedOut' });
});
