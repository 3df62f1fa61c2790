import type { Browser, Locator } from 'playwright-core';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { inches } from '#shared/model/length';
import type { Mat } from '#shared/model/spread';
import { openBrowser } from '../support/browser';
import { ComposePage, twoFrames } from '../support/e2e/compose-page';
import { asJourney } from '../support/e2e/journey';
import { newcomer } from '../support/e2e/people';
import { laidSpread } from '../support/e2e/visitors';

let browser: Browser;
let compose: ComposePage;

beforeAll(async () => {
  browser = await openBrowser();
  const visitor = await newcomer(browser);
  const { id } = await laidSpread(visitor, 2, () => [
    { id: 'mats.add', args: { page: 'left', x: 1, y: 2, w: 8, h: 6 } },
    { id: 'mats.add', args: { page: 'left', x: 11, y: 2, w: 8, h: 6 } },
    { id: 'mats.add', args: { page: 'right', x: 2, y: 2, w: 8, h: 6 } },
  ]);
  compose = await ComposePage.open(visitor.page, id);
});
afterAll(() => browser?.close());

async function press(...keys: string[]): Promise<void> {
  for (const key of keys) {
    await compose.page.keyboard.press(key);
    await twoFrames(compose.page);
  }
}

/** Walks with Tab, as somebody without a mouse does, until the thing has the focus. */
async function tabTo(thing: Locator): Promise<void> {
  await thing.waitFor();
  for (let steps = 0; steps < 60; steps += 1) {
    if (await thing.evaluate((node) => node === document.activeElement)) return;
    await compose.page.keyboard.press('Tab');
  }
  throw new Error(`Tab does not lead to ${String(thing)}`);
}

/** What the page's live regions say now. */
const said = (): Promise<string> =>
  compose.page.evaluate(() => [...document.querySelectorAll('[aria-live]')].map((region) => region.textContent?.trim()).join(' '));

/** Waits until it is said, as a listener would. */
const hear = (words: string | RegExp) => expect.poll(said).toMatch(words);

const button = (name: string): Locator => compose.page.getByRole('button', { name, exact: true });
const label = (mat: string): Promise<string | null> => compose.mat(mat).getAttribute('aria-label');

async function savedMat(at: Pick<Mat, 'page'> & Partial<Mat>): Promise<Mat | undefined> {
  const { mats } = await compose.savedDocument();
  return mats.find((mat) => mat.page === at.page && (at.x === undefined || mat.x === at.x));
}

describe('composing without a mouse', () => {
  asJourney();

  it('puts a print on a mat: Tab, Space, arrows, Enter, each step told', async () => {
    await tabTo(compose.print('harbour wall'));
    await press('Space');
    await hear(/harbour wall picked up\./);
    for (const [key, mat] of [['ArrowUp', 'L2'], ['ArrowLeft', 'L1'], ['ArrowRight', 'L2'], ['ArrowRight', 'R1'], ['ArrowLeft', 'L2']] as const) {
      await press(key);
      await hear(`Over mat ${mat}.`);
    }
    await press('Enter');
    await hear(/harbour wall placed on mat L2\./);
    expect(await label('L2')).toContain('harbour wall');
    expect((await savedMat({ page: 'left', x: 11 }))?.content.kind).toBe('print');
  });

  it('carries it from mat to mat, and Escape puts it back', async () => {
    await tabTo(compose.mat('L2'));
    await press('Space', 'ArrowLeft');
    await hear(/Over mat L1\./);
    await expect.poll(() => label('L1')).toContain('harbour wall');
    await press('Escape');
    await hear(/harbour wall put back\./);
    expect(await label('L1')).toContain('bare');
    expect(await label('L2')).toContain('harbour wall');
    await press('Space', 'ArrowLeft');
    await hear(/Over mat L1\./);
    await press('Space');
    await hear(/harbour wall placed on mat L1\./);
    await expect.poll(() => label('L1')).toContain('harbour wall');
    expect(await label('L2')).toContain('bare');
  });

  it('brings it back to the table', async () => {
    await tabTo(compose.mat('L1'));
    await press('Space', 'ArrowDown');
    await hear(/Over the table\./);
    await press('Enter');
    await hear(/harbour wall placed on the table\./);
    await compose.print('harbour wall').waitFor();
    expect(await label('L1')).toContain('bare');
    await press('Control+z');
    await expect.poll(() => label('L1')).toContain('harbour wall');
  });

  it('moves a mat by steps of the grid, never off the page', async () => {
    await tabTo(compose.mat('L1'));
    await press('Enter');
    await tabTo(button('Move mat L1'));
    await press('Space', 'ArrowDown', 'ArrowDown', 'ArrowRight');
    await hear(/8 by 6 steps, 2 from the left, 4 from the top/);
    await press('Enter');
    await hear(/mat L\d placed\./);
    await expect.poll(() => savedMat({ page: 'left', x: 2 })).toMatchObject({ y: 4, w: 8, h: 6 });
    await tabTo(compose.page.getByRole('button', { name: /^Move mat L/ }));
    await press('Space', 'ArrowLeft', 'ArrowLeft', 'ArrowLeft', 'ArrowLeft');
    await hear(/8 by 6 steps, 0 from the left, 4 from the top/);
    await press('Escape');
    await expect.poll(() => savedMat({ page: 'left', x: 2 })).toMatchObject({ y: 4 });
  });

  it('resizes it from an edge', async () => {
    await tabTo(compose.page.getByRole('button', { name: /^Resize mat L\d from its bottom edge$/ }));
    await press('Space', 'ArrowDown', 'ArrowDown', 'ArrowUp');
    await hear(/8 by 7 steps, 2 from the left, 4 from the top/);
    await press('Enter');
    await expect.poll(() => savedMat({ page: 'left', x: 2 })).toMatchObject({ y: 4, w: 8, h: 7 });
  });

  it('slides the window by the trimmer’s finest mark, with Shift by four', async () => {
    const offset = async (): Promise<number> => {
      const mat = await savedMat({ page: 'left', x: 2 });
      return mat?.content.kind === 'print' ? mat.content.x : Number.NaN;
    };
    const start = await offset();
    await tabTo(button('Slide the window over the print'));
    await press('Space', 'ArrowLeft', 'Enter'); // the picture goes left, so the window goes right
    await expect.poll(offset).toBe(start + inches(1 / 16));
    await press('Space', 'Shift+ArrowLeft', 'Enter');
    await expect.poll(offset).toBe(start + inches(5 / 16));
    await press('Space', 'Shift+ArrowLeft', 'Escape');
    await expect.poll(offset).toBe(start + inches(5 / 16));
    await press('Space', 'ArrowRight', 'Enter');
    await expect.poll(offset).toBe(start + inches(1 / 4));
  });

  it('deletes the selected mat, undoes and redoes', async () => {
    const count = async (): Promise<number> => (await compose.savedDocument()).mats.length;
    await press('Delete');
    await expect.poll(count).toBe(2);
    await compose.print('harbour wall').waitFor(); // its print lies on the table again
    await press('Control+z');
    await expect.poll(count).toBe(3);
    await expect.poll(() => compose.print('harbour wall').count()).toBe(0);
    await press('Control+Shift+z');
    await expect.poll(count).toBe(2);
  });

  it('lets go of the selection with Escape', async () => {
    await tabTo(compose.mat('L1'));
    await press('Enter');
    await compose.page.getByRole('toolbar', { name: 'Mat' }).waitFor();
    await press('Escape');
    await expect.poll(() => compose.page.getByRole('toolbar', { name: 'Mat' }).count()).toBe(0);
  });
});
