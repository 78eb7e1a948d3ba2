/** Error codes of the API. The client switches on the code, never on the words. */
export const ERROR_CODES = [
  'invalid', // the body or the query breaks its schema: 422, with faults
  'unauthenticated', // no token, or one that no longer holds: 401
  'signInFailed', // wrong e-mail or password, told alike: 401
  'forbidden', // the record may be seen, the action not: 403
  'notFound', // does not exist, or may not be seen: 404
  'conflict', // changed by somebody else, or in a state that forbids it: 409
  'gone', // a one-time link that was used or has run out: 410
  'tooLarge', // over a limit of size: 413
  'tooMany', // rate limit: 429
  'surveyRefused', // a survey file with faults: 422, with the reading
  'scenarioIncomplete', // a run was asked of a scenario with faults: 422
  'unreadable', // a file that cannot be read at all: 422
  'timeout', // parsing took too long: 422
  'internal', // ours: 500
  'unavailable', // the database does not answer: 503
] as const;
export type ErrorCode = (typeof ERROR_CODES)[number];

/** One fault of what was sent: where, what is wrong, and what would be right. */
export interface Fault {
  /** Path into the body, e.g. `inflow.times[3]`. */
  path: string;
  message: string;
}

/** What every answer with a status of 400 or more carries. */
export interface ErrorBody {
  error: {
    code: ErrorCode;
    /** What happened, what it means for the work, what to do next. */
    message: string;
    faults?: Fault[];
    /** Code-specific, e.g. the reading of a refused survey. */
    details?: unknown;
    /** To be quoted to whoever runs the server. */
    requestId?: string;
  };
}
