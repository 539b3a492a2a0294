/** The command line itself cannot be followed; `fix` says how to put it. */
export class UsageError extends Error {
  constructor(
    message: string,
    readonly fix: string,
  ) {
    super(message);
    this.name = 'UsageError';
  }
}
