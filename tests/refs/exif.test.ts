import { mkdtemp, rm } from 'node:fs/promises';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import sharp from 'sharp';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { z } from 'zod';
import { intake } from '#server/images/intake';
import { readReference, referencePath } from '../support/refs';

const samples = z
  .object({
    files: z.array(
      z.object({ file: z.string(), exif_orientation: z.int(), displayed_size: z.tuple([z.int(), z.int()]) }),
    ),
  })
  .parse(JSON.parse(readReference('exif/samples.json')));

let folder: string;
beforeAll(async () => {
  sharp.cache(false); // the sizes of one sample after the other have the same paths
  folder = await mkdtemp(join(tmpdir(), 'pairleaf-exif-refs-'));
});
afterAll(() => rm(folder, { recursive: true, force: true }));

/** The picture as it is seen, 60 px wide. */
async function seen(file: string) {
  const { width, height, pictures } = await intake({ sourcePath: referencePath(`exif/${file}`), outputFolder: folder });
  return { width, height, pixels: await sharp(pictures.medium).resize(60, 40, { fit: 'fill' }).raw().toBuffer() };
}

/** Photographs by P. Bouillot and J. Salvino in the eight orientations, recurser/exif-orientation-examples (MIT). */
describe('the EXIF orientation samples', () => {
  const upright = samples.files.filter(({ file }) => file.startsWith('Landscape'));

  it('are all there', () => {
    expect(upright.map(({ exif_orientation }) => exif_orientation)).toEqual([0, 1, 2, 3, 4, 5, 6, 7, 8]);
  });

  // The sample of tag 0, which stands for none, is another photograph.
  it.each(upright.filter(({ exif_orientation }) => exif_orientation > 1))('$file is seen as the one that needs no turn', async ({ file, displayed_size: [width, height] }) => {
    const first = await seen('Landscape_1.jpg');
    const turned = await seen(file);
    expect([turned.width, turned.height]).toEqual([width, height]);
    const difference = first.pixels.reduce((sum, value, i) => sum + Math.abs(value - turned.pixels[i]!), 0) / first.pixels.length;
    expect(difference).toBeLessThan(4);
  });
});
