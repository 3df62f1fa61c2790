import { Vibrant } from 'node-vibrant/node';
import { rgbToHex } from '../../shared/colour/convert';
import type { SwatchCandidate } from '../../shared/colour/swatches';
import type { Hex } from '../../shared/model/ids';
import type { Swatch } from '../../shared/model/print';
import type { RawPicture } from './raw-picture';

const ROLES = {
  Vibrant: 'vibrant',
  Muted: 'muted',
  DarkVibrant: 'dark-vibrant',
  DarkMuted: 'dark-muted',
  LightVibrant: 'light-vibrant',
  LightMuted: 'light-muted',
} as const satisfies Record<string, Swatch['role']>;

type ImageClass = Parameters<ReturnType<typeof Vibrant.from>['useImageClass']>[0];

/**
 * node-vibrant's colours of a small picture, as candidates. Where no pixel has a role's colour the library makes one up,
 * with population 0: those are left out. It answers the middles of boxes in a coarse cube, so each is moved to the
 * nearest colour that a pixel truly has.
 */
export async function vibrantColours(picture: RawPicture): Promise<SwatchCandidate[]> {
  const palette = await Vibrant.from(withAlpha(picture)).useImageClass(rawImageClass(picture)).quality(1).getPalette();
  return Object.entries(ROLES).flatMap(([name, role]) => {
    const swatch = palette[name];
    return swatch && swatch.population > 0 ? [{ hex: nearestPixel(picture, swatch.rgb), role }] : [];
  });
}

function nearestPixel({ data }: RawPicture, [r, g, b]: readonly [number, number, number]): Hex {
  let nearest = 0;
  let least = Infinity;
  for (let at = 0; at < data.length; at += 3) {
    const distance = (data[at]! - r) ** 2 + (data[at + 1]! - g) ** 2 + (data[at + 2]! - b) ** 2;
    if (distance >= least) continue;
    least = distance;
    nearest = at;
  }
  return rgbToHex(data[nearest]!, data[nearest + 1]!, data[nearest + 2]!);
}

/** The library's reader for pixels that sharp decoded, in place of its own decoder. The size is right already. */
function rawImageClass({ width, height }: RawPicture): ImageClass {
  return class RawImage {
    private data: Buffer = Buffer.alloc(0);

    async load(source: unknown): Promise<this> {
      if (!Buffer.isBuffer(source)) throw new Error('Pixels expected');
      this.data = source;
      return this;
    }
    getImageData() {
      return { data: this.data, width, height };
    }
    getWidth() {
      return width;
    }
    getHeight() {
      return height;
    }
    getPixelCount() {
      return width * height;
    }
    clear() {}
    update() {}
    resize() {}
    remove() {}
    scaleDown() {}
  };
}

function withAlpha({ data, width, height }: RawPicture): Buffer {
  const rgba = Buffer.alloc(width * height * 4, 255);
  for (let from = 0, to = 0; from < data.length; from += 3, to += 4) {
    rgba[to] = data[from]!;
    rgba[to + 1] = data[from + 1]!;
    rgba[to + 2] = data[from + 2]!;
  }
  return rgba;
}
