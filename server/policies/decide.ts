import { POLICIES, type Action, type Policy } from './policies';
import type { Actor, Subject } from './subject';

export type Decision = 'allowed' | 'forbidden' | 'notFound';

/** May this person do this to this record? Pure. */
export function decide(actor: Actor, action: Action, subject: Subject): Decision {
  if (subject.firmId !== actor.firmId) return 'notFound';
  const policy: Policy = POLICIES[action];
  if (actor.roles.some((role) => policy.grants[role]?.(actor, subject))) return 'allowed';
  if (typeof policy.refusal === 'string') return policy.refusal;
  return decide(actor, policy.refusal.seenBy as Action, subject) === 'allowed'
    ? 'forbidden'
    : 'notFound';
}

/** For presenters' `may` lists and for services that filter. */
export const may = (actor: Actor, action: Action, subject: Subject): boolean =>
  decide(actor, action, subject) === 'allowed';
