import { fileURLToPath } from 'node:url';
import type { Browser } from 'playwright-core';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { drawScene } from '#server/images/draw-scene';
import { buildScene } from '#shared/scene/build-scene';
import type { FontId, Scene, SceneItem } from '#shared/scene/scene';
import { FACES } from '#shared/scene/text';
import { openBrowser, openPage, type WatchedPage } from '../support/browser';
import { printsById } from '../support/builders';
import { comparePictures } from '../support/compare-pictures';
import { DEMO_PICTURES, drawnSpread } from '../support/drawn-spread';
import { serveScenePage, type ScenePage } from '../support/scene-page/serve-scene-page';

const WIDTH = 1200;
const PRINTS = printsById(DEMO_PICTURES.map(({ print }) => print));
const FILES = new Map(
  DEMO_PICTURES.map(({ print, file }) => [print.id, fileURLToPath(new URL(`../../server/setup/demo/photos/${file}`, import.meta.url))]),
);
const SCENE = buildScene(drawnSpread(), PRINTS);

let site: ScenePage;
let browser: Browser;
let screen: WatchedPage;

beforeAll(async () => {
  site = await serveScenePage(FILES);
  browser = await openBrowser();
  screen = await openPage(browser, site.url, { viewport: { width: WIDTH, height: WIDTH / 2 }, deviceScaleFactor: 1 });
  await screen.page.goto('/');
});

afterAll(async () => {
  await browser?.close();
  await site?.close();
});

async function onScreen(scene: Scene): Promise<Buffer> {
  await screen.page.evaluate((drawn) => window.drawSceneOnPage(drawn), scene);
  return screen.page.screenshot();
}

const asPicture = async (scene: Scene) => drawScene(scene, { widthPx: WIDTH, loadPicture: async (id) => ({ data: FILES.get(id)! }) });

/** What the issue asks of the screen and the downloaded picture. */
async function looksAlike(scene: Scene): Promise<boolean> {
  const { mean, shareUnder8 } = await comparePictures(await onScreen(SCENE), await asPicture(scene));
  return mean < 2 && shareUnder8 > 0.99;
}

const changed = (change: (item: SceneItem) => SceneItem): Scene => ({ ...SCENE, items: SCENE.items.map(change) });

describe('a spread on the screen and as a picture', () => {
  it('look the same at 1200 px', async () => {
    expect(await looksAlike(SCENE)).toBe(true);
    // No photo is still blank paper, or struck out.
    await expect.poll(() => screen.page.locator('[data-state]').count()).toBe(0);
    expect(screen.faults).toEqual([]);
  });

  const photos = SCENE.items.filter((item) => item.kind === 'photo');

  it.each<[string, Scene]>([
    ['windows slid by 1/8 in', changed((item) => (item.kind === 'photo' ? { ...item, source: { ...item.source, x: item.source.x + item.imageWidth / 48 } } : item))],
    ['one print turned', changed((item) => (item === photos.at(-1) && item.kind === 'photo' ? { ...item, turns: 1 } : item))],
    ['two prints exchanged', changed((item) => (item === photos.at(-1) && item.kind === 'photo' ? { ...item, printId: photos[0]!.printId } : item))],
    ['one mat of another colour', changed((item) => (item.kind === 'rect' && item.key.endsWith('9/card') ? { ...item, fill: '#a3240f' } : item))],
    ['page text left out', { ...SCENE, items: SCENE.items.filter((item) => item.kind !== 'text') }],
  ])('would not, were %s', async (_, scene) => {
    expect(await looksAlike(scene)).toBe(false);
  });
});

describe('the shipped fonts on the screen', () => {
  const FONTS: readonly [FontId, string][] = [
    ['young-serif', '1000px "Young Serif"'],
    ['atkinson', '1000px "Atkinson Next"'],
    ['atkinson-italic', 'italic 1000px "Atkinson Next"'],
  ];

  it.each(FONTS)('advance by what the tables say: %s', async (id, font) => {
    const { advances, unitsPerEm } = FACES[id].metrics;
    const table = Object.entries(advances).flatMap(([first, run]) =>
      run.map((advance, i) => ({ character: String.fromCodePoint(Number(first) + i), advance: (advance * 1000) / unitsPerEm })),
    );
    const measured = await screen.page.evaluate(
      ([name, characters]) => window.measureCharacters(name, characters),
      [font, table.map(({ character }) => character)] as const,
    );
    // Marks that combine are drawn over the letter before them and are measured as nothing.
    const differing = table.filter(({ character, advance }, i) => !/\p{M}/u.test(character) && Math.abs(measured[i]! - advance) > 1);
    expect(differing).toEqual([]);
  });
});
