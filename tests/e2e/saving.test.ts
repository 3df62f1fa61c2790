import type { Browser, BrowserContext, Page } from 'playwright-core';
import { afterAll, afterEach, beforeAll, describe, expect, inject, it } from 'vitest';
import { colorName } from '#shared/colour/name';
import type { SpreadDetail } from '#shared/contracts/albums';
import { openBrowser, openPage } from '../support/browser';
import { axeFaults } from '../support/e2e/axe';
import { ComposePage } from '../support/e2e/compose-page';
import { demoPerson, newcomer } from '../support/e2e/people';
import { laidSpread, readSpread } from '../support/e2e/visitors';

const DEEP_TEAL = '#1d4f5c';
const BRICK = '#a3240f';
const SAND = '#d8b26a';

let browser: Browser;
/** One person with one spread of a single bare mat, L1; every test opens tabs of its own on it. */
let context: BrowserContext;
let spread: SpreadDetail;
const tabs: Page[] = [];

beforeAll(async () => {
  browser = await openBrowser();
  const visitor = await newcomer(browser);
  spread = await laidSpread(visitor, 1, () => [{ id: 'mats.add', args: { page: 'left', x: 0, y: 0, w: 8, h: 8, color: '#515a62' } }]);
  context = visitor.page.context();
  await visitor.page.close();
});
afterEach(async () => {
  await context.setOffline(false);
  for (const tab of tabs.splice(0)) await tab.close();
});
afterAll(() => browser?.close());

async function openTab(): Promise<ComposePage> {
  const page = await context.newPage();
  page.setDefaultTimeout(15_000);
  tabs.push(page);
  return ComposePage.open(page, spread.id);
}

const colorOnServer = async ({ page }: ComposePage): Promise<string | undefined> => (await readSpread(page, spread.id)).document.mats[0]?.color;
const words = ({ saveState }: ComposePage): Promise<string> => saveState.innerText();

describe('the bar', () => {
  it('says Saving while a save is on its way, then Saved', async () => {
    const tab = await openTab();
    expect(await words(tab)).toBe('Saved');
    let answer: () => void = () => undefined;
    const asked = new Promise<void>((resolve) => (answer = resolve));
    await tab.page.route('**/edits', async (route) => {
      await asked;
      await route.continue();
    });
    await tab.colorMat('L1', DEEP_TEAL);
    await expect.poll(() => words(tab)).toBe('Saving…');
    answer();
    await expect.poll(() => words(tab)).toMatch(/^Saved \d\d:\d\d$/);
    expect(await colorOnServer(tab)).toBe(DEEP_TEAL);
  });

  it('says Offline without a connection, and saves by itself when it is back', async () => {
    const tab = await openTab();
    await context.setOffline(true);
    await tab.colorMat('L1', BRICK);
    await expect.poll(() => words(tab)).toBe('Offline: kept on this machine');
    await context.setOffline(false);
    await expect.poll(() => words(tab), { timeout: 10_000 }).toMatch(/^Saved/);
    expect(await colorOnServer(tab)).toBe(BRICK);
  });

  it('says what could not be saved is not, and saves on “Try again”', async () => {
    const tab = await openTab();
    await tab.page.route('**/edits', (route) => route.fulfill({ status: 500, contentType: 'text/html', body: 'oops' }), { times: 1 });
    await tab.colorMat('L1', SAND);
    await expect.poll(() => words(tab)).toMatch(/^Not saved/);
    expect(await colorOnServer(tab)).toBe(BRICK);
    await tab.page.getByRole('button', { name: 'Try again' }).click();
    await expect.poll(() => words(tab)).toMatch(/^Saved/);
    expect(await colorOnServer(tab)).toBe(SAND);
  });
});

describe('a tab that is behind', () => {
  /** A first tab saves a colour; a second one, opened before that, gives the same mat another. */
  async function disagree(theirs: string, mine: string): Promise<ComposePage> {
    const [ahead, behind] = [await openTab(), await openTab()];
    await ahead.colorMat('L1', theirs);
    await ahead.savedDocument();
    await behind.colorMat('L1', mine);
    return behind;
  }
  const dialog = ({ page }: ComposePage) => page.getByRole('dialog', { name: 'This spread was changed elsewhere' });

  it('is told and shown what differs, and overwrites nothing before its person has chosen', async () => {
    const behind = await disagree(DEEP_TEAL, BRICK);
    const row = dialog(behind).getByRole('list', { name: 'What differs' }).getByRole('listitem').filter({ hasText: 'Mat L1' });
    await row.waitFor();
    const [, mine, theirs] = await row.locator('> *').allInnerTexts();
    expect([mine, theirs]).toEqual([expect.stringContaining(colorName(BRICK)), expect.stringContaining(colorName(DEEP_TEAL))]);
    expect(await words(behind)).toBe('Changed elsewhere');
    expect(await axeFaults(behind.page)).toEqual([]);
    expect(await colorOnServer(behind)).toBe(DEEP_TEAL);
    await dialog(behind).getByRole('button', { name: 'Keep mine' }).click();
    await expect.poll(() => words(behind)).toMatch(/^Saved/);
    expect(await colorOnServer(behind)).toBe(BRICK);
  });

  it('can take theirs, and goes on from there', async () => {
    const behind = await disagree(SAND, DEEP_TEAL);
    await dialog(behind).getByRole('button', { name: 'Take theirs' }).click();
    await expect.poll(() => words(behind)).toMatch(/^Saved/);
    expect(await colorOnServer(behind)).toBe(SAND);
    await behind.colorMat('L1', BRICK);
    expect((await behind.savedDocument()).mats[0]?.color).toBe(BRICK);
  });

  it('is told nothing where both changed different things, and has both', async () => {
    const [ahead, behind] = [await openTab(), await openTab()];
    await ahead.colorMat('L1', DEEP_TEAL);
    await ahead.savedDocument();
    await behind.page.getByRole('toolbar', { name: 'Right page' }).getByRole('button', { name: 'Add mat' }).click();
    const { mats } = await behind.savedDocument();
    expect(mats.map(({ page, color }) => (page === 'left' ? color : page)).sort()).toEqual([DEEP_TEAL, 'right']);
    await behind.undo.click();
    expect((await behind.savedDocument()).mats.map(({ color }) => color)).toEqual([DEEP_TEAL]);
  });
});

