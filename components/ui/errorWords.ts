import { ApiError } from '../queries/ApiError';

interface ErrorWords {
  message: string;
  /** To be quoted to whoever runs the server. */
  reference?: string;
}

/** Any failure in words that a person can act on. */
export function errorWords(error: unknown): ErrorWords {
  if (error instanceof ApiError) {
    return {
      message: error.message,
      reference: error.code === 'internal' ? error.requestId : undefined,
    };
  }
  return {
    message:
      'Something went wrong in this page. Nothing was sent. Load the page again and repeat the step.',
  };
}
