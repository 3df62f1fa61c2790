import { Vibrant } from 'node-vibrant/node';
import type { Swatch } from '../../shared/model/print';
import type { SwatchCandidate } from '../../shared/colour/swatches';
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
 * node-vibrant's colours of a small picture, as candidates: where no pixel has a role's colour the library makes one up,
 * with population 0, and those are left out.
 */
export async function vibrantColours(picture: RawPicture): Promise<SwatchCandidate[]> {
  const palette = await Vibrant.from(withAlpha(picture)).useImageClass(rawImageClass(picture)).quality(1).getPalette();
  return Object.entries(ROLES).flatMap(([name, role]) => {
    const swatch = palette[name];
    return swatch && swatch.population > 0 ? [{ hex: swatch.hex.toLowerCase(), role }] : [];
  });
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
