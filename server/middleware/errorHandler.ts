import type { ErrorRequestHandler } from 'express';
import { MulterError } from 'multer';
import type { Logger } from 'pino';
import { BaseError, ConnectionError, ConnectionAcquireTimeoutError } from 'sequelize';
import type { ErrorBody } from '../../shared/errors';
import { AppError } from '../errors';

/** The only place that turns errors into answers. */
export function errorHandler(log: Logger): ErrorRequestHandler {
  return (error: unknown, req, res, next) => {
    const requestId = res.locals['requestId'] as string;
    const answer = asAppError(error);
    res.locals['errorCode'] = answer.code;
    if (answer.status >= 500)
      log.error({ err: error, requestId, method: req.method, path: req.path }, 'request failed');
    // Half an answer is on its way: only cutting the connection tells the other end.
    if (res.headersSent) return next(error);
    const { code, message, faults, details, retryAfter } = answer;
    if (retryAfter !== undefined) res.setHeader('Retry-After', String(retryAfter));
    res.setHeader('Cache-Control', 'no-store');
    const body: ErrorBody = { error: { code, message, faults, details, requestId } };
    res.status(answer.status).json(body);
  };
}

function asAppError(error: unknown): AppError {
  if (error instanceof AppError) return error;
  if (error instanceof MulterError) {
    return error.code === 'LIMIT_FILE_SIZE'
      ? new AppError(
          'tooLarge',
          'The file is larger than is taken. Split it, or leave out what is not needed.',
        )
      : new AppError(
          'unreadable',
          'The form was not sent as expected. Choose the file again and send it once more.',
        );
  }
  if (error instanceof ConnectionError || error instanceof ConnectionAcquireTimeoutError)
    return new AppError(
      'unavailable',
      'The database does not answer. Nothing was stored; try again in a minute.',
      {
        retryAfter: 30,
      },
    );
  if (!(error instanceof BaseError)) {
    // Faults that the framework found in the request itself: a body that is no JSON, one too large, a bad address.
    const status = (error as { status?: unknown } | null)?.status;
    if (status === 413) return new AppError('tooLarge', 'What was sent is larger than is taken.');
    if (typeof status === 'number' && status >= 400 && status < 500)
      return new AppError(
        'invalid',
        'What was sent could not be read. Reload the page and try again.',
      );
  }
  return new AppError(
    'internal',
    'Something went wrong on our side and was noted. Nothing was stored; try again, and quote the number of this request if it stays.',
  );
}
