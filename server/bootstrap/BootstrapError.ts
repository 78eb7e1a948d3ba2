/** The product cannot start, for a reason that the person can mend: its message is all that is printed. */
export class BootstrapError extends Error {
  constructor(message: string, options?: ErrorOptions) {
    super(message, options);
    this.name = 'BootstrapError';
  }
}
