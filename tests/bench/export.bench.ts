import { mkdtemp, rm } from 'node:fs/promises';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import sharp, { type OverlayOptions, type Sharp } from 'sharp';
import { EXPORT_LIMITS } from '#server/images/pools';
import { WorkerProcess } from '#server/images/worker-process';
import { exportPixels } from '#shared/scene/export-size';
import { buildScene } from '#shared/scene/build-scene';
import { toPixels } from '#shared/scene/pixels';
import type { Scene } from '#shared/scene/scene';
import { inches } from '#shared/model/length';
import { buildMat, buildPrint, buildSpread, matIdOf, printContent, printIdOf, printsById } from '../support/builders';
import { realPhotos } from '../support/real-photos';
import type { BenchRow } from './bench';
import { medianOfBoth } from './timing';

const ROUNDS = 3;
const PHOTOS = 20;
const MEBIBYTE = 1024 * 1024;
/** As exports are written: see server/images/export-spread.ts. */
const WRITERS = {
  png: (image: Sharp) => image.png({ compressionLevel: 4 }),
  jpeg: (image: Sharp) => image.jpeg({ quality: 92, chromaSubsampling: '4:4:4' }),
} as const;

/** Twenty real photographs as 6 × 4 in prints on the mats of a 12 × 12 in spread, each cut to its mat. */
async function spreadOfPhotos(): Promise<{ scene: Scene; picturePaths: Record<string, string> }> {
  const photos = await realPhotos();
  const picturePaths: Record<string, string> = {};
  const prints = Array.from({ length: PHOTOS }, (_, i) => {
    const { path, width, height } = photos[i % photos.length]!;
    const id = printIdOf(i + 1);
    picturePaths[id] = path;
    const isFlat = width >= height;
    const [paperWidth, paperHeight] = isFlat ? [inches(6), inches(4)] : [inches(4), inches(6)];
    return buildPrint({ id, imageWidth: width, imageHeight: height, paperWidth, paperHeight });
  });
  const mats = prints.map((print, i) => {
    const at = i % 10;
    return buildMat({
      id: matIdOf(i + 1),
      page: i < 10 ? 'left' : 'right',
      x: (at % 3) * 7,
      y: Math.floor(at / 3) * 5,
      w: 7,
      h: 5,
      color: '#1f4f5f',
      content: printContent(print, { x: inches(1 / 4), y: inches(1 / 4) }),
    });
  });
  return { scene: buildScene(buildSpread({ mats }), printsById(prints)), picturePaths };
}

/** The same layers by sharp alone: each photo cut and resized as it lies, two at a time, then one composite. */
async function bare(scene: Scene, picturePaths: Record<string, string>, format: 'png' | 'jpeg', path: string): Promise<void> {
  const widthPx = exportPixels(scene, 'print').width;
  const scale = widthPx / scene.width;
  const layers: Promise<OverlayOptions>[] = [];
  for (const item of [...scene.pages, ...scene.items]) {
    if ('kind' in item && item.kind !== 'rect' && item.kind !== 'photo') continue;
    const { x, y, width, height } = toPixels(item.rect, scale);
    if ('kind' in item && item.kind === 'photo') {
      const { source } = item;
      const cut = { left: Math.floor(source.x), top: Math.floor(source.y), width: Math.floor(source.width), height: Math.floor(source.height) };
      const layer = sharp(picturePaths[item.printId]).autoOrient().extract(cut).resize(width, height, { fit: 'fill' }).raw().toBuffer({ resolveWithObject: true });
      layers.push(layer.then(({ data, info }) => ({ input: data, raw: { width: info.width, height: info.height, channels: info.channels }, left: x, top: y })));
      if (layers.length % 2 === 0) await layer;
    } else {
      const background = 'kind' in item ? item.fill : item.color;
      layers.push(Promise.resolve({ input: { create: { width, height, channels: 3, background } }, left: x, top: y }));
    }
  }
  const canvas = sharp({ create: { width: widthPx, height: Math.round(scene.height * scale), channels: 3, background: '#d7d7d7' } });
  await WRITERS[format](canvas.composite(await Promise.all(layers)).removeAlpha().withMetadata({ density: 300 })).toFile(path);
}

/** A spread at 300 ppi (7200 × 3600 px) in its worker process, against sharp's own composite in this one. */
export async function rows(): Promise<BenchRow[]> {
  sharp.cache(false);
  const { scene, picturePaths } = await spreadOfPhotos();
  const folder = await mkdtemp(join(tmpdir(), 'pairleaf-bench-export-'));
  const worker = new WorkerProcess(new URL('../../server/images/export-worker.ts', import.meta.url), EXPORT_LIMITS);
  try {
    const found: BenchRow[] = [];
    for (const format of ['png', 'jpeg'] as const) {
      const task = { scene, widthPx: exportPixels(scene, 'print').width, format, picturePaths, outputPath: join(folder, `ours.${format}`) };
      const medians = await medianOfBoth(ROUNDS, () => worker.run(task), () => bare(scene, picturePaths, format, join(folder, `bare.${format}`)));
      const ratio = medians.ours / medians.bare;
      found.push({ id: `export.300ppi.${format}`, value: medians.ours, floor: medians.bare, ratio, unit: 'ms', goal: 1.4, better: 'lower' });
    }
    found.push({ id: 'export.memory', value: worker.peakRssBytes / MEBIBYTE, floor: null, ratio: null, unit: 'MB', goal: 1536, better: 'lower' });
    return found;
  } finally {
    await worker.stop();
    await rm(folder, { recursive: true, force: true });
  }
}
