import type { Request, RequestHandler, Response } from 'express';
import type { SignedIn } from '../auth/passport';
import { forbidden, notFound, unauthenticated } from '../errors';
import { decide } from '../policies/decide';
import type { Action } from '../policies/policies';
import type { Actor, Loaded } from '../policies/subject';

/** Finds the record that a route is about; null where there is none. */
export type Loader<R> = (req: Request, actor: Actor) => Promise<Loaded<R> | null>;

/** Carried by the handler, so that the table test can read which action a route declares. */
export interface DeclaredHandler extends RequestHandler {
  action: Action | 'public';
}

const RECORD = 'record';

/**
 * Lets pass who may do `action` to the record that `load` finds; without a loader the subject is the person's own firm.
 * What may not be seen answers 404. The record waits in `recordOf(res)`.
 */
export function authorize<R>(action: Action, load?: Loader<R>): DeclaredHandler {
  const handler: RequestHandler = async (req, res, next) => {
    const actor = actorOf(res);
    // For the audit trail, which is written when the routers have let go of the address.
    Object.assign(res.locals, { action, params: req.params });
    const loaded = load ? await load(req, actor) : { record: null, subject: actor };
    if (!loaded) throw notFound();
    const decision = decide(actor, action, loaded.subject);
    res.locals['refused'] = decision !== 'allowed';
    if (decision === 'notFound') throw notFound();
    res.locals[RECORD] = loaded.record;
    if (decision === 'forbidden') throw forbidden();
    next();
  };
  return Object.assign(handler, { action });
}

/** Declares that a route needs no sign-in. */
export const openToAll: DeclaredHandler = Object.assign(
  ((_req, _res, next) => next()) as RequestHandler,
  { action: 'public' as const },
);

/** Who asks; throws `unauthenticated` where `authenticate` did not run. */
export const actorOf = (res: Response): Actor => signedInOf(res);

/** The same with the session; throws alike. */
export function signedInOf(res: Response): SignedIn {
  const signedIn = res.locals['actor'] as SignedIn | undefined;
  if (!signedIn) throw unauthenticated();
  return signedIn;
}

/** What `authorize` loaded. */
export const recordOf = <R>(res: Response): R => res.locals[RECORD] as R;
