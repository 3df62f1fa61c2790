import type { RequestHandler } from 'express';
import { AppError } from '../../shared/errors';

const SAFE = new Set(['GET', 'HEAD', 'OPTIONS']);

/**
 * Refuses changes that another site's page makes the browser send. Browsers say where a request comes from in
 * Sec-Fetch-Site and Origin and let no page forge either; what sends neither is no browser and carries no cookie
 * that it was not given, so scripts can sign in. MODEL.md 18.
 */
export const refuseCrossSite: RequestHandler = (req, _res, next) => {
  if (SAFE.has(req.method)) return next();
  const site = req.get('sec-fetch-site');
  if (site !== undefined && site !== 'same-origin' && site !== 'none') throw new AppError('cross-site');
  const origin = req.get('origin');
  if (origin !== undefined && hostOf(origin) !== req.host) throw new AppError('cross-site');
  next();
};

/** Null for `null` and anything else that names no host. */
function hostOf(origin: string): string | null {
  return URL.canParse(origin) ? new URL(origin).host : null;
}
