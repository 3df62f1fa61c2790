import { mkdtemp, readFile, rm } from 'node:fs/promises';
import { createHash } from 'node:crypto';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import sharp from 'sharp';
import { WEBP_OPTIONS } from '#server/images/intake';
import { INTAKE_LIMITS } from '#server/images/pools';
import { WorkerProcess } from '#server/images/worker-process';
import { twelveMegapixelJpeg } from '../support/real-photos';
import type { BenchRow } from './bench';
import { medianOfBoth } from './timing';

const ROUNDS = 9;
const MEBIBYTE = 1024 * 1024;

/** The same three files by sharp alone, as fast as it can: one decoding, each smaller size from the larger one's pixels. */
async function bare(sourcePath: string, folder: string): Promise<void> {
  let { data, info } = await sharp(sourcePath)
    .autoOrient()
    .resize({ width: 1600, height: 1600, fit: 'inside', withoutEnlargement: true })
    .raw()
    .toBuffer({ resolveWithObject: true });
  const writes: Promise<unknown>[] = [];
  for (const side of [1600, 800, 320]) {
    const { width, height } = info;
    const from = sharp(data, { raw: { width, height, channels: 3 } });
    if (side < 1600) {
      ({ data, info } = await from.resize({ width: side, height: side, fit: 'inside' }).raw().toBuffer({ resolveWithObject: true }));
    }
    const made = sharp(data, { raw: { width: info.width, height: info.height, channels: 3 } });
    writes.push(made.webp(WEBP_OPTIONS).toFile(join(folder, `bare-${side}.webp`)));
  }
  await Promise.all(writes);
}

/** Intake of a 12-megapixel JPEG with its hash, palette and raster, in its worker process, against sharp in this one. */
export async function rows(): Promise<BenchRow[]> {
  sharp.cache(false);
  const sourcePath = await twelveMegapixelJpeg();
  const folder = await mkdtemp(join(tmpdir(), 'pairleaf-bench-intake-'));
  const worker = new WorkerProcess(new URL('../../server/images/intake-worker.ts', import.meta.url), INTAKE_LIMITS);
  const ours = async (): Promise<void> => {
    createHash('sha256').update(await readFile(sourcePath)).digest('hex');
    await worker.run({ sourcePath, outputFolder: folder });
  };
  try {
    const medians = await medianOfBoth(ROUNDS, ours, () => bare(sourcePath, folder));
    return [
      { id: 'intake.12mp', value: medians.ours, floor: medians.bare, ratio: medians.ours / medians.bare, unit: 'ms', goal: 1.5, better: 'lower' },
      { id: 'intake.memory', value: worker.peakRssBytes / MEBIBYTE, floor: null, ratio: null, unit: 'MB', goal: INTAKE_LIMITS.maxRssBytes / MEBIBYTE, better: 'lower' },
    ];
  } finally {
    await worker.stop();
    await rm(folder, { recursive: true, force: true });
  }
}
