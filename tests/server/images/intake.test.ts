import { mkdtemp, readFile, rm, writeFile } from 'node:fs/promises';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import exifr from 'exifr';
import sharp, { type Sharp } from 'sharp';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { intake } from '#server/images/intake';
import { decodeRaster } from '#shared/colour/raster';
import { noisy, patches, sharpOf } from '../../support/pictures';

let folder: string;
beforeAll(async () => {
  folder = await mkdtemp(join(tmpdir(), 'pairleaf-intake-'));
});
afterAll(() => rm(folder, { recursive: true, force: true }));

async function take(image: Sharp | Buffer) {
  const sourcePath = join(folder, 'source');
  await writeFile(sourcePath, Buffer.isBuffer(image) ? image : await image.toBuffer());
  return intake({ sourcePath, outputFolder: folder });
}

/** Names of a WebP's chunks: EXIF, XMP and ICCP would be the metadata. */
function webpChunks(file: Buffer): string[] {
  const names: string[] = [];
  for (let at = 12; at + 8 <= file.length; at += 8 + file.readUInt32LE(at + 4) + (file.readUInt32LE(at + 4) % 2)) {
    names.push(file.toString('latin1', at, at + 4));
  }
  return names;
}

async function middleColor(path: string): Promise<number[]> {
  const { data, info } = await sharp(path).removeAlpha().raw().toBuffer({ resolveWithObject: true });
  const at = (Math.floor(info.height / 2) * info.width + Math.floor(info.width / 2)) * info.channels;
  return [...data.subarray(at, at + 3)];
}

describe('intake', () => {
  it.each(['jpeg', 'png', 'webp', 'tiff', 'avif'] as const)('takes a %s and makes the three sizes, never larger than it is', async (format) => {
    const result = await take(sharpOf(noisy(1000, 500)).toFormat(format, format === 'avif' ? { effort: 0 } : {}));
    const sizes = await Promise.all(
      (['small', 'medium', 'large'] as const).map(async (size) => {
        const { width, height, format: made } = await sharp(result.pictures[size]).metadata();
        return [width, height, made];
      }),
    );
    expect(sizes).toEqual([[320, 160, 'webp'], [800, 400, 'webp'], [1000, 500, 'webp']]);
  });

  it('shrinks a large picture to 1600 px on its long side', async () => {
    const { pictures, width, height } = await take(sharpOf(noisy(1200, 2400)).jpeg());
    expect([width, height]).toEqual([1200, 2400]);
    expect(await sharp(pictures.large).metadata()).toMatchObject({ width: 800, height: 1600 });
  });

  it('strips place, device and every other metadata from what it serves', async () => {
    const source = await sharpOf(noisy(400, 300))
      .withExif({
        IFD0: { Make: 'Invented', Model: 'Boxcam 7' },
        IFD3: { GPSLatitudeRef: 'N', GPSLatitude: '47/1 22/1 10/1', GPSLongitudeRef: 'E', GPSLongitude: '8/1 32/1 30/1' },
      })
      .withXmp('<x:xmpmeta xmlns:x="adobe:ns:meta/"><rdf:RDF xmlns:rdf="http://www.w3.org/1999/02/22-rdf-syntax-ns#"/></x:xmpmeta>')
      .jpeg()
      .toBuffer();
    const before: unknown = await exifr.parse(source, { gps: true });
    expect(before).toMatchObject({ Make: 'Invented', latitude: expect.closeTo(47.369, 2), longitude: expect.closeTo(8.54, 2) });

    const { pictures } = await take(source);
    for (const path of Object.values(pictures)) {
      const file = await readFile(path);
      expect(webpChunks(file)).toEqual(['VP8 ']);
      expect(file.includes('Boxcam')).toBe(false);
    }
  });

  it.each<[string, () => Promise<Buffer>, number]>([
    ['grey', () => sharpOf(patches([[[120, 120, 120]]], 64)).toColourspace('b-w').png().toBuffer(), 2],
    ['16-bit grey', () => sharpOf(patches([[[120, 120, 120]]], 64)).toColourspace('grey16').png().toBuffer(), 2],
  ])('turns %s into three channels', async (_kind, make, tolerance) => {
    const { pictures } = await take(await make());
    for (const value of await middleColor(pictures.large)) expect(Math.abs(value - 120)).toBeLessThanOrEqual(tolerance);
  });

  it.each<[string, () => Promise<Buffer>, number]>([
    ['16-bit', () => sharpOf(patches([[[200, 50, 20]]], 64)).toColourspace('rgb16').png().toBuffer(), 4],
    ['Display P3', () => sharpOf(patches([[[200, 50, 20]]], 64)).withIccProfile('p3').png().toBuffer(), 4],
    ['CMYK', () => sharpOf(patches([[[200, 50, 20]]], 64)).withIccProfile('cmyk').jpeg({ quality: 100 }).toBuffer(), 16],
  ])('converts %s to sRGB', async (_kind, make, tolerance) => {
    const { pictures } = await take(await make());
    const difference = (await middleColor(pictures.large)).map((value, i) => Math.abs(value - [200, 50, 20][i]!));
    expect(Math.max(...difference)).toBeLessThanOrEqual(tolerance);
  });

  it('reads a wide profile as other numbers than plain sRGB, so that the conversion is seen to happen', async () => {
    const p3 = await sharpOf(patches([[[200, 50, 20]]], 64)).withIccProfile('p3').png().toBuffer();
    const { data } = await sharp(p3, { ignoreIcc: true }).raw().toBuffer({ resolveWithObject: true });
    expect(data[0]).toBeLessThan(192);
  });

  it('shows white paper where a picture is transparent', async () => {
    const clear = sharp({ create: { width: 64, height: 64, channels: 4, background: { r: 0, g: 0, b: 0, alpha: 0 } } }).png();
    expect(await middleColor((await take(clear)).pictures.large)).toEqual([255, 255, 255]);
  });

  it('keeps a raster of 64 px on the long side, upright', async () => {
    const { raster } = await take(sharpOf(patches([[[255, 255, 255], [0, 0, 0]]], 200)).png());
    expect([raster.width, raster.height]).toEqual([64, 32]);
    const decoded = decodeRaster(raster);
    // The stored form of L is round(L × 254 − 127): shared/model/print.ts.
    expect(decoded.data[0]).toBeGreaterThan(124);
    expect(decoded.data[63 * 3]).toBeLessThan(-124);
  });

  it('gives the same answer for the same picture', async () => {
    const first = await take(sharpOf(noisy(500, 400)).jpeg());
    const second = await take(sharpOf(noisy(500, 400)).jpeg());
    expect(second).toEqual(first);
  });
});
