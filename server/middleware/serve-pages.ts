import { join } from 'node:path';
import express, { Router } from 'express';
import { AppError } from '../../shared/errors';

const YEAR_MS = 365 * 24 * 60 * 60_000;

/** Nothing here is for search engines: every page is somebody's own. */
const ROBOTS = 'User-agent: *\nDisallow: /\n';

/** The built pages. Files under `assets` have their content's hash in their name and are kept for good. */
export function servePages(pagesDir: string): Router {
  const pages = Router();
  pages.get('/robots.txt', (_req, res) => {
    res.type('text/plain').send(ROBOTS);
  });
  pages.use('/assets', express.static(join(pagesDir, 'assets'), { maxAge: YEAR_MS, immutable: true, index: false }));
  pages.use('/assets', () => {
    throw new AppError('not-found');
  });
  pages.use(express.static(pagesDir, { index: false, cacheControl: false, setHeaders: (res) => res.set('Cache-Control', 'no-cache') }));
  // Every other address is one of the app's own pages, which the browser draws.
  pages.get('/{*path}', (_req, res, next) => {
    res.set('Cache-Control', 'no-cache').sendFile('index.html', { root: pagesDir }, (error) => (error ? next(error) : undefined));
  });
  return pages;
}
