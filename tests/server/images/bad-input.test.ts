import { mkdtemp, rm, writeFile } from 'node:fs/promises';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import sharp from 'sharp';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { intake } from '#server/images/intake';
import { Refusal } from '#server/images/worker-messages';
import { PICTURE_REFUSALS } from '#shared/model/picture-refusal';
import { pictureRefusalSentence } from '#shared/words/en/pictures';
import { hugePng, noisy, sharpOf } from '../../support/pictures';

let folder: string;
beforeAll(async () => {
  folder = await mkdtemp(join(tmpdir(), 'pairleaf-bad-'));
});
afterAll(() => rm(folder, { recursive: true, force: true }));

async function take(name: string, bytes: Buffer | string) {
  const sourcePath = join(folder, name);
  await writeFile(sourcePath, bytes);
  return intake({ sourcePath, outputFolder: folder });
}

async function refusalOf(name: string, bytes: Buffer | string): Promise<Refusal> {
  const error: unknown = await take(name, bytes).catch((thrown: unknown) => thrown);
  if (!(error instanceof Refusal)) throw new Error(`Not refused: ${JSON.stringify(error)}`);
  return error;
}

const photo = () => sharpOf(noisy(640, 480));
const halfOf = (bytes: Buffer): Buffer => bytes.subarray(0, Math.floor(bytes.length / 2));
const SVG = '<svg xmlns="http://www.w3.org/2000/svg" width="90" height="60"><image href="photo.png" width="90" height="60"/></svg>';

/** An ISO base media file that calls itself HEIC; nothing after its brand is ever read. */
const heic = (brand: string): Buffer =>
  Buffer.concat([Buffer.from([0, 0, 0, 24]), Buffer.from(`ftyp${brand}\0\0\0\0mif1${brand}`, 'latin1'), Buffer.alloc(200)]);

const bmp = (): Buffer => Buffer.concat([Buffer.from('BM'), Buffer.alloc(200)]);

const animatedWebp = async (): Promise<Buffer> => {
  const frames = await Promise.all([1, 2].map((seed) => sharpOf(noisy(64, 64, seed)).png().toBuffer()));
  return sharp(frames, { join: { animated: true } }).webp({ delay: [100, 100] }).toBuffer();
};

async function gif(): Promise<Buffer> {
  return photo().resize(64, 64).gif().toBuffer();
}

/** A baseline TIFF of two pages of 32 × 32 grey pixels: TIFF 6.0. */
function twoPageTiff(): Buffer {
  const side = 32;
  const entries = 9;
  const pageBytes = 2 + entries * 12 + 4;
  const pixelsAt = 8 + 2 * pageBytes;
  const file = Buffer.alloc(pixelsAt + side * side, 128);
  file.write('II', 0, 'latin1');
  file.writeUInt16LE(42, 2);
  file.writeUInt32LE(8, 4);
  for (let page = 0; page < 2; page += 1) {
    let at = 8 + page * pageBytes;
    at = file.writeUInt16LE(entries, at);
    const tags: [number, number][] = [[256, side], [257, side], [258, 8], [259, 1], [262, 1], [273, pixelsAt], [277, 1], [278, side], [279, side * side]];
    for (const [tag, value] of tags) {
      at = file.writeUInt16LE(tag, at);
      at = file.writeUInt16LE(4, at);
      at = file.writeUInt32LE(1, at);
      at = file.writeUInt32LE(value, at);
    }
    file.writeUInt32LE(page === 0 ? 8 + pageBytes : 0, at);
  }
  return file;
}

describe('a file that is not a usable photograph is refused by its content', () => {
  it.each<[string, string, () => Buffer | string | Promise<Buffer>]>([
    ['zero bytes', 'empty', () => ''],
    ['text named .jpg', 'not-a-picture', () => 'Dear diary, no picture today.'],
    ['a program named .png', 'not-a-picture', () => Buffer.concat([Buffer.from('MZ'), Buffer.alloc(300)])],
    ['an SVG with external references', 'svg', () => SVG],
    ['an SVG with an XML declaration named .jpg', 'svg', () => `<?xml version="1.0"?>${SVG}`],
    ['a GIF', 'gif', gif],
    ['a PDF', 'pdf', () => '%PDF-1.7\n1 0 obj\n<<>>\nendobj\n'],
    ['a HEIC', 'heic', () => heic('heic')],
    ['a HEIF of the general brand', 'heic', () => heic('mif1')],
    ['a BMP', 'other-kind', bmp],
    ['a ZIP archive', 'not-a-picture', () => Buffer.concat([Buffer.from('PK\x03\x04'), Buffer.alloc(300)])],
    ['a truncated JPEG', 'damaged', async () => halfOf(await photo().jpeg().toBuffer())],
    ['a truncated PNG', 'damaged', async () => halfOf(await photo().png().toBuffer())],
    ['a truncated WebP', 'damaged', async () => halfOf(await photo().webp().toBuffer())],
    ['a JPEG that ends after its header', 'damaged', async () => (await photo().jpeg().toBuffer()).subarray(0, 40)],
    ['a 30000 × 30000 PNG', 'too-many-pixels', () => hugePng(30_000, 30_000)],
    ['a picture of 8 × 8 pixels', 'too-small', () => sharpOf(noisy(8, 8)).png().toBuffer()],
    ['a TIFF of two pages', 'several-pages', twoPageTiff],
    ['an animated WebP', 'animated', animatedWebp],
  ])('%s: %s', async (name, reason, make) => {
    const refusal = await refusalOf(`${name.replace(/\W/g, '-')}.jpg`, await make());
    expect(refusal.reason).toBe(reason);
    expect(pictureRefusalSentence({ reason, ...refusal.data })).not.toContain('undefined');
  });

  it('takes a picture whose extension is wrong for what it is', async () => {
    const result = await take('really-a-png.jpg', await photo().png().toBuffer());
    expect(result).toMatchObject({ mediaType: 'image/png', width: 640, height: 480 });
  });

  it('says the true size of a picture with too many pixels', async () => {
    const { reason, data } = await refusalOf('huge.png', hugePng(30_000, 30_000));
    expect(pictureRefusalSentence({ reason, ...data })).toBe(
      'This picture has 30000 × 30000 pixels, more than 100 megapixels: save a smaller copy and add that.',
    );
  });

  it.each(PICTURE_REFUSALS)('says %s in one sentence with something to do', (reason) => {
    const sentence = pictureRefusalSentence({ reason, kind: 'BMP', pages: 2, width: 1, height: 1, max: 1e8 });
    expect(sentence).toMatch(/^(This|No) [^.]*[:,][^.]*\.$/);
    expect(sentence).not.toContain('undefined');
  });
});
