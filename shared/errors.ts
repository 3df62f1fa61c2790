/** The closed list of error codes; `server/middleware/error-handler.ts` maps each to a status. */
export const ERROR_CODES = [
  'invalid-input',
  'unauthenticated',
  'sign-in-failed',
  'forbidden',
  'not-found',
  'already-exists',
  'in-use',
  'stash-short',
  'stale-revision',
  'document-refused',
  'picture-refused',
  'reading-refused',
  'too-large',
  'too-many-requests',
  'quota-exceeded',
  'disk-full',
  'cross-site',
  'unavailable',
  'bug',
] as const;
export type ErrorCode = (typeof ERROR_CODES)[number];

/** Data that goes with a code, for the sentence and for the client. Plain JSON. */
export type ErrorData = Readonly<Record<string, unknown>>;

/** An expected failure: a code and data; the words come from `shared/words`. */
export class AppError extends Error {
  constructor(
    readonly code: ErrorCode,
    readonly data: ErrorData = {},
  ) {
    super(code);
    this.name = 'AppError';
  }
}
