import { AsyncLocalStorage } from 'node:async_hooks';
import type { Actor } from '../policies/subject';

/** The request that work is done for. */
export interface RequestContext {
  address: string | null;
  /** Who asks, once that is known. */
  actor: () => Actor | undefined;
  /** Whether something was written into the audit trail already. */
  noted: boolean;
}

/** Follows a request through the services, so that none of them must hand its address on. */
export const requestContext = new AsyncLocalStorage<RequestContext>();
