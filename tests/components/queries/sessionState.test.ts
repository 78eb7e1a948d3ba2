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
const nobody: SessionState = { is: 'signedOut', byChoice: false };
const signedIn: SessionState = { is: 'signedIn', me };

test('a session that ends under the hands keeps the screen, and signing in again goes on', () => {
  const interrupted = sessionReducer(signedIn, { type: 'ended' });
  expect(interrupted).toEqual({ is: 'interrupted', me });
  expect(sessionReducer(interrupted, { type: 'opened', session })).toEqual(signedIn);
});

test('who was never in is not interrupted', () => {
  expect(sessionReducer(nobody, { type: 'ended' })).toEqual(nobody);
});

test('no answer is not the same as no session', () => {
  const error = new Error('down');
  expect(sessionReducer({ is: 'starting' }, { type: 'failed', error })).toEqual({
    is: 'unreachable',
    error,
  });
  expect(sessionReducer({ is: 'starting' }, { type: 'noSession' })).toEqual(nobody);
});

test('who leaves by choice is not led back', () => {
  expect(sessionReducer(signedIn, { type: 'left' })).toEqual({ is: 'signedOut', byChoice: true });
});
