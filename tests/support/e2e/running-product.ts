import type { TestProject } from 'vitest/node';
import { startApp } from '../app-process';

declare module 'vitest' {
  export interface ProvidedContext {
    /** Address of the product that all end-to-end tests share; each makes people and studios of its own. */
    productUrl: string;
  }
}

/**
 * Vitest's global set-up of the end-to-end tests: one product, with its demo, for the whole run. Where
 * `PAIRLEAF_URL` names one that runs already, that one is used, so that a single test can be repeated quickly.
 */
export default async function runProduct(project: TestProject): Promise<() => Promise<void>> {
  const running = process.env.PAIRLEAF_URL;
  if (running !== undefined) {
    project.provide('productUrl', running);
    return async () => undefined;
  }
  // Every test signs somebody up, all from one address.
  const app = await startApp({ env: { SIGN_UP_PER_ADDRESS: '1000' } });
  project.provide('productUrl', app.url);
  return () => app.remove();
}
