import type { Role } from '../../shared/accounts/roles';

/** Who asks. Read from the database with each request, never from the token alone. */
export interface Actor {
  id: number;
  firmId: number;
  roles: readonly Role[];
}

/** What a decision must know of the record that is asked for. A loader tells it beside the record. */
export interface Subject {
  firmId: number;
  /** What the person asking is in the record's study: studies are shared one by one with surveyors and clients. */
  memberAs?: 'surveyor' | 'client' | null;
  /** Who made it: a surveyor's own revisions, a modeller's own invitations. */
  ownerId?: number | null;
  /** Results that were issued to the client. */
  issued?: boolean;
}

/** A record with its subject; loaders answer null where there is none. */
export interface Loaded<R> {
  record: R;
  subject: Subject;
}

export type Condition = (actor: Actor, subject: Subject) => boolean;

/** Anything of the firm. */
export const inFirm: Condition = () => true;
export const asSurveyor: Condition = (_actor, subject) => subject.memberAs === 'surveyor';
export const asClient: Condition = (_actor, subject) => subject.memberAs === 'client';
export const own: Condition = (actor, subject) => subject.ownerId === actor.id;
export const notOwn: Condition = (actor, subject) => subject.ownerId !== actor.id;
export const issued: Condition = (_actor, subject) => subject.issued === true;
export const both =
  (first: Condition, second: Condition): Condition =>
  (actor, subject) =>
    first(actor, subject) && second(actor, subject);
