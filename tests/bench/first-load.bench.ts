import { get } from 'node:http';
import type { Page } from 'playwright-core';
import { startApp } from '../support/app-process';
import { openBrowser, openPage } from '../support/browser';
import { ComposePage } from '../support/e2e/compose-page';
import { laidSpread, signUp } from '../support/e2e/visitors';
import type { BenchRow } from './bench';

/** Bytes of a file as the product sends it to a browser that takes gzip; the smallest files it sends as they are. */
const gzipBytes = (url: string): Promise<number> =>
  new Promise((resolve, reject) => {
    get(url, { headers: { 'accept-encoding': 'gzip' } }, (answer) => {
      let bytes = 0;
      answer.on('data', (chunk: Buffer) => (bytes += chunk.length));
      answer.on('end', () => resolve(bytes));
    }).on('error', reject);
  });

/** Addresses of the scripts that a page asks for while `open` goes on. */
async function scriptsOf(page: Page, open: () => Promise<unknown>): Promise<Set<string>> {
  const urls = new Set<string>();
  page.on('request', (request) => {
    if (request.resourceType() === 'script') urls.add(request.url());
  });
  await open();
  return new Set(urls);
}

/** Notes, in a page that is about to load, the moment at which the first mat can be pressed. */
const WATCH_FOR_MAT = `
  new MutationObserver((_, observer) => {
    if (document.querySelector('.mat-control') === null) return;
    window.interactiveAt = performance.now();
    observer.disconnect();
  }).observe(document, { childList: true, subtree: true });
`;

/** Addresses of the scripts that were there by then; what came later was not waited for. */
const SCRIPTS_BEFORE = `performance.getEntriesByType('resource')
  .filter(({ name, responseEnd }) => name.endsWith('.js') && responseEnd <= interactiveAt)
  .map(({ name }) => name)`;

/** JavaScript that is fetched before a spread can be worked on, and whether signing in fetches any of the editor. */
export async function rows(): Promise<BenchRow[]> {
  const app = await startApp({ env: { PAIRLEAF_MODE: 'production' } });
  const browser = await openBrowser();
  try {
    const { page: signIn } = await openPage(browser, app.url);
    const signInScripts = await scriptsOf(signIn, () => signIn.goto('/sign-in', { waitUntil: 'networkidle' }));
    const visitor = await signUp(browser, app.url);
    const spread = await laidSpread(visitor, 1, () => [{ id: 'mats.add', args: { page: 'left', x: 0, y: 0, w: 8, h: 8 } }]);
    const albumScripts = await scriptsOf(visitor.page, () => visitor.page.goto(`/albums/${spread.albumId}`, { waitUntil: 'networkidle' }));
    // A fresh visit, so that nothing comes from a cache.
    const { page } = await openPage(browser, app.url, { storageState: await visitor.page.context().storageState() });
    await page.addInitScript(WATCH_FOR_MAT);
    const composeScripts = await scriptsOf(page, async () => {
      const compose = await ComposePage.open(page, spread.id);
      await compose.mat('L1').click();
      await page.getByRole('toolbar', { name: 'Mat' }).waitFor();
      await page.waitForLoadState('networkidle');
    });
    const needed = await page.evaluate<string[]>(SCRIPTS_BEFORE);
    const editor = [...composeScripts].filter((url) => !albumScripts.has(url));
    if (!needed.some((url) => editor.includes(url))) throw new Error('Compose fetched no script of its own: the editor was not measured.');
    const row = (id: string, value: number, unit: string, goal: number): BenchRow => ({ id, value, floor: null, ratio: null, unit, goal, better: 'lower' });
    return [
      row('first-load.compose.js', await gzipKilobytes(needed), 'kB', 250),
      row('first-load.sign-in.editor', editor.filter((url) => signInScripts.has(url)).length, 'files', 0),
    ];
  } finally {
    await browser.close();
    await app.remove();
  }
}

async function gzipKilobytes(urls: readonly string[]): Promise<number> {
  const sizes = await Promise.all(urls.map(gzipBytes));
  return sizes.reduce((sum, bytes) => sum + bytes, 0) / 1000;
}
