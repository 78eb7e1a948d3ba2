import { ROLES, type Role } from '../../../shared/accounts/roles';
import { decide } from '../../../server/policies/decide';
import { POLICIES, type Action } from '../../../server/policies/policies';
import type { Subject } from '../../../server/policies/subject';

const ACTIONS = Object.keys(POLICIES) as Action[];
const actor = (...roles: Role[]) => ({ id: 1, firmId: 10, roles });
const everything: Subject = { firmId: 10, memberAs: 'surveyor', ownerId: 1, issued: true };

test('no role, nor all of them together, opens another firm', () => {
  for (const action of ACTIONS)
    expect([action, decide(actor(...ROLES), action, { ...everything, firmId: 11 })]).toEqual([
      action,
      'notFound',
    ]);
});

test('who has no role may do nothing', () => {
  for (const action of ACTIONS) expect(decide(actor(), action, everything)).not.toBe('allowed');
});

test('of several roles one that allows is enough', () => {
  const study: Subject = { firmId: 10, memberAs: null };
  expect(decide(actor('administrator'), 'study.read', study)).toBe('notFound');
  expect(decide(actor('administrator', 'modeller'), 'study.read', study)).toBe('allowed');
  expect(decide(actor('client', 'modeller'), 'run.request', study)).toBe('allowed');
});

test('a role and a membership must agree', () => {
  const asClient: Subject = { firmId: 10, memberAs: 'client' };
  expect(decide(actor('surveyor'), 'study.read', asClient)).toBe('notFound');
  expect(decide(actor('client'), 'study.read', asClient)).toBe('allowed');
  expect(decide(actor('administrator'), 'study.read', asClient)).toBe('notFound');
});

test('a surveyor reads their own surveys only while they are in the study', () => {
  const own: Subject = { firmId: 10, memberAs: 'surveyor', ownerId: 1 };
  expect(decide(actor('surveyor'), 'survey.read', own)).toBe('allowed');
  expect(decide(actor('surveyor'), 'survey.read', { ...own, ownerId: 2 })).toBe('notFound');
  expect(decide(actor('surveyor'), 'survey.read', { ...own, memberAs: null })).toBe('notFound');
});

test('a client sees no run itself, issued or not', () => {
  const shared: Subject = { firmId: 10, memberAs: 'client', issued: true };
  expect(decide(actor('client'), 'run.read', shared)).toBe('notFound');
});
