import sharp from 'sharp';
import { describe, expect, it } from 'vitest';
import { drawScene } from '#server/images/draw-scene';
import type { Turns } from '#shared/model/ids';
import type { Rect } from '#shared/model/rect';
import type { PhotoItem, Scene, SceneItem } from '#shared/scene/scene';
import { setLine } from '#shared/scene/text';
import { patches, sharpOf } from '../../support/pictures';

type Rgb = readonly [number, number, number];

const RED: Rgb = [230, 40, 40];
const GREEN: Rgb = [40, 200, 60];
const BLUE: Rgb = [50, 60, 230];
const YELLOW: Rgb = [240, 220, 40];
const DARK: Rgb = [30, 30, 30];
const VIOLET: Rgb = [200, 60, 220];
const WHITE: Rgb = [255, 255, 255];
const PAGE: Rgb = [0xef, 0xe6, 0xd2];

const SIDE = 60;
/** The picture as it is to be seen, 180 × 120 px; no two patches alike. */
const PATCHES: readonly (readonly Rgb[])[] = [
  [RED, GREEN, BLUE],
  [YELLOW, DARK, VIOLET],
];
const IMAGE = { imageWidth: 3 * SIDE, imageHeight: 2 * SIDE };

/** A scene of one page whose units are pixels when drawn 400 px wide. */
const sceneOf = (...items: SceneItem[]): Scene => ({
  width: 400,
  height: 300,
  pages: [{ side: 'left', rect: { x: 0, y: 0, width: 400, height: 300 }, color: '#efe6d2' }],
  fold: null,
  items,
});

const photoOf = (rect: Rect, parts: Partial<PhotoItem> = {}): PhotoItem => ({
  kind: 'photo',
  key: 'a/photo',
  matId: 'a',
  printId: 'print',
  rect,
  source: { x: 0, y: 0, width: IMAGE.imageWidth, height: IMAGE.imageHeight },
  turns: 0,
  ...IMAGE,
  ...parts,
});

interface Drawn {
  readonly width: number;
  readonly height: number;
  readonly channels: number;
  readonly at: (x: number, y: number) => Rgb;
}

async function draw(scene: Scene, picture?: Buffer, widthPx = 400): Promise<Drawn> {
  const drawing = await drawScene(scene, { widthPx, loadPicture: async () => ({ data: picture ?? (await plainPicture()) }) });
  const { data, info } = await drawing.raw().toBuffer({ resolveWithObject: true });
  const at = (x: number, y: number): Rgb => {
    const start = (y * info.width + x) * 3;
    return [data[start]!, data[start + 1]!, data[start + 2]!];
  };
  return { width: info.width, height: info.height, channels: info.channels, at };
}

const plainPicture = (): Promise<Buffer> => sharpOf(patches(PATCHES, SIDE)).png().toBuffer();

/** JPEG and resampling move flat colours by a few steps. */
function expectColor(actual: Rgb, expected: Rgb): void {
  const distance = Math.max(...actual.map((value, i) => Math.abs(value - expected[i]!)));
  expect(distance, `${actual.join(' ')} instead of ${expected.join(' ')}`).toBeLessThanOrEqual(8);
}

/** Colours at the centres of equal cells of `rect`, row by row. */
function expectCells(drawn: Drawn, rect: Rect, cells: readonly (readonly Rgb[])[]): void {
  cells.forEach((row, y) =>
    row.forEach((color, x) => {
      const centreX = Math.floor(rect.x + ((x + 0.5) * rect.width) / row.length);
      const centreY = Math.floor(rect.y + ((y + 0.5) * rect.height) / cells.length);
      expectColor(drawn.at(centreX, centreY), color);
    }),
  );
}

function turnedCells(cells: readonly (readonly Rgb[])[], turns: Turns): readonly (readonly Rgb[])[] {
  let turned = cells;
  for (let i = 0; i < turns; i += 1) turned = turned[0]!.map((_, x) => turned.map((row) => row[x]!).reverse());
  return turned;
}

