import { describe, expect, it } from 'vitest';
import sharp from 'sharp';
import { withJfifDensity } from '#server/images/jfif-density';
import { noisy, sharpOf } from '../../support/pictures';

const jpeg = () => sharpOf(noisy(40, 30)).jpeg().toBuffer();

/** APP0 of JFIF 1.02: marker, length 16, "JFIF\0", version, unit 1 = per inch, x and y density, no thumbnail. */
const segment = (ppi: string): string => `ffe000104a46494600010201${ppi}${ppi}0000`;

describe('withJfifDensity', () => {
  it('puts the density right after the start of the image', async () => {
    const marked = withJfifDensity(await jpeg(), 300);
    expect(marked.subarray(0, 20).toString('hex')).toBe(`ffd8${segment('012c')}`);
    expect(await sharp(marked).metadata()).toMatchObject({ width: 40, height: 30, density: 300 });
  });

  it('replaces a density that is there', async () => {
    const marked = withJfifDensity(withJfifDensity(await jpeg(), 72), 100);
    expect(marked.subarray(0, 20).toString('hex')).toBe(`ffd8${segment('0064')}`);
    expect(marked.indexOf('JFIF', 20)).toBe(-1);
  });

  it('keeps every pixel', async () => {
    const plain = await jpeg();
    const pixels = await sharp(plain).raw().toBuffer();
    expect(await sharp(withJfifDensity(plain, 145.14)).raw().toBuffer()).toEqual(pixels);
  });

  it('refuses what is no JPEG, and a density that JFIF cannot hold', async () => {
    expect(() => withJfifDensity(Buffer.from('GIF89a'), 300)).toThrow(RangeError);
    const plain = await jpeg();
    for (const ppi of [0, 0.4, 70_000, Number.NaN]) expect(() => withJfifDensity(plain, ppi)).toThrow(RangeError);
  });
});
