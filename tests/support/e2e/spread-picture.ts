import type { Page } from 'playwright-core';

/**
 * A picture of the two pages as Compose draws them, without what lies over and under the mats only for
 * working: grid, notes, handles. Waits until every photo has come in.
 */
export async function spreadPicture(page: Page): Promise<Buffer> {
  await page.mouse.move(1, 1);
  await page.keyboard.press('Escape'); // nothing is selected
  await page.waitForFunction(() => document.querySelectorAll('.vision-view [data-state]').length === 0);
  await setWorkingMarks(page, 'hidden');
  const picture = await page.locator('.spread').screenshot();
  await setWorkingMarks(page, '');
  return picture;
}

/** Through the object model, since the content security policy refuses styles that are added as text. */
const setWorkingMarks = (page: Page, visibility: string): Promise<void> =>
  page.evaluate((value) => {
    for (const mark of document.querySelectorAll<HTMLElement>('.spread > :not(.vision-view), .spread .grid-lines')) mark.style.visibility = value;
  }, visibility);