/** Where the stored 0th row and 0th column are seen: CIPA DC-008 (Exif), tag 0x0112 Orientation. */
const ORIENTATIONS = [
  [1, 'top', 'left'],
  [2, 'top', 'right'],
  [3, 'bottom', 'right'],
  [4, 'bottom', 'left'],
  [5, 'left', 'top'],
  [6, 'right', 'top'],
  [7, 'right', 'bottom'],
  [8, 'left', 'bottom'],
] as const;

/** What a file with that orientation has to store so that `PATCHES` are seen. */
function storedPatches(row0: string, column0: string): Rgb[][] {
  const height = PATCHES.length;
  const width = PATCHES[0]!.length;
  const isTurned = row0 === 'left' || row0 === 'right';
  return Array.from({ length: isTurned ? width : height }, (_, r) =>
    Array.from({ length: isTurned ? height : width }, (__, c) => {
      const [across, down] = isTurned ? [row0, column0] : [column0, row0];
      const [i, j] = isTurned ? [r, c] : [c, r];
      return PATCHES[down === 'top' ? j : height - 1 - j]![across === 'left' ? i : width - 1 - i]!;
    }),
  );
}

describe('photos in a drawn scene', () => {
  describe.each(ORIENTATIONS)('from a file of EXIF orientation %d', (orientation, row0, column0) => {
    const file = (): Promise<Buffer> =>
      sharpOf(patches(storedPatches(row0, column0), SIDE)).withMetadata({ orientation }).jpeg({ quality: 100 }).toBuffer();

    it.each([0, 1, 2, 3] as const)('stand as the page turns them (%d quarter-turns)', async (turns) => {
      const rect = turns % 2 === 0 ? { x: 20, y: 30, width: 270, height: 180 } : { x: 20, y: 30, width: 170, height: 255 };
      const drawn = await draw(sceneOf(photoOf(rect, { turns })), await file());
      expectCells(drawn, rect, turnedCells(PATCHES, turns));
    });
  });

  it('show the source and nothing else of the picture', async () => {
    const rect = { x: 10, y: 10, width: 120, height: 120 };
    const drawn = await draw(sceneOf(photoOf(rect, { source: { x: SIDE, y: 0, width: SIDE, height: SIDE } })));
    for (const [x, y] of [[10, 10], [129, 10], [10, 129], [129, 129], [70, 70]] as const) expectColor(drawn.at(x, y), GREEN);
    expect([drawn.at(9, 70), drawn.at(130, 70), drawn.at(70, 9), drawn.at(70, 130)]).toEqual([PAGE, PAGE, PAGE, PAGE]);
  });

  it('show white paper where the picture does not reach, on the side that the turn brings it to', async () => {
    const rect = { x: 0, y: 0, width: 100, height: 220 };
    // 40 px of white before the picture's left edge: at the top after one quarter-turn.
    const drawn = await draw(sceneOf(photoOf(rect, { turns: 1, source: { x: -40, y: 0, width: 220, height: 100 } })));
    expect([drawn.at(50, 5), drawn.at(50, 38)]).toEqual([WHITE, WHITE]);
    expectColor(drawn.at(70, 45), RED);
    expectColor(drawn.at(70, 215), BLUE);
  });

  it('are plain paper where only white is in view', async () => {
    const drawn = await draw(sceneOf(photoOf({ x: 0, y: 0, width: 50, height: 50 }, { source: { x: 500, y: 0, width: 50, height: 50 } })));
    expect(drawn.at(25, 25)).toEqual(WHITE);
  });

  it('of two panes continue each other across the seam', async () => {
    const left = photoOf({ x: 0, y: 0, width: 90, height: 120 }, { source: { x: 0, y: 0, width: 90, height: 120 } });
    const right = photoOf({ x: 100, y: 0, width: 90, height: 120 }, { source: { x: 90, y: 0, width: 90, height: 120 } });
    const drawn = await draw(sceneOf(left, right));
    expectColor(drawn.at(87, 30), GREEN);
    expectColor(drawn.at(102, 30), GREEN);
    expect(drawn.at(95, 30)).toEqual(PAGE);
    // The green patch ends 30 px into the right pane.
    expectColor(drawn.at(126, 30), GREEN);
    expectColor(drawn.at(133, 30), BLUE);
  });

  it('are cut off at the edge of the spread', async () => {
    const drawn = await draw(sceneOf(photoOf({ x: -90, y: 240, width: 180, height: 120 })));
    expectColor(drawn.at(0, 250), GREEN);
    expectColor(drawn.at(60, 299), BLUE);
  });

  it('may come from a smaller copy of the picture', async () => {
    const small = await sharp(await plainPicture()).resize(90, 60).png().toBuffer();
    const rect = { x: 0, y: 0, width: 180, height: 120 };
    expectCells(await draw(sceneOf(photoOf(rect)), small), rect, PATCHES);
  });

  it('may come from a picture many times larger than needed', async () => {
    const large = await sharpOf(patches(PATCHES, 600)).jpeg({ quality: 95 }).toBuffer();
    const rect = { x: 7, y: 5, width: 180, height: 120 };
    expectCells(await draw(sceneOf(photoOf(rect)), large), rect, PATCHES);
    const corner = photoOf(rect, { source: { x: SIDE, y: SIDE, width: SIDE, height: SIDE } });
    expectCells(await draw(sceneOf(corner), large), rect, [[DARK, DARK], [DARK, DARK]]);
  });

  it.each([
    ['grey', () => sharpOf(patches([[DARK]], SIDE)).greyscale().png().toBuffer(), DARK],
    ['16-bit', () => sharpOf(patches([[VIOLET]], SIDE)).toColourspace('rgb16').png().toBuffer(), VIOLET],
    ['transparent', () => sharp({ create: { width: SIDE, height: SIDE, channels: 4, background: { r: 0, g: 0, b: 0, alpha: 0 } } }).png().toBuffer(), WHITE],
  ] as const)('may be %s', async (_, picture, color) => {
    const size = { imageWidth: SIDE, imageHeight: SIDE };
    const photo = photoOf({ x: 0, y: 0, width: 40, height: 40 }, { ...size, source: { x: 0, y: 0, width: SIDE, height: SIDE }, turns: 1 });
    expectColor((await draw(sceneOf(photo), await picture())).at(20, 20), color);
  });

  it('are refused with the reason why one cannot be read', async () => {
    const scene = sceneOf(photoOf({ x: 0, y: 0, width: 9, height: 9 }), photoOf({ x: 9, y: 0, width: 9, height: 9 }));
    await expect(drawScene(scene, { widthPx: 400, loadPicture: () => Promise.reject(new Error('the file is gone')) })).rejects.toThrow('the file is gone');
  });
});

