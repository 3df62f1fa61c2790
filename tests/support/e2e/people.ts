import type { Browser, BrowserContextOptions } from 'playwright-core';
import { inject } from 'vitest';
import { DEMO_ACCOUNTS } from '#server/setup/demo/accounts';
import type { Role } from '#shared/model/people';
import { signIn, signUp, type Visitor } from './visitors';

/** Somebody new in the shared product. */
export const newcomer = (browser: Browser, options: BrowserContextOptions = {}): Promise<Visitor> => signUp(browser, inject('productUrl'), options);

/** One of the people of its demo. */
export const demoPerson = (browser: Browser, role: Role, options: BrowserContextOptions = {}): Promise<Visitor> =>
  signIn(browser, inject('productUrl'), DEMO_ACCOUNTS.find((account) => account.role === role)!, options);
