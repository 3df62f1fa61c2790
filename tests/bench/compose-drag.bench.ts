import { setTimeout as sleep } from 'node:timers/promises';
import type { CommandCall } from '#shared/commands/calls';
import type { Print } from '#shared/model/print';
import { startApp } from '../support/app-process';
import { openBrowser } from '../support/browser';
import { ComposePage, twoFrames, type Point } from '../support/e2e/compose-page';
import { laidSpread, signUp } from '../support/e2e/visitors';
import type { BenchRow } from './bench';
import { percentile } from './timing';

const PRINTS = 40;
/** Five across and four down on each page: 40 mats. */
const COLUMNS = 5;
const ROWS = 4;
const DRAG_MS = 3_000;
/** As often as a mouse reports on a 60 Hz screen. */
const MOVE_EVERY_MS = 1000 / 60;
const RUNS = 3;

/** 40 mats, a print on each but the last; that print lies on the table. */
function fill(prints: readonly Print[]): CommandCall[] {
  const cells = (['left', 'right'] as const).flatMap((page) =>
    Array.from({ length: COLUMNS * ROWS }, (_, at) => ({ page, x: (at % COLUMNS) * 4 + 1, y: Math.floor(at / COLUMNS) * 5 + 1, w: 4, h: 5 })),
  );
  return cells.flatMap((cell, at): CommandCall[] => {
    const print = at < PRINTS - 1 ? prints[at] : undefined;
    const content = print && { kind: 'print' as const, printId: print.id, mode: 'window' as const, x: 4064, y: 2032, turn: 0 as const, scaledWidth: null, detailId: null };
    return [{ id: 'mats.add', args: { ...cell, ...(content && { content }) } }];
  });
}

/** Up and down over the mats of both pages, from left to right. */
function pathOver({ x, y, width, height }: { x: number; y: number; width: number; height: number }): Point[] {
  const count = Math.round(DRAG_MS / MOVE_EVERY_MS);
  return Array.from({ length: count }, (_, at) => {
    const along = at / (count - 1);
    return { x: x + width * (0.06 + 0.88 * along), y: y + height * (0.5 - 0.42 * Math.cos(along * Math.PI * 2 * 6)) };
  });
}

interface Measured {
  readonly frames: readonly number[];
  readonly longTasks: readonly number[];
  /** Over how many mats the print was previewed. */
  readonly matsPassed: number;
}

/** Frame times and tasks over 50 ms while a print is carried over the mats. */
async function measureDrag(compose: ComposePage, print: string): Promise<Measured> {
  const { page } = compose;
  const box = await page.locator('.spread').boundingBox();
  if (!box) throw new Error('the spread is not on the screen');
  const path = pathOver(box);
  await compose.pickUp(compose.print(print));
  await page.mouse.move(path[0]!.x, path[0]!.y, { steps: 10 });
  await twoFrames(page);
  await page.evaluate(START_WATCH);
  const began = performance.now();
  for (const [at, { x, y }] of path.entries()) {
    await page.mouse.move(x, y);
    const wait = began + at * MOVE_EVERY_MS - performance.now();
    if (wait > 0) await sleep(wait);
  }
  const measured = await page.evaluate<Measured>(STOP_WATCH);
  await page.keyboard.press('Escape');
  await page.mouse.up();
  if (measured.matsPassed < PRINTS / 2) throw new Error(`The print passed over ${measured.matsPassed} mats only: the drag was not measured.`);
  return measured;
}

/** As text: what tsx makes of a function has helpers in it that the page does not know. */
const START_WATCH = `
  window.dragWatch = { frames: [], longTasks: [], mats: new Set(), last: null, isOn: true };
  window.dragWatch.take = (list) => dragWatch.longTasks.push(...list.map((entry) => entry.duration));
  window.dragWatch.observer = new PerformanceObserver((list) => dragWatch.take(list.getEntries()));
  window.dragWatch.observer.observe({ type: 'longtask' });
  window.dragWatch.drops = new MutationObserver((changes) => {
    for (const { target } of changes) if (/is-drop/.test(target.className)) dragWatch.mats.add(target);
  });
  window.dragWatch.drops.observe(document.querySelector('.spread'), { subtree: true, attributeFilter: ['class'] });
  window.dragWatch.frame = (now) => {
    if (dragWatch.last !== null) dragWatch.frames.push(now - dragWatch.last);
    dragWatch.last = now;
    if (dragWatch.isOn) requestAnimationFrame(dragWatch.frame);
  };
  requestAnimationFrame(dragWatch.frame);
`;
const STOP_WATCH = `
  dragWatch.isOn = false;
  dragWatch.take(dragWatch.observer.takeRecords());
  dragWatch.observer.disconnect();
  dragWatch.drops.disconnect();
  ({ frames: dragWatch.frames, longTasks: dragWatch.longTasks, matsPassed: dragWatch.mats.size });
`;

/** Carries a print over 40 mats with 40 prints in headless Chromium, with notes, weights and the preview following. */
export async function rows(): Promise<BenchRow[]> {
  const app = await startApp({ env: { PAIRLEAF_MODE: 'production' } });
  const browser = await openBrowser();
  try {
    const visitor = await signUp(browser, app.url);
    const spread = await laidSpread(visitor, PRINTS, fill);
    const compose = await ComposePage.open(visitor.page, spread.id);
    const { title } = spread.prints.find(({ id }) => id === spread.document.table.at(-1))!;
    await measureDrag(compose, title); // pictures and code warm up
    const runs: Measured[] = [];
    for (let run = 0; run < RUNS; run += 1) runs.push(await measureDrag(compose, title));
    // What else the machine does lengthens frames, never shortens them.
    const best = (figures: readonly number[]): number => Math.min(...figures);
    const row = (id: string, value: number, goal: number): BenchRow => ({ id, value, floor: null, ratio: null, unit: 'ms', goal, better: 'lower' });
    return [
      row('compose.drag.frame.p95', best(runs.map(({ frames }) => percentile(frames, 0.95))), 20),
      row('compose.drag.longest-task', best(runs.map(({ longTasks }) => Math.max(0, ...longTasks))), 50),
    ];
  } finally {
    await browser.close();
    await app.remove();
  }
}
