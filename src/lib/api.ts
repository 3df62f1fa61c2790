import { z } from 'zod';
import { problemSchema, type Problem } from '#shared/contracts/common';
import type { ErrorCode, ErrorData } from '#shared/errors';

/** A request that did not succeed. Read `code`; `message` is the server's one sentence for people. */
export class ApiError extends Error {
  readonly code: ErrorCode;
  /** HTTP status; 0 when no answer came. */
  readonly status: number;
  readonly detail: string;
  readonly data: ErrorData;
  /** For `invalid-input`: every field that did not fit, by its path. */
  readonly fields: NonNullable<Problem['fields']>;

  constructor(problem: Pick<Problem, 'code' | 'status' | 'detail' | 'data' | 'fields'>) {
    super(problem.detail);
    this.name = 'ApiError';
    this.code = problem.code;
    this.status = problem.status;
    this.detail = problem.detail;
    this.data = problem.data ?? {};
    this.fields = problem.fields ?? [];
  }
}

const NO_ANSWER = 'No connection to the studio. Nothing was changed; try again in a moment.';
const ODD_ANSWER = 'The answer could not be read. Load the page again; if it stays, tell whoever runs this studio.';

/** An answer that never came. */
export const unreachable = (): ApiError => new ApiError({ code: 'unavailable', status: 0, detail: NO_ANSWER });

/**
 * The error that a failed answer speaks of. A body that is no problem document (a proxy's page, say)
 * becomes `unavailable` for 502–504 and `bug` otherwise.
 */
export function errorFromAnswer(status: number, body: unknown): ApiError {
  const problem = problemSchema.safeParse(body);
  if (problem.success) return new ApiError(problem.data);
  const isAway = status === 502 || status === 503 || status === 504;
  return new ApiError({ code: isAway ? 'unavailable' : 'bug', status, detail: isAway ? NO_ANSWER : ODD_ANSWER });
}

/** A body that the schema accepts. @throws ApiError `bug` for any other. */
export function readAnswer<T>(schema: z.ZodType<T, unknown>, body: unknown, status: number): T {
  const parsed = schema.safeParse(body);
  if (parsed.success) return parsed.data;
  throw new ApiError({ code: 'bug', status, detail: ODD_ANSWER, data: { issues: z.prettifyError(parsed.error) } });
}

export interface RequestOptions {
  readonly signal?: AbortSignal;
  /** Lets a request outlive the page, for saves that start while it closes. */
  readonly keepalive?: boolean;
  readonly headers?: Readonly<Record<string, string>>;
}

type Method = 'GET' | 'POST' | 'PATCH' | 'DELETE';

async function request<T>(
  method: Method,
  path: string,
  schema: z.ZodType<T, unknown>,
  body: unknown,
  { signal, keepalive, headers }: RequestOptions,
): Promise<T> {
  let response: Response;
  let text: string;
  try {
    response = await fetch(`/api${path}`, {
      method,
      signal,
      keepalive,
      credentials: 'same-origin',
      headers: { Accept: 'application/json', ...(body !== undefined && { 'Content-Type': 'application/json' }), ...headers },
      body: body === undefined ? undefined : JSON.stringify(body),
    });
    text = await response.text();
  } catch (error) {
    if (signal?.aborted) throw error;
    throw unreachable();
  }
  const answer = parseJson(text);
  if (!response.ok) throw errorFromAnswer(response.status, answer);
  return readAnswer(schema, answer, response.status);
}

/** JSON, or undefined for an empty body and for anything that is not JSON. */
export function parseJson(text: string): unknown {
  if (text === '') return undefined;
  try {
    return JSON.parse(text);
  } catch {
    return undefined;
  }
}

/** An answer without content. */
export const noContent = z.unknown().transform(() => undefined);

/** The typed client. Paths are under `/api`; every answer is checked against its schema. All throw `ApiError`. */
export const api = {
  get: <T>(path: string, schema: z.ZodType<T, unknown>, options: RequestOptions = {}) =>
    request('GET', path, schema, undefined, options),
  post: <T>(path: string, schema: z.ZodType<T, unknown>, body?: unknown, options: RequestOptions = {}) =>
    request('POST', path, schema, body, options),
  patch: <T>(path: string, schema: z.ZodType<T, unknown>, body: unknown, options: RequestOptions = {}) =>
    request('PATCH', path, schema, body, options),
  delete: (path: string, options: RequestOptions = {}) => request('DELETE', path, noContent, undefined, options),
};
