import { mkdtemp, rm, writeFile } from 'node:fs/promises';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import sharp from 'sharp';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import type { IntakeResult } from '#server/images/intake';
import { INTAKE_LIMITS } from '#server/images/pools';
import { WorkerProcess } from '#server/images/worker-process';
import { hugePng } from '../../support/pictures';

const MEBIBYTE = 1024 * 1024;
const SCRIPT = new URL('../../../server/images/intake-worker.ts', import.meta.url);

let folder: string;
beforeAll(async () => {
  folder = await mkdtemp(join(tmpdir(), 'pairleaf-memory-'));
});
afterAll(() => rm(folder, { recursive: true, force: true }));

/** Just under the limit of 100 megapixels, in the forms that cost a decoder most. */
describe('the largest pictures stay within the memory of an intake process', () => {
  it.each<[string, () => Promise<Buffer>]>([
    ['a PNG', async () => hugePng(9_999, 9_999)],
    [
      'a progressive JPEG that is to be turned',
      () =>
        sharp({ create: { width: 10_000, height: 9_900, channels: 3, background: '#456789' } })
          .withMetadata({ orientation: 6 })
          .jpeg({ progressive: true, quality: 60 })
          .toBuffer(),
    ],
  ])('%s', async (name, make) => {
    const sourcePath = join(folder, name.replaceAll(' ', '-'));
    await writeFile(sourcePath, await make());
    const worker = new WorkerProcess(SCRIPT, INTAKE_LIMITS);
    try {
      const { width, height } = (await worker.run({ sourcePath, outputFolder: folder })) as IntakeResult;
      expect(width * height).toBeGreaterThan(98e6);
      expect(worker.peakRssBytes).toBeGreaterThan(50 * MEBIBYTE);
      expect(worker.peakRssBytes).toBeLessThan(INTAKE_LIMITS.maxRssBytes);
    } finally {
      await worker.stop();
    }
  });

  it('and a picture that needs more than a process may have ends that process, not ours', async () => {
    const sourcePath = join(folder, 'turned.png');
    await sharp({ create: { width: 8_000, height: 8_000, channels: 3, background: '#456789' } })
      .withMetadata({ orientation: 6 })
      .png({ compressionLevel: 1 })
      .toFile(sourcePath);
    const worker = new WorkerProcess(SCRIPT, { ...INTAKE_LIMITS, maxRssBytes: 150 * MEBIBYTE });
    await expect(worker.run({ sourcePath, outputFolder: folder })).rejects.toMatchObject({ end: 'memory' });
    expect(worker.isAlive).toBe(false);
  });
});
