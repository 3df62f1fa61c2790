import sharp, { type Sharp } from 'sharp';
import type { PrintId } from '../../shared/model/ids';
import { PHOTO_PAPER } from '../../shared/scene/picture-cover';
import { frameEdges, lineToPixels, thicknessToPixels, toPixels } from '../../shared/scene/pixels';
import type { PhotoItem, Scene, SceneItem } from '../../shared/scene/scene';
import { createCanvas, fillRect, paintLayer, type Canvas } from './canvas';
import { drawPhoto, type PictureData } from './photo-layer';
import { drawVectors, type VectorItem } from './vector-layer';

/** The neutral table, seen between two pages that do not touch. */
const TABLE = '#d7d7d7';

export interface DrawSceneOptions {
  /** Width of the whole scene; its height follows from the proportions. */
  readonly widthPx: number;
  /** A print's picture: the original, or any smaller copy of all of it. */
  readonly loadPicture: (id: PrintId) => Promise<{ readonly data: PictureData }>;
  /** How many photos are read at the same time; 2 unless said. */
  readonly concurrency?: number;
}

/**
 * Draws a scene in 8-bit sRGB without alpha. Edges fall on the same pixels as on a screen of that
 * width. The whole drawing is held once (three bytes a pixel), and besides it only the photos that are
 * being read.
 *
 * @returns a pipeline that holds the drawn pixels; the caller sets density and file format.
 * @throws what `loadPicture` or reading a picture throws.
 */
export async function drawScene(scene: Scene, { widthPx, loadPicture, concurrency = 2 }: DrawSceneOptions): Promise<Sharp> {
  const scale = widthPx / scene.width;
  const canvas = createCanvas(widthPx, Math.round(scene.height * scale), TABLE);
  for (const page of scene.pages) fillRect(canvas, toPixels(page.rect, scale), page.color);
  if (scene.fold) fillRect(canvas, lineToPixels(scene.fold.rect, scale), scene.fold.fill, scene.fold.opacity);

  const photos = scene.items.filter((item) => item.kind === 'photo');
  const layers = mapInOrder(photos, concurrency, (photo) => drawPhoto(photo, scale, () => loadPicture(photo.printId)));
  for (const run of runsOf(scene.items)) {
    if (run.kind === 'vectors') await paintVectors(canvas, run.items, scale);
    else if (run.item.kind === 'photo') await paintPhoto(canvas, run.item, scale, layers);
    else paintFlat(canvas, run.item, scale);
  }
  const { data, width, height } = canvas;
  return sharp(data, { raw: { width, height, channels: 3 } });
}

type FlatItem = Exclude<SceneItem, VectorItem | PhotoItem>;

function paintFlat(canvas: Canvas, item: FlatItem, scale: number): void {
  if (item.kind === 'rect') {
    fillRect(canvas, item.isLine ? lineToPixels(item.rect, scale) : toPixels(item.rect, scale), item.fill, item.opacity);
    return;
  }
  for (const edge of frameEdges(toPixels(item.rect, scale), thicknessToPixels(item.thickness, scale))) fillRect(canvas, edge, item.fill, item.opacity);
}

type PhotoLayers = AsyncGenerator<Awaited<ReturnType<typeof drawPhoto>>, void>;

async function paintPhoto(canvas: Canvas, photo: PhotoItem, scale: number, layers: PhotoLayers): Promise<void> {
  const next = await layers.next();
  const drawn = next.done ? null : next.value;
  const paper = toPixels(photo.rect, scale);
  const isCovered = drawn?.layer.width === paper.width && drawn.layer.height === paper.height;
  if (!isCovered) fillRect(canvas, paper, PHOTO_PAPER);
  if (drawn) paintLayer(canvas, drawn.layer, drawn.x, drawn.y);
}

async function paintVectors(canvas: Canvas, items: readonly VectorItem[], scale: number): Promise<void> {
  const drawn = await drawVectors(items, scale, { x: 0, y: 0, width: canvas.width, height: canvas.height });
  if (drawn) paintLayer(canvas, drawn.layer, drawn.x, drawn.y);
}

type Run = { readonly kind: 'vectors'; readonly items: VectorItem[] } | { readonly kind: 'one'; readonly item: FlatItem | PhotoItem };

/** Items in drawing order, with neighbouring circles and lines of text of one mat joined into one layer. */
function runsOf(items: readonly SceneItem[]): Run[] {
  const runs: Run[] = [];
  for (const item of items) {
    const last = runs.at(-1);
    if (item.kind !== 'circle' && item.kind !== 'text') runs.push({ kind: 'one', item });
    else if (last?.kind === 'vectors' && last.items[0]!.matId === item.matId) last.items.push(item);
    else runs.push({ kind: 'vectors', items: [item] });
  }
  return runs;
}

/** Results in the order of `items`, `concurrency` of them under way at any time. */
async function* mapInOrder<T, R>(items: readonly T[], concurrency: number, task: (item: T) => Promise<R>): AsyncGenerator<R, void> {
  const underWay: Promise<R>[] = [];
  let next = 0;
  while (next < items.length || underWay.length > 0) {
    while (next < items.length && underWay.length < concurrency) {
      const started = task(items[next++]!);
      // The failure is thrown where its turn comes; until then it must not count as unhandled.
      started.catch(() => undefined);
      underWay.push(started);
    }
    yield await underWay.shift()!;
  }
}
