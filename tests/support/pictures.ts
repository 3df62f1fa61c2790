import { crc32, deflateSync } from 'node:zlib';
import sharp, { type Sharp } from 'sharp';

// Tests write different pictures to the same path, which the library would answer from its cache.
sharp.cache(false);

export interface RgbPicture {
  readonly width: number;
  readonly height: number;
  readonly data: Buffer;
}

/** Equal square patches, row by row, each of one colour. */
export function patches(rows: readonly (readonly (readonly [number, number, number])[])[], sidePx: number): RgbPicture {
  const width = rows[0]!.length * sidePx;
  const height = rows.length * sidePx;
  const data = Buffer.alloc(width * height * 3);
  for (let y = 0; y < height; y += 1) {
    for (let x = 0; x < width; x += 1) {
      data.set(rows[Math.floor(y / sidePx)]![Math.floor(x / sidePx)]!, (y * width + x) * 3);
    }
  }
  return { width, height, data };
}

export const sharpOf = ({ data, width, height }: RgbPicture): Sharp => sharp(data, { raw: { width, height, channels: 3 } });

/** A picture with detail everywhere, so that its files are as large as a photograph's; the same for the same seed. */
export function noisy(width: number, height: number, seed = 1): RgbPicture {
  const data = Buffer.alloc(width * height * 3);
  let state = seed;
  for (let at = 0; at < data.length; at += 1) {
    state = (Math.imul(state, 1664525) + 1013904223) >>> 0;
    data[at] = ((Math.floor(at / 3) % width) / width) * 128 + (state >>> 25);
  }
  return { width, height, data };
}

/** A valid black PNG of any size, a few hundred bytes per megapixel. */
export function hugePng(width: number, height: number): Buffer {
  const header = Buffer.alloc(13);
  header.writeUInt32BE(width, 0);
  header.writeUInt32BE(height, 4);
  header.set([1, 0, 0, 0, 0], 8); // one bit of grey
  const rows = Buffer.alloc((1 + Math.ceil(width / 8)) * height);
  return Buffer.concat([
    Buffer.from([0x89, 0x50, 0x4e, 0x47, 0x0d, 0x0a, 0x1a, 0x0a]),
    chunk('IHDR', header),
    chunk('IDAT', deflateSync(rows, { level: 1 })),
    chunk('IEND', Buffer.alloc(0)),
  ]);
}

function chunk(type: string, data: Buffer): Buffer {
  const length = Buffer.alloc(4);
  length.writeUInt32BE(data.length);
  const body = Buffer.concat([Buffer.from(type, 'latin1'), data]);
  const check = Buffer.alloc(4);
  check.writeUInt32BE(crc32(body));
  return Buffer.concat([length, body, check]);
}
