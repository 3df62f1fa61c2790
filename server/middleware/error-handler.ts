import type { ErrorRequestHandler } from 'express';
import { problemSchema, type Problem } from '../../shared/contracts/common';
import { AppError, type ErrorCode } from '../../shared/errors';
import { errorSentence, errorTitle } from '../../shared/words/en/errors';
import { asMachineFailure, isGone } from '../services/database-errors';

/** The only place that knows HTTP statuses; a new ErrorCode does not compile until it is mapped. */
export const STATUS: Record<ErrorCode, number> = {
  'invalid-input': 400,
  unauthenticated: 401,
  'sign-in-failed': 401,
  forbidden: 403,
  'cross-site': 403,
  'not-found': 404,
  'already-exists': 409,
  'in-use': 409,
  'stash-short': 409,
  'stale-revision': 409,
  'too-large': 413,
  'document-refused': 422,
  'picture-refused': 422,
  'reading-refused': 422,
  'too-many-requests': 429,
  bug: 500,
  unavailable: 503,
  'quota-exceeded': 507,
  'disk-full': 507,
};

export const PROBLEM_TYPE = 'application/problem+json';

/** Answers every failure as RFC 9457 problem details; what nobody expected is logged and told without detail. */
export const handleErrors: ErrorRequestHandler = (error: unknown, req, res, next) => {
  const known = asAppError(error);
  const failure = known ? null : asMachineFailure(error);
  if (known) req.log.debug({ code: known.code }, 'refused');
  else if (failure) req.log.warn({ err: error, code: failure.code }, 'the machine failed');
  else req.log.error({ err: error }, 'unexpected error');
  if (res.headersSent) return next(error);
  const problem = presentProblem(known ?? failure ?? new AppError('bug'), req.originalUrl.split('?')[0] ?? '/');
  if (problem.status === 503 && !res.hasHeader('Retry-After')) res.set('Retry-After', '5');
  res.status(problem.status).set('Cache-Control', 'no-store').type(PROBLEM_TYPE).send(JSON.stringify(problem));
};

export function presentProblem({ code, data }: AppError, instance: string): Problem {
  const { fields, ...rest } = data;
  return {
    type: `urn:pairleaf:problem:${code}`,
    title: errorTitle(code),
    status: STATUS[code],
    detail: errorSentence(code, data),
    instance,
    code,
    ...(fields !== undefined && { fields: problemSchema.shape.fields.parse(fields) }),
    ...(Object.keys(rest).length > 0 && { data: rest }),
  };
}

/** Expected failures of our own and of the body parser; null for a bug. */
function asAppError(error: unknown): AppError | null {
  if (error instanceof AppError) return error;
  if (error instanceof URIError || isGone(error)) return new AppError('not-found');
  switch (typeof error === 'object' && error !== null && 'type' in error ? error.type : undefined) {
    case 'entity.too.large':
      return new AppError('too-large');
    case 'entity.parse.failed':
    case 'encoding.unsupported':
    case 'charset.unsupported':
    case 'request.size.invalid':
    case 'request.aborted':
      return new AppError('invalid-input', { where: 'body' });
    default:
      return fromStatus(error);
  }
}

/** Express and its static files say with a status what the request itself is to blame for. */
function fromStatus(error: unknown): AppError | null {
  const status = typeof error === 'object' && error !== null && 'status' in error ? error.status : undefined;
  if (status === 404) return new AppError('not-found');
  return typeof status === 'number' && status >= 400 && status < 500 ? new AppError('invalid-input') : null;
}
