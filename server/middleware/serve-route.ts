import express, { type Request, type RequestHandler, type Response } from 'express';
import type { z } from 'zod';
import { AppError } from '../../shared/errors';
import { authorise, isNobody } from '../routes/authorise';
import type { Answer, Located, MultipartBody, Route } from '../routes/define-route';
import { parseInput } from './parse-input';

/** Enough for any form; a route that takes more says so. */
const DEFAULT_BODY_BYTES = 64 * 1024;

const NOTHING: Located<unknown> = { target: { studioId: '' }, subject: undefined };

export interface ServeOptions {
  /** Also hold every answer against its schema: for tests, where a wrong answer must fail. */
  readonly checkAnswers: boolean;
}

/** Serves one row of the table of routes: who, what, may they, does the body fit, and only then the work. */
export function serveRoute(route: Route, options: ServeOptions): RequestHandler {
  return async (req, res) => {
    const { actor } = req;
    if (route.access !== 'public') {
      const signedOut = route.access === 'signed-in' ? actor.userId === null : isNobody(actor);
      if (signedOut) throw new AppError('unauthenticated');
    }
    const params = parseInput(route.params, req.params, 'params');
    const query = parseInput(route.query, req.query, 'query');
    let located = NOTHING;
    if (route.access !== 'public' && route.access !== 'signed-in') {
      if (!route.locate) throw new Error(`${route.method} ${route.path} names nothing to guard`);
      located = await route.locate({ params, query, actor });
      authorise(actor, route.access, located.target);
    }
    const body = await readBody(route, req, res);
    for (const handler of route.use ?? []) await runHandler(handler, req, res);
    if (res.headersSent) return;
    const result = await route.handle({ ...located, actor, params, query, body, req, res });
    send(res, route.answer, result, options);
  };
}

const isMultipart = (body: z.ZodType | MultipartBody): body is MultipartBody => 'multipart' in body;

async function readBody(route: Route, req: Request, res: Response): Promise<unknown> {
  if (!route.body || isMultipart(route.body)) return undefined;
  await runHandler(express.json({ limit: route.maxBodyBytes ?? DEFAULT_BODY_BYTES }), req, res);
  const body = parseInput(route.body, req.body ?? {}, 'body');
  req.body = body;
  return body;
}

/** Runs one middleware to its end. */
export function runHandler(handler: RequestHandler, req: Request, res: Response): Promise<void> {
  return new Promise((resolve, reject) => {
    const ended = (): void => resolve();
    res.once('finish', ended);
    void handler(req, res, (error?: unknown) => {
      res.off('finish', ended);
      if (error !== undefined && error !== null) reject(error);
      else resolve();
    });
  });
}

function send(res: Response, answer: Answer, result: unknown, { checkAnswers }: ServeOptions): void {
  if ('streams' in answer) return;
  if (!('schema' in answer)) {
    res.status(answer.status).end();
    return;
  }
  if (checkAnswers) answer.schema.parse(result);
  res.status(answer.status).json(result);
}
