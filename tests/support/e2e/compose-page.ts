import type { Locator, Page } from 'playwright-core';
import type { SpreadDocument } from '#shared/model/spread';
import { readSpread } from './visitors';

export interface Point {
  readonly x: number;
  readonly y: number;
}

/** Compose as a person uses it. Mats are called as the screen calls them: L1, R3. */
export class ComposePage {
  constructor(readonly page: Page) {}

  static async open(page: Page, spreadId: string): Promise<ComposePage> {
    await page.goto(`/spreads/${spreadId}`);
    await page.locator('.spread').waitFor();
    return new ComposePage(page);
  }

  mat(label: string): Locator {
    return this.page.getByRole('button', { name: new RegExp(`^Mat ${label},`) });
  }

  /** A print that lies ready on the table. */
  print(title: string): Locator {
    return this.page.getByRole('region', { name: 'Prints on the table' }).getByRole('button', { name: new RegExp(`^${title},`) });
  }

  notes(side: 'left' | 'right'): Locator {
    return this.page.getByRole('list', { name: `Notes on the ${side} page` }).getByRole('listitem');
  }

  get undo(): Locator {
    return this.page.getByRole('button', { name: /^Undo/ });
  }

  get redo(): Locator {
    return this.page.getByRole('button', { name: /^Redo/ });
  }

  get saveState(): Locator {
    return this.page.locator('.save-state');
  }

  /** Gives a mat a colour by its code. */
  async colorMat(label: string, color: string): Promise<void> {
    await this.page.bringToFront(); // a tab behind another is drawn once a second
    await this.mat(label).click();
    await this.page.getByRole('toolbar', { name: 'Mat' }).getByRole('button', { name: /^Colour/ }).click();
    const sheet = this.page.getByRole('dialog');
    await sheet.getByLabel('Colour code').fill(color);
    await sheet.getByRole('button', { name: 'Use' }).click();
    await this.page.keyboard.press('Escape');
  }

  /** The document as the server has it, once the bar says that it has everything. */
  async savedDocument(): Promise<SpreadDocument> {
    await this.page.locator('.save-state[data-status="saved"]').waitFor();
    const spreadId = new URL(this.page.url()).pathname.split('/')[2]!;
    return (await readSpread(this.page, spreadId)).document;
  }

  /** Takes something into the hand, with the mouse. */
  async pickUp(thing: Locator): Promise<void> {
    await thing.scrollIntoViewIfNeeded();
    const { x, y } = await middleOf(thing);
    const { mouse } = this.page;
    await mouse.move(x, y);
    await mouse.down();
    await mouse.move(x + 8, y, { steps: 2 });
  }

  /** Carries what is in the hand to the middle of something, or to a point, and rests there for two frames, as a hand does before it lets go. */
  async carryTo(place: Locator | Point): Promise<void> {
    const { x, y } = 'x' in place ? place : await middleOf(place);
    await this.page.mouse.move(x, y, { steps: 6 });
    await twoFrames(this.page);
  }

  letGo(): Promise<void> {
    return this.page.mouse.up();
  }

  async drag(thing: Locator, place: Locator | Point): Promise<void> {
    await this.pickUp(thing);
    await this.carryTo(place);
    await this.letGo();
  }

  /** Drags by so many px. */
  async dragBy(from: Locator, dx: number, dy: number): Promise<void> {
    const start = await middleOf(from);
    await this.drag(from, { x: start.x + dx, y: start.y + dy });
  }

  /** Presses a button of the bar until it can do no more; returns how often. */
  async pressToTheEnd(button: Locator): Promise<number> {
    let presses = 0;
    while (await button.isEnabled()) {
      await button.click();
      presses += 1;
    }
    return presses;
  }
}

/** Long enough for the page to have drawn what was done last; a hand is slower. */
export const twoFrames = (page: Page): Promise<unknown> =>
  page.evaluate(() => new Promise((resolve) => requestAnimationFrame(() => requestAnimationFrame(resolve))));

export async function middleOf(locator: Locator): Promise<Point> {
  const box = await locator.boundingBox();
  if (!box) throw new Error(`${String(locator)} is not on the screen`);
  return { x: box.x + box.width / 2, y: box.y + box.height / 2 };
}
