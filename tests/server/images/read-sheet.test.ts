import { mkdtemp, rm, writeFile } from 'node:fs/promises';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { readSheet, type ReadingTask } from '#server/images/read-sheet';
import { ciede2000 } from '#shared/colour/ciede2000';
import { hexToLab } from '#shared/colour/convert';
import { colorReadingSchema } from '#shared/contracts/stash';
import { withPictureApp } from '../../support/picture-app';
import { patches, sharpOf } from '../../support/pictures';

const TEAL = '#1d4f5c';
/** Linear gains of a warm lamp on a camera that is set for daylight. */
const WARM = [0.95, 0.72, 0.42] as const;
const linear = (v: number): number => (v / 255 <= 0.04045 ? v / 255 / 12.92 : ((v / 255 + 0.055) / 1.055) ** 2.4);
const encoded = (v: number): number => Math.round(255 * (v <= 0.0031308 ? 12.92 * v : 1.055 * v ** (1 / 2.4) - 0.055));
const seen = (rgb: readonly [number, number, number]) => rgb.map((v, c) => encoded(linear(v) * WARM[c]!)) as [number, number, number];

/** A teal sheet at the left and white paper at the right, under the lamp, as a JPEG. */
const photo = () => sharpOf(patches([[seen([29, 79, 92]), seen([243, 243, 243])]], 300)).jpeg({ quality: 90 }).toBuffer();
const marks = { sheet: { x: 0.25, y: 0.5 }, patch: { x: 0.75, y: 0.5 }, reference: 'white' } as const;
const deltaE = (hex: string): number => ciede2000(hexToLab(hex), hexToLab(TEAL));

describe('a photographed sheet', () => {
  let folder: string;
  let task: ReadingTask;
  beforeAll(async () => {
    folder = await mkdtemp(join(tmpdir(), 'pairleaf-reading-'));
    const sourcePath = join(folder, 'sheet.jpg');
    await writeFile(sourcePath, await photo());
    task = { sourcePath, ...marks };
  });
  afterAll(() => rm(folder, { recursive: true, force: true }));

  it('is read through the light it lay in, within what is said of it', async () => {
    const { hex, uncertainty } = await readSheet(task);
    expect(deltaE(hex)).toBeLessThan(uncertainty);
    expect(uncertainty).toBeLessThan(6);
  });

  it('is refused where a mark lies on two things, wherever on the picture that is', async () => {
    await expect(readSheet({ ...task, patch: { x: 0.5, y: 0 } })).rejects.toMatchObject({ reason: 'patch-uneven' });
    await expect(readSheet({ ...task, sheet: { x: 0.5, y: 1 } })).rejects.toMatchObject({ reason: 'sheet-uneven' });
  });
});

describe('POST /studios/:studioId/stash/readings', () => {
  const app = withPictureApp();

  it('answers with the colour, keeps nothing of the photo, and says what is wrong with a mark', async () => {
    const owner = await app().signUp();
    const ask = async (query: string) => {
      const body = new FormData();
      body.set('file', new Blob([new Uint8Array(await photo())]), 'sheet.jpg');
      return app().ask(owner, `/studios/${owner.studioId}/stash/readings?${query}`, { method: 'POST', body });
    };
    const good = await ask('sheetX=0.25&patchX=0.75&sheetY=0.5&patchY=0.5&reference=white');
    expect(good.status).toBe(200);
    expect(deltaE(colorReadingSchema.parse(await good.json()).hex)).toBeLessThan(4);
    const bad = await ask('sheetX=0.25&patchX=0.5&sheetY=0.5&patchY=0.5');
    expect(bad.status).toBe(422);
    expect(await bad.json()).toMatchObject({ code: 'reading-refused', detail: expect.stringContaining('uneven') });
    expect(await app().incomingFiles()).toEqual([]);
  });
});