describe('a tab that crashed', () => {
  /** Kills the tab with an edit in it that never reached the server. */
  async function crashWith(color: string): Promise<void> {
    const tab = await openTab();
    await context.setOffline(true);
    await tab.colorMat('L1', color);
    await expect.poll(() => words(tab)).toBe('Offline: kept on this machine');
    await tab.page.goto('chrome://crash').catch(() => undefined);
    await tab.page.close();
    await context.setOffline(false);
  }
  const offer = ({ page }: ComposePage) => page.getByRole('alert').filter({ hasText: 'did not reach the server' });

  it('has its unsaved change offered on return, and puts it back', async () => {
    await crashWith(BRICK);
    const tab = await openTab();
    expect(await offer(tab).innerText()).toMatch(/^One change from .+ did not reach the server before the tab closed\./);
    expect(await colorOnServer(tab)).toBe(DEEP_TEAL);
    await offer(tab).getByRole('button', { name: 'Put back' }).click();
    await expect.poll(() => colorOnServer(tab)).toBe(BRICK);
    await tab.undo.click();
    expect((await tab.savedDocument()).mats[0]?.color).toBe(DEEP_TEAL);
    await expect.poll(() => offer(tab).count()).toBe(0);
  });

  it('has it let go when its person says so, and is not asked again', async () => {
    await crashWith(SAND);
    const tab = await openTab();
    await offer(tab).getByRole('button', { name: 'Let go' }).click();
    await expect.poll(() => offer(tab).count()).toBe(0);
    const again = await openTab();
    await again.saveState.waitFor();
    expect(await offer(again).count()).toBe(0);
    expect(await colorOnServer(again)).toBe(DEEP_TEAL);
  });
});

describe('who may not edit', () => {
  it('as a reviewer sees the spread and its notes, and no edit controls', async () => {
    const { page } = await demoPerson(browser, 'reviewer');
    await page.goto('/');
    await page.locator('.album-shelf a').first().click();
    expect(await page.getByRole('button', { name: 'New spread' }).count()).toBe(0);
    await page.getByRole('link', { name: 'On the grass' }).click();
    const compose = new ComposePage(page);
    await compose.mat('L1').waitFor();
    await expect.poll(() => compose.notes('right').count()).toBeGreaterThan(0);
    expect(await words(compose)).toBe('Read only');
    await compose.mat('L1').click();
    for (const name of [/^Undo/, /^Redo/, 'Add mat', /^Move mat/, /^Resize mat/, /^Use\b/]) expect(await page.getByRole('button', { name }).count()).toBe(0);
    expect(await page.getByRole('toolbar').count()).toBe(0);
    expect(await page.locator('.remedy').count()).toBe(0);
    // What cannot be pressed cannot be dragged or deleted either.
    const before = await compose.mat('L1').getAttribute('aria-label');
    await compose.drag(compose.mat('L1'), compose.mat('R1'));
    await page.keyboard.press('Delete');
    expect(await compose.mat('L1').getAttribute('aria-label')).toBe(before);
    await page.getByRole('link', { name: /^Sort/ }).click();
    await page.waitForURL(/\/sort$/);
    await page.getByRole('heading', { name: 'The line' }).waitFor();
    expect(await page.getByRole('button', { name: 'Add prints' }).count()).toBe(0);
    expect(await page.getByRole('checkbox', { disabled: false }).count()).toBe(0);
  });

  it('from outside the studio finds that nothing lies there', async () => {
    const { page, studioId } = await newcomer(browser);
    const demo = await demoPerson(browser, 'owner');
    for (const path of [`/spreads/${spread.id}`, `/albums/${spread.albumId}`, `/studios/${demo.studioId}`, `/studios/${demo.studioId}/prints`]) {
      expect(path).not.toContain(studioId);
      await page.goto(path);
      await page.getByRole('heading', { name: 'Nothing lies here' }).waitFor();
    }
  });

  it('without an account is asked to sign in, and comes back to the spread', async () => {
    const { page } = await openPage(browser, inject('productUrl'));
    await page.goto(`/spreads/${spread.id}`);
    await page.getByRole('button', { name: 'Sign in' }).waitFor();
    expect(new URL(page.url()).searchParams.get('next')).toBe(`/spreads/${spread.id}`);
  });
});
