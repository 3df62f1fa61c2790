import type { Browser, Page } from 'playwright-core';
import { afterAll, beforeAll, describe, expect, inject, it } from 'vitest';
import type { Role } from '#shared/model/people';
import { openBrowser, openPage, type WatchedPage } from '../support/browser';
import { axeFaults, sidewaysScroll } from '../support/e2e/axe';
import { ComposePage } from '../support/e2e/compose-page';
import { demoPerson } from '../support/e2e/people';
import type { Visitor } from '../support/e2e/visitors';

const WIDE = { width: 1440, height: 900 };
const PHONE = { width: 390, height: 844 };
const NARROWEST = { width: 360, height: 740 };

let browser: Browser;
let stranger: WatchedPage;
const people = new Map<Role, Visitor>();
/** The demo's half-done spread, its album and its studio. */
const paths = { studio: '', album: '', spread: '' };

beforeAll(async () => {
  browser = await openBrowser();
  stranger = await openPage(browser, inject('productUrl'));
  for (const role of ['designer', 'reviewer', 'contributor'] as const) people.set(role, await demoPerson(browser, role));
  const { page, studioId } = people.get('designer')!;
  const [album] = ((await (await page.request.get(`/api/studios/${studioId}/albums`)).json()) as { albums: { id: string }[] }).albums;
  const { spreads } = (await (await page.request.get(`/api/albums/${album!.id}/spreads`)).json()) as { spreads: { id: string; title: string }[] };
  paths.studio = `/studios/${studioId}`;
  paths.album = `/albums/${album!.id}`;
  paths.spread = `/spreads/${spreads.find(({ title }) => title === 'On the grass')!.id}`;
});
afterAll(() => browser?.close());

interface Screen {
  readonly name: string;
  /** Who looks at it; nobody signed in where left out. */
  readonly role?: Role;
  readonly path: () => string;
  /** Brings the screen into the state that is meant, and waits for it. */
  readonly open: (page: Page) => Promise<unknown>;
  /** The browser itself reports these answers in the console. */
  readonly expected?: RegExp;
  /** Composing is for 1024 px and up; its sheets do not open on less. */
  readonly isForWideWindows?: boolean;
}

const heading = (name: string | RegExp) => (page: Page) => page.getByRole('heading', { name }).first().waitFor();
const press = (page: Page, name: string | RegExp): Promise<void> => page.getByRole('button', { name }).first().click();
const selected = async (page: Page): Promise<void> => {
  await new ComposePage(page).mat('L1').click();
  await page.getByRole('toolbar', { name: 'Mat' }).waitFor();
};
const popover = (name: string) => async (page: Page) => {
  await selected(page);
  await page.getByRole('toolbar', { name: 'Mat' }).getByRole('button', { name: new RegExp(`^${name}\\b`) }).click();
  await page.getByRole('dialog', { name }).getByRole('button').first().waitFor();
};
const composed = (page: Page) => new ComposePage(page).mat('L1').waitFor();