describe('the rest of a drawn scene', () => {
  const base = { key: 'a/x', matId: 'a' } as const;
  const rect = (r: Rect, fill: string, opacity?: number): SceneItem => ({ ...base, kind: 'rect', rect: r, fill, opacity });

  it('has the size asked for and no alpha', async () => {
    expect(await draw(sceneOf(), undefined, 801)).toMatchObject({ width: 801, height: 601, channels: 3 });
  });

  it('shows the table between pages that do not touch', async () => {
    const page = { x: 0, y: 0, width: 190, height: 300 };
    const drawn = await draw({ ...sceneOf(), pages: [{ side: 'left', rect: page, color: '#efe6d2' }, { side: 'right', rect: { ...page, x: 210 }, color: '#ffffff' }] });
    const [r, g, b] = drawn.at(200, 100);
    expect([r === g, g === b, r < 230]).toEqual([true, true, true]);
    expect([drawn.at(100, 100), drawn.at(300, 100)]).toEqual([PAGE, WHITE]);
  });

  it('shows the fold, however thin', async () => {
    const drawn = await draw({ ...sceneOf(), fold: { rect: { x: 200, y: 0, width: 0.2, height: 300 }, fill: '#000000', opacity: 0.5 } });
    expectColor(drawn.at(200, 150), [120, 115, 105]);
    expect([drawn.at(199, 150), drawn.at(201, 150)]).toEqual([PAGE, PAGE]);
  });

  it('leaves no seam between rectangles that share an edge, at any width', async () => {
    const scene = sceneOf(rect({ x: 0, y: 0, width: 133, height: 300 }, '#1f4f5f'), rect({ x: 133, y: 0, width: 267, height: 300 }, '#1f4f5f'));
    for (const widthPx of [301, 333, 477]) {
      const drawn = await draw(scene, undefined, widthPx);
      const row = Array.from({ length: widthPx }, (_, x) => drawn.at(x, 10).join());
      expect(new Set(row)).toEqual(new Set(['31,79,95']));
    }
  });

  it('paints later items over earlier ones, and faint ones through', async () => {
    const drawn = await draw(sceneOf(rect({ x: 0, y: 0, width: 20, height: 20 }, '#000000'), rect({ x: 0, y: 0, width: 10, height: 20 }, '#ffffff'), rect({ x: 0, y: 0, width: 5, height: 20 }, '#000000', 0.2)));
    expect([drawn.at(2, 2), drawn.at(7, 7), drawn.at(15, 15)]).toEqual([[204, 204, 204], WHITE, [0, 0, 0]]);
  });

  it('draws frames inside their rectangle', async () => {
    const drawn = await draw(sceneOf({ ...base, kind: 'frame', rect: { x: 10, y: 10, width: 30, height: 20 }, thickness: 2, fill: '#000000' }));
    expect([drawn.at(10, 10), drawn.at(11, 20), drawn.at(39, 29)]).toEqual([[0, 0, 0], [0, 0, 0], [0, 0, 0]]);
    expect([drawn.at(9, 20), drawn.at(12, 12), drawn.at(40, 20)]).toEqual([PAGE, PAGE, PAGE]);
  });

  it('draws circles with their centre filled and their corners free', async () => {
    const drawn = await draw(sceneOf({ ...base, kind: 'circle', cx: 100, cy: 100, r: 40, fill: '#1f4f5f' }));
    expect([drawn.at(100, 100), drawn.at(62, 100), drawn.at(64, 64), drawn.at(141, 100)]).toEqual([[31, 79, 95], [31, 79, 95], PAGE, PAGE]);
  });

  it('puts the ink of letters where the scene says', async () => {
    const line = setLine('young-serif', 100, 'II');
    const xs = line.xs.map((x) => 50 + x);
    const drawn = await draw(sceneOf({ ...base, kind: 'text', font: 'young-serif', size: 100, fill: '#000000', text: line.text, xs, baseline: 150 }));
    // A capital I of Young Serif: 0.75 em tall, its stem in the middle of its advance.
    const stems = xs.map((x) => Math.round(x + line.width / 4));
    for (const stem of stems) expectColor(drawn.at(stem, 112), [0, 0, 0]);
    expect([drawn.at(stems[0]!, 72), drawn.at(stems[0]!, 153), drawn.at(47, 112)]).toEqual([PAGE, PAGE, PAGE]);
    expectColor(drawn.at(stems[0]!, 77), [0, 0, 0]);
    expectColor(drawn.at(stems[0]!, 148), [0, 0, 0]);
  });

  it('draws nothing, and does not fail, for what lies off the spread', async () => {
    const drawn = await draw(
      sceneOf(rect({ x: 500, y: 0, width: 10, height: 10 }, '#000000'), { ...base, kind: 'circle', cx: 900, cy: 900, r: 5, fill: '#000000' }, rect({ x: 1, y: 1, width: 0.1, height: 50 }, '#000000')),
    );
    expect(drawn.at(399, 5)).toEqual(PAGE);
  });
});
