import { mkdtemp, readFile, rm } from 'node:fs/promises';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import exifr from 'exifr';
import sharp from 'sharp';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { exportSpread, type ExportResult } from '#server/images/export-spread';
import { EXPORT_LIMITS } from '#server/images/pools';
import { WorkerProcess } from '#server/images/worker-process';
import { exportPixels } from '#shared/scene/export-size';
import { buildScene } from '#shared/scene/build-scene';
import { buildMat, buildPrint, buildSpread, formatOf, printContent, printsById } from '../../support/builders';
import { patches, sharpOf } from '../../support/pictures';

const RED = [200, 40, 30] as const;
const GREEN = [30, 160, 60] as const;
const print = buildPrint({ imageWidth: 900, imageHeight: 600 });

let folder: string;
let picturePath: string;
beforeAll(async () => {
  folder = await mkdtemp(join(tmpdir(), 'pairleaf-export-'));
  picturePath = join(folder, 'original.jpg');
  await sharpOf(patches([[[...RED], [...GREEN], [...RED]], [[...GREEN], [...RED], [...GREEN]]], 300))
    .withExif({ IFD0: { Model: 'Boxcam 7' }, IFD3: { GPSLatitudeRef: 'N', GPSLatitude: '47/1 22/1 10/1', GPSLongitudeRef: 'E', GPSLongitude: '8/1 32/1 30/1' } })
    .jpeg({ quality: 95 })
    .toFile(picturePath);
});
afterAll(() => rm(folder, { recursive: true, force: true }));

function sceneOn(formatId: string) {
  const mats = [buildMat({ x: 0, y: 0, w: 10, h: 10, color: '#1f4f5f', content: printContent(print, { x: 2000, y: 0 }) })];
  return buildScene(buildSpread({ format: formatOf(formatId), mats }), printsById([print]));
}

async function exported(formatId: string, format: 'png' | 'jpeg', size: 'screen' | 'print'): Promise<{ file: Buffer; result: ExportResult }> {
  const scene = sceneOn(formatId);
  const outputPath = join(folder, `out-${formatId}-${size}.${format}`);
  const picturePaths = { [print.id]: picturePath };
  const result = await exportSpread({ scene, widthPx: exportPixels(scene, size).width, format, picturePaths, outputPath });
  return { file: await readFile(outputPath), result };
}

/** Pixels per unit x and y, and the unit (1 = metre), of a PNG's pHYs chunk: W3C PNG, 11.3.4.3. */
function pngDensity(file: Buffer): [number, number, number] {
  const at = file.indexOf('pHYs');
  return [file.readUInt32BE(at + 4), file.readUInt32BE(at + 8), file.readUInt8(at + 12)];
}

/** Unit (1 = per inch), x and y density of the JFIF segment, which must be the first: JFIF 1.02. */
function jfifDensity(file: Buffer): [number, number, number] {
  expect(file.toString('latin1', 6, 10)).toBe('JFIF');
  return [file.readUInt8(13), file.readUInt16BE(14), file.readUInt16BE(16)];
}

/** 300 ppi is 11811 pixels per metre, 100 ppi 3937: ppi / 0.0254 m, rounded. */
describe('an exported spread', () => {
  it.each<[string, 'screen' | 'print', number, number, number, number]>([
    ['12x12in', 'print', 7200, 3600, 11811, 300],
    ['12x12in', 'screen', 2400, 1200, 3937, 100],
    ['8x8in', 'print', 4800, 2400, 11811, 300],
    ['6x8in', 'screen', 2400, 1600, 7874, 200],
  ])('of %s pages at %s size is %d × %d px with its density in the PNG and the JPEG', async (formatId, size, width, height, perMetre, perInch) => {
    const png = await exported(formatId, 'png', size);
    expect(await sharp(png.file).metadata()).toMatchObject({ format: 'png', width, height, channels: 3, space: 'srgb' });
    expect(png.result).toEqual({ widthPx: width, heightPx: height, bytes: png.file.length });
    expect(pngDensity(png.file)).toEqual([perMetre, perMetre, 1]);

    const jpeg = await exported(formatId, 'jpeg', size);
    expect(await sharp(jpeg.file).metadata()).toMatchObject({ format: 'jpeg', width, height, density: perInch, chromaSubsampling: '4:4:4' });
    expect(jpeg.result.bytes).toBe(jpeg.file.length);
    expect(jfifDensity(jpeg.file)).toEqual([1, perInch, perInch]);
  });

  it('of A4 pages is true size within half a pixel per metre', async () => {
    const { file, result } = await exported('a4', 'png', 'screen');
    const [perMetre] = pngDensity(file);
    expect(result.widthPx).toBe(2400);
    expect(Math.abs(perMetre - 2400 / 0.42)).toBeLessThanOrEqual(0.5);
  });

  it('says that it is sRGB', async () => {
    const { icc } = await sharp((await exported('12x12in', 'png', 'screen')).file).metadata();
    expect(icc?.toString('latin1')).toContain('RGB');
  });

  it('carries nothing of the originals but pixels', async () => {
    const before: unknown = await exifr.parse(picturePath, { gps: true });
    expect(before).toMatchObject({ Model: 'Boxcam 7', latitude: expect.closeTo(47.369, 2) });
    const { file } = await exported('12x12in', 'jpeg', 'screen');
    const after: unknown = await exifr.parse(file, { gps: true });
    expect(after).not.toHaveProperty('Model');
    expect(after).not.toHaveProperty('latitude');
    expect(file.includes('Boxcam')).toBe(false);
  });

  it('draws the photo from its original and the mat in its colour', async () => {
    const { file } = await exported('12x12in', 'png', 'screen');
    const { data, info } = await sharp(file).raw().toBuffer({ resolveWithObject: true });
    const seen = new Map<string, number>();
    for (let at = 0; at < data.length; at += 3 * 7) {
      const key = [data[at]!, data[at + 1]!, data[at + 2]!].map((value) => Math.round(value / 16)).join();
      seen.set(key, (seen.get(key) ?? 0) + 1);
    }
    const share = (rgb: readonly number[]): number => (seen.get(rgb.map((v) => Math.round(v / 16)).join()) ?? 0) / (data.length / 21);
    expect(info.channels).toBe(3);
    expect(share(RED)).toBeGreaterThan(0.01);
    expect(share(GREEN)).toBeGreaterThan(0.01);
    expect(share([0x1f, 0x4f, 0x5f])).toBeGreaterThan(0.01);
  });

  it('fails, and says of which print, when an original is missing', async () => {
    const scene = sceneOn('12x12in');
    const task = { scene, widthPx: 600, format: 'png' as const, picturePaths: {}, outputPath: join(folder, 'never.png') };
    await expect(exportSpread(task)).rejects.toThrow(print.id);
  });

  it('is drawn in a process of its own within the memory it may have, telling how far it is', async () => {
    const scene = sceneOn('12x12in');
    const worker = new WorkerProcess(new URL('../../../server/images/export-worker.ts', import.meta.url), EXPORT_LIMITS);
    const shares: number[] = [];
    try {
      const task = { scene, widthPx: 7200, format: 'jpeg', picturePaths: { [print.id]: picturePath }, outputPath: join(folder, 'worker.jpg') };
      expect(await worker.run(task, (share) => shares.push(share))).toMatchObject({ widthPx: 7200, heightPx: 3600 });
      expect(worker.peakRssBytes).toBeGreaterThan(75e6);
      expect(worker.peakRssBytes).toBeLessThan(EXPORT_LIMITS.maxRssBytes);
      expect(shares).toEqual([0]);
    } finally {
      await worker.stop();
    }
  });
});