const SCREENS: readonly Screen[] = [
  { name: 'signing in', path: () => '/sign-in', open: (page) => page.getByRole('region', { name: 'Demo accounts' }).waitFor(), expected: /401/ },
  {
    name: 'signing in with what is wrong',
    path: () => '/sign-in',
    expected: /401/,
    open: async (page) => {
      await press(page, 'Sign in');
      await page.getByRole('alert').first().waitFor();
    },
  },
  { name: 'signing up', path: () => '/sign-up', open: (page) => page.getByLabel('Studio').waitFor(), expected: /401/ },
  { name: 'a page that does not exist', path: () => '/nowhere', open: heading('Nothing lies here'), expected: /401/ },
  { name: 'the albums', role: 'designer', path: () => paths.studio, open: heading('Long weekends') },
  {
    name: 'a new album',
    role: 'designer',
    path: () => paths.studio,
    open: async (page) => {
      await page.getByRole('main').getByRole('button', { name: 'New album' }).click();
      await page.getByRole('dialog', { name: 'New album' }).waitFor();
    },
  },
  { name: 'an album', role: 'designer', path: () => paths.album, open: heading('On the grass') },
  { name: 'the prints of a studio', role: 'designer', path: () => `${paths.studio}/prints`, open: heading('The beach') },
  { name: 'the stash', role: 'designer', path: () => `${paths.studio}/stash`, open: (page) => page.getByRole('rowheader', { name: /Harbour/ }).waitFor() },
  {
    name: 'a patterned sheet of the stash',
    role: 'designer',
    path: () => `${paths.studio}/stash`,
    open: async (page) => {
      await press(page, 'More for Deck chair');
      await page.getByRole('menuitem', { name: 'Edit' }).click();
      await page.getByRole('dialog', { name: 'Deck chair' }).waitFor();
    },
  },
  {
    name: 'bringing sheets in',
    role: 'designer',
    path: () => `${paths.studio}/stash`,
    open: async (page) => {
      await press(page, 'Bring in CSV');
      await page.getByRole('textbox', { name: 'Rows' }).fill('name,colour\nFog,greyish');
      await page.getByText('One row does not fit').waitFor();
    },
  },
  { name: 'the stash as a reviewer sees it', role: 'reviewer', path: () => `${paths.studio}/stash`, open: (page) => page.getByRole('rowheader', { name: /Harbour/ }).waitFor() },
  {
    name: 'Sort with a print open',
    role: 'designer',
    path: () => `${paths.spread}/sort`,
    open: async (page) => {
      await press(page, /^Pim,/);
      await page.getByRole('region', { name: 'Opened print: Pim' }).waitFor();
    },
  },
  { name: 'Match', role: 'designer', path: () => `${paths.spread}/match`, open: heading('Start from a sketch') },
  { name: 'Compose', role: 'designer', path: () => paths.spread, open: composed },
  { name: 'Compose with a mat selected', role: 'designer', path: () => paths.spread, open: selected, isForWideWindows: true },
  ...['Colour', 'Carry', 'Reveal', 'Split', 'More'].map(
    (name): Screen => ({ name: `Compose with “${name}” open`, role: 'designer', path: () => paths.spread, open: popover(name), isForWideWindows: true }),
  ),
  {
    name: 'the export dialog',
    role: 'designer',
    path: () => paths.spread,
    open: async (page) => {
      await press(page, 'Export');
      await page.getByRole('dialog', { name: 'Preview picture' }).waitFor();
    },
  },
  { name: 'Compose as a reviewer sees it', role: 'reviewer', path: () => paths.spread, open: composed },
  { name: 'what a contributor sees', role: 'contributor', path: () => '/', open: heading('Send photographs') },
];

/** Brings a screen up and says everything that is wrong with it, in the browser's and in axe's words. */
async function faultsOf({ role, path, open, expected = /(?!)/, isForWideWindows = false }: Screen): Promise<string[]> {
  const visit = role === undefined ? stranger : people.get(role)!;
  const { page } = visit;
  const before = visit.faults.length;
  if (new URL(page.url(), inject('productUrl')).pathname === path()) await page.keyboard.press('Escape');
  else await page.goto(path());
  await open(page);
  const faults = await axeFaults(page);
  if (!isForWideWindows) {
    await page.setViewportSize(NARROWEST);
    faults.push(...(await sidewaysScroll(page)));
    await page.setViewportSize(WIDE);
  }
  return [...faults, ...visit.faults.slice(before).filter((fault) => !expected.test(fault))];
}

describe('axe, the console and the narrowest window find no fault with', () => {
  it.each(SCREENS.map((screen) => [screen.name, screen] as const))('%s', async (_name, screen) => {
    expect(await faultsOf(screen)).toEqual([]);
  });

  it('Compose on a phone, read-only with its notes below', async () => {
    const { page, faults } = await demoPerson(browser, 'designer', { viewport: PHONE, hasTouch: true, isMobile: true });
    await page.goto(paths.spread);
    await page.getByRole('region', { name: 'Notes' }).waitFor();
    expect(await page.getByRole('region', { name: 'Notes' }).getByRole('listitem').count()).toBeGreaterThan(0);
    expect(await page.getByRole('toolbar').count()).toBe(0);
    expect([...(await axeFaults(page)), ...(await sidewaysScroll(page)), ...faults]).toEqual([]);
  });
});
