import type { ErrorCode, Fault } from '../shared/errors';

/** Status of each code; the only place where the two meet. */
const STATUS: Record<ErrorCode, number> = {
  invalid: 422,
  unauthenticated: 401,
  signInFailed: 401,
  forbidden: 403,
  notFound: 404,
  conflict: 409,
  gone: 410,
  tooLarge: 413,
  tooMany: 429,
  surveyRefused: 422,
  scenarioIncomplete: 422,
  unreadable: 422,
  timeout: 422,
  internal: 500,
  unavailable: 503,
};

interface Extras {
  faults?: Fault[];
  details?: unknown;
  /** Seconds after which it is worth trying again. */
  retryAfter?: number;
  cause?: unknown;
}

/** An error that is answered as it stands. Everything else that is thrown is a fault of ours: 500. */
export class AppError extends Error {
  readonly status: number;
  readonly faults: Fault[] | undefined;
  readonly details: unknown;
  readonly retryAfter: number | undefined;

  constructor(
    readonly code: ErrorCode,
    message: string,
    { faults, details, retryAfter, cause }: Extras = {},
  ) {
    super(message, { cause });
    this.name = 'AppError';
    this.status = STATUS[code];
    this.faults = faults;
    this.details = details;
    this.retryAfter = retryAfter;
  }
}

export const notFound = (what = 'This page or record') =>
  new AppError(
    'notFound',
    `${what} does not exist, or is not shared with you. Check the address, or ask whoever sent it.`,
  );

export const forbidden = (
  message = 'Your role does not allow this. Ask an administrator of your firm.',
) => new AppError('forbidden', message);

export const conflict = (message: string, details?: unknown) =>
  new AppError('conflict', message, { details });

export const invalid = (faults: Fault[], message = 'Some of what was sent cannot be used.') =>
  new AppError('invalid', message, { faults });

export const unauthenticated = (message = 'Your sign-in has run out. Sign in again.') =>
  new AppError('unauthenticated', message);

export const gone = (message: string) => new AppError('gone', message);

export const tooMany = (retryAfter: number) =>
  new AppError(
    'tooMany',
    `Too many attempts. Wait ${retryAfter < 90 ? `${retryAfter} seconds` : `${Math.ceil(retryAfter / 60)} minutes`} and try again.`,
    { retryAfter },
  );
