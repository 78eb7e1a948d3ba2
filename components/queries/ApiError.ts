import type { ErrorBody, ErrorCode, Fault } from '@/shared/errors';

/** `unreachable` is ours: no answer came at all. */
export type ClientErrorCode = ErrorCode | 'unreachable';

/** What a call of the API failed with. Switch on the code, show the message. */
export class ApiError extends Error {
  constructor(
    readonly code: ClientErrorCode,
    message: string,
    readonly faults: Fault[] = [],
    readonly details: unknown = undefined,
    readonly requestId: string | undefined = undefined,
  ) {
    super(message);
    this.name = 'ApiError';
  }

  static unreachable(): ApiError {
    return new ApiError(
      'unreachable',
      'No answer from the server. What you typed is still here. Check the connection and try again.',
    );
  }

  /** From an answer with a status of 400 or more. */
  static async of(response: Response): Promise<ApiError> {
    try {
      const { error } = (await response.json()) as ErrorBody;
      return new ApiError(error.code, error.message, error.faults, error.details, error.requestId);
    } catch {
      const code =
        response.status === 404 ? 'notFound' : response.status >= 500 ? 'unavailable' : 'invalid';
      return new ApiError(
        code,
        `The server answered ${response.status} and gave no reason. Nothing was changed as far as this page knows. Try again in a moment.`,
      );
    }
  }
}

export const isApiError = (error: unknown, ...codes: ClientErrorCode[]): error is ApiError =>
  error instanceof ApiError && (codes.length === 0 || codes.includes(error.code));
