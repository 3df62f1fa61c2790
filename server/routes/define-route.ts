import type { Request, RequestHandler, Response } from 'express';
import type { z } from 'zod';
import type { ErrorCode } from '../../shared/errors';
import type { Actor, Target } from '../../shared/model/people';
import type { Permission } from '../../shared/permissions';

export type Method = 'get' | 'post' | 'patch' | 'delete';

/** What comes back when all goes well. */
export type Answer =
  | { readonly status: 200 | 201 | 202; readonly schema: z.ZodType }
  | { readonly status: 204 }
  /** The handler writes the response itself, in one of these media types. */
  | { readonly status: 200; readonly streams: readonly string[] };

/** A body that is not JSON: the handler reads the request's stream itself, once access is decided. */
export interface MultipartBody {
  readonly multipart: z.ZodType;
  /** Names of the parts that are files. */
  readonly files: readonly string[];
}

type DeepReadonly<T> = T extends string | number | boolean | null | undefined
  ? T
  : T extends readonly (infer U)[]
    ? readonly DeepReadonly<U>[]
    : { readonly [K in keyof T]: DeepReadonly<T[K]> };

type Output<T> = T extends z.ZodType ? z.output<T> : undefined;
type AnswerBody<A> = A extends { readonly schema: infer S extends z.ZodType } ? DeepReadonly<z.output<S>> : void;

interface Shape<P, Q, B, A extends Answer> {
  readonly method: Method;
  /** Under `/api`, with `:name` for parameters. */
  readonly path: `/${string}`;
  /** One line for the API's description. */
  readonly summary: string;
  readonly params?: P;
  readonly query?: Q;
  readonly body?: B;
  /** Most bytes of a JSON body. */
  readonly maxBodyBytes?: number;
  readonly answer: A;
  /** Error codes beyond those that every route can give. */
  readonly errors?: readonly ErrorCode[];
  /** Run after the body is parsed and before `handle`: attempt limits. */
  readonly use?: readonly RequestHandler[];
}

interface Handed<P, Q, B> {
  readonly actor: Actor;
  readonly params: Output<P>;
  readonly query: Output<Q>;
  readonly body: Output<B>;
  readonly req: Request;
  readonly res: Response;
}

/** What a guarded route is about: what `can` is asked, and the thing itself. */
export interface Located<S> {
  readonly target: Target;
  readonly subject: S;
}

/** One row of the table of routes, ready to be served and described. */
export interface Route {
  readonly method: Method;
  readonly path: `/${string}`;
  readonly summary: string;
  readonly params?: z.ZodType;
  readonly query?: z.ZodType;
  readonly body?: z.ZodType | MultipartBody;
  readonly maxBodyBytes?: number;
  readonly answer: Answer;
  readonly errors?: readonly ErrorCode[];
  readonly use?: readonly RequestHandler[];
  /** `public`: anybody. `signed-in`: anybody with an account. Otherwise the permission that is needed. */
  readonly access: 'public' | 'signed-in' | Permission;
  readonly locate?: (input: { readonly params: unknown; readonly query: unknown; readonly actor: Actor }) => Promise<Located<unknown>>;
  readonly handle: (input: Handed<z.ZodType, z.ZodType, z.ZodType> & Located<unknown>) => Promise<unknown>;
}

/**
 * A route that needs a permission on something. Access is decided here and nowhere else: whoever is signed out
 * gets 401, an outsider 404, a member who may see but not do it 403, and only then is the body read.
 *
 * `on` names the thing and throws AppError('not-found') where there is none.
 */
export function guardedRoute<
  S,
  A extends Answer,
  P extends z.ZodType | undefined = undefined,
  Q extends z.ZodType | undefined = undefined,
  B extends z.ZodType | MultipartBody | undefined = undefined,
>(
  route: Shape<P, Q, B, A> & {
    readonly needs: Permission;
    readonly on: (params: Output<P>, query: Output<Q>, actor: Actor) => Promise<Located<S>> | Located<S>;
    readonly handle: (input: Handed<P, Q, B> & Located<S>) => Promise<AnswerBody<A>>;
  },
): Route {
  const { needs, on, handle, ...shape } = route;
  return {
    ...(shape as Shape<z.ZodType, z.ZodType, z.ZodType | MultipartBody, Answer>),
    access: needs,
    // The server parses params, query and body with this very route's schemas before it calls either function.
    locate: async ({ params, query, actor }) => on(params as Output<P>, query as Output<Q>, actor),
    handle: handle as unknown as Route['handle'],
  };
}

/** The only other way in: a route for everybody, or for everybody who is signed in. */
export function publicRoute<
  A extends Answer,
  P extends z.ZodType | undefined = undefined,
  Q extends z.ZodType | undefined = undefined,
  B extends z.ZodType | MultipartBody | undefined = undefined,
>(
  route: Shape<P, Q, B, A> & {
    readonly access: 'public' | 'signed-in';
    readonly handle: (input: Handed<P, Q, B>) => Promise<AnswerBody<A>>;
  },
): Route {
  const { access, handle, ...shape } = route;
  return {
    ...(shape as Shape<z.ZodType, z.ZodType, z.ZodType | MultipartBody, Answer>),
    access,
    handle: handle as unknown as Route['handle'],
  };
}
