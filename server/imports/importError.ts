/** Why a file could not be read at all; faults inside a readable file are no errors but part of its reading. */
export type ImportErrorCode = 'unreadable' | 'tooLarge' | 'timeout';

export class ImportError extends Error {
  constructor(
    readonly code: ImportErrorCode,
    message: string,
  ) {
    super(message);
    this.name = 'ImportError';
  }
}

export const unreadable = (message: string) => new ImportError('unreadable', message);
export const tooLarge = (message: string) => new ImportError('tooLarge', message);
