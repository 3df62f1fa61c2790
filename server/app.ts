import compression from 'compression';
import express, { Router, type Express } from 'express';
import { pinoHttp } from 'pino-http';
import { AppError } from '../shared/errors';
import type { AppDeps } from './app-deps';
import { handleErrors } from './middleware/error-handler';
import { loadActor, NOBODY } from './middleware/load-actor';
import { refuseCrossSite } from './middleware/refuse-cross-site';
import { securityHeaders } from './middleware/security-headers';
import { serveRoute } from './middleware/serve-route';
import { sessions } from './middleware/sessions';
import { servePages } from './middleware/serve-pages';
import { createRoutes } from './routes/table';

export interface AppOptions {
  /** Folder of the built pages; null where something else serves them. */
  readonly pagesDir: string | null;
  /** Hold every answer against its schema. */
  readonly checkAnswers: boolean;
}

/** The Express app: no state of its own, everything comes from `deps`. */
export function createApp(deps: AppDeps, { pagesDir, checkAnswers }: AppOptions): Express {
  const { config, log, dataSource, services } = deps;
  const app = express();
  app.disable('x-powered-by');
  app.set('trust proxy', [...config.trustedProxies]);
  app.set('query parser', 'simple');
  app.use(pinoHttp({ logger: log, customLogLevel: (_req, res) => (res.statusCode >= 500 ? 'warn' : 'debug') }));
  app.use(securityHeaders());
  app.use(compression());

  const api = Router({ caseSensitive: true, strict: true });
  api.use((req, res, next) => {
    req.actor = NOBODY;
    res.set('Cache-Control', 'no-store');
    next();
  });
  api.use(refuseCrossSite);
  api.use(sessions(deps.sessionStore, config.sessionSecret));
  api.use(deps.passport.session());
  api.use(loadActor(dataSource, services.grants));
  for (const route of createRoutes(deps)) api[route.method](route.path, serveRoute(route, { checkAnswers }));
  api.use(() => {
    throw new AppError('not-found');
  });

  app.use('/api', api);
  if (pagesDir !== null) app.use(servePages(pagesDir));
  app.use(() => {
    throw new AppError('not-found');
  });
  app.use(handleErrors);
  return app;
}
