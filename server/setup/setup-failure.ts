/** A step of the set-up that failed: what failed, and what the person can do about it. */
export class SetupFailure extends Error {
  constructor(
    what: string,
    readonly advice: string,
    readonly output = '',
  ) {
    super(what);
    this.name = 'SetupFailure';
  }
}

/** The failure as the person reads it at the terminal. */
export function describeFailure(error: unknown): string {
  if (!(error instanceof SetupFailure)) return error instanceof Error ? (error.stack ?? error.message) : String(error);
  return [error.message, error.output.trim(), error.advice].filter(Boolean).join('\n');
}

/** The last lines of a program's output: where it says what went wrong. */
export const tailOf = (output: string, lines = 12): string => output.trim().split('\n').slice(-lines).join('\n');
