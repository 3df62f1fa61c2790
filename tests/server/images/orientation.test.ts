import { mkdtemp, rm } from 'node:fs/promises';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import sharp from 'sharp';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { intake } from '#server/images/intake';
import { patches, sharpOf } from '../../support/pictures';

/**
 * Where the stored 0th row and 0th column are seen: CIPA DC-008 (Exif), tag 0x0112 Orientation.
 */
const ORIENTATIONS = [
  [1, 'top', 'left'],
  [2, 'top', 'right'],
  [3, 'bottom', 'right'],
  [4, 'bottom', 'left'],
  [5, 'left', 'top'],
  [6, 'right', 'top'],
  [7, 'right', 'bottom'],
  [8, 'left', 'bottom'],
] as const;

const SIDE = 40;
/** No two patches alike, so that every turn and mirror shows. */
const ROWS: [number, number, number][][] = [
  [[230, 40, 40], [40, 200, 60], [50, 60, 230]],
  [[240, 220, 40], [30, 30, 30], [200, 60, 220]],
];

/** The colours as they are to be seen, from the definition. */
function seen(row0: string, col0: string): [number, number, number][][] {
  const rows = ROWS.length;
  const columns = ROWS[0]!.length;
  const isTurned = row0 === 'left' || row0 === 'right';
  const width = isTurned ? rows : columns;
  const height = isTurned ? columns : rows;
  return Array.from({ length: height }, (_, y) =>
    Array.from({ length: width }, (__, x) => {
      const along = { top: y, bottom: height - 1 - y, left: x, right: width - 1 - x } as Record<string, number>;
      return ROWS[along[row0]!]![along[col0]!]!;
    }),
  );
}

let folder: string;
beforeAll(async () => {
  folder = await mkdtemp(join(tmpdir(), 'pairleaf-exif-'));
});
afterAll(() => rm(folder, { recursive: true, force: true }));

describe.each(['jpeg', 'png', 'webp', 'tiff'] as const)('EXIF orientation of a %s', (format) => {
  it.each(ORIENTATIONS)('%d: the 0th row is seen at the %s, the 0th column at the %s', async (orientation, row0, col0) => {
    const sourcePath = join(folder, `${orientation}.${format}`);
    await sharpOf(patches(ROWS, SIDE)).withMetadata({ orientation }).toFormat(format, { quality: 100 }).toFile(sourcePath);
    expect((await sharp(sourcePath).metadata()).orientation).toBe(orientation);

    const result = await intake({ sourcePath, outputFolder: folder });
    const expected = seen(row0, col0);
    expect(result).toMatchObject({ width: expected[0]!.length * SIDE, height: expected.length * SIDE });
    const { data, info } = await sharp(result.pictures.large).raw().toBuffer({ resolveWithObject: true });
    expect(info).toMatchObject({ width: result.width, height: result.height, channels: 3 });
    expected.forEach((row, y) =>
      row.forEach((color, x) => {
        const at = ((y * SIDE + SIDE / 2) * info.width + x * SIDE + SIDE / 2) * 3;
        const difference = Math.max(...color.map((value, i) => Math.abs(value - data[at + i]!)));
        expect(difference, `patch ${x}, ${y}`).toBeLessThan(24);
      }),
    );
  });
});
