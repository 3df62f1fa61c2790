import type { Browser, BrowserContextOptions, Page } from 'playwright-core';
import { chromium } from 'playwright-core';
import { findChromium } from '../../server/setup/find-program.mjs';

/** No sandbox (tests may run as root in a container), no graphics card, and no talk with anything but the product. */
const FLAGS = [
  '--headless',
  '--no-sandbox',
  '--disable-gpu',
  '--disable-quic',
  '--no-first-run',
  '--disable-background-networking',
  '--disable-component-update',
  '--disable-sync',
];

/** Debian's Chromium. Close it after the tests. */
export function openBrowser(extraFlags: readonly string[] = []): Promise<Browser> {
  const executablePath = findChromium();
  if (!executablePath) throw new Error('Chromium is not on this machine: "npm test" installs it, or apt-get install chromium.');
  return chromium.launch({ executablePath, args: [...FLAGS, ...extraFlags] });
}

/** How long a person would wait for something to answer, on two busy cores. */
const ACTION_WAIT_MS = 15_000;

export interface WatchedPage {
  readonly page: Page;
  /** Errors that scripts threw or the console got, and requests to any other host; empty when all is well. */
  readonly faults: readonly string[];
}

/** A new page in a context of its own (its own cookies), of the size that composing is drawn for. */
export async function openPage(browser: Browser, baseUrl: string, options: BrowserContextOptions = {}): Promise<WatchedPage> {
  const context = await browser.newContext({ baseURL: baseUrl, viewport: { width: 1440, height: 900 }, ...options });
  const page = await context.newPage();
  page.setDefaultTimeout(ACTION_WAIT_MS);
  const faults: string[] = [];
  page.on('pageerror', (error) => faults.push(String(error)));
  page.on('console', (message) => {
    if (message.type() === 'error') faults.push(message.text());
  });
  page.on('request', (request) => {
    const { protocol, origin } = new URL(request.url());
    if (/^https?:$/.test(protocol) && origin !== new URL(baseUrl).origin) faults.push(`request to ${request.url()}`);
  });
  return { page, faults };
}
