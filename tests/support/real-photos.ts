import { execFile } from 'node:child_process';
import { existsSync } from 'node:fs';
import { mkdir, mkdtemp, readdir, rename, rm } from 'node:fs/promises';
import { join } from 'node:path';
import { fileURLToPath } from 'node:url';
import { promisify } from 'node:util';
import sharp from 'sharp';

const run = promisify(execFile);
const CACHE = fileURLToPath(new URL('../../.data/bench/', import.meta.url));
/** Photographs under CC BY, CC BY-SA and CC0, each with its author in its name; never committed. */
const PACKAGE = 'lomiri-wallpapers-16.04';

export interface RealPhoto {
  readonly path: string;
  readonly width: number;
  readonly height: number;
}

/**
 * Real photographs, fetched once from a Debian package and unpacked, not installed; largest first.
 *
 * @throws Error when the package cannot be fetched.
 */
export async function realPhotos(): Promise<RealPhoto[]> {
  const folder = join(CACHE, PACKAGE);
  if (!existsSync(folder)) await fetchPackage(folder);
  const pictures = join(folder, 'usr/share/backgrounds');
  const names = (await readdir(pictures)).filter((name) => name.endsWith('.jpg')).sort();
  const photos = await Promise.all(
    names.map(async (name) => {
      const path = join(pictures, name);
      const { width, height } = await sharp(path).metadata();
      return { path, width, height };
    }),
  );
  return photos.sort((a, b) => b.width * b.height - a.width * a.height || (a.path < b.path ? -1 : 1));
}

/** A JPEG of 4000 × 3000 px (12 megapixels) made from the largest photograph, as a camera writes it. */
export async function twelveMegapixelJpeg(): Promise<string> {
  const path = join(CACHE, 'twelve-megapixels.jpg');
  if (existsSync(path)) return path;
  const [largest] = await realPhotos();
  if (!largest) throw new Error(`${PACKAGE} holds no photographs`);
  const part = `${path}.part`;
  await sharp(largest.path).resize(4000, 3000, { fit: 'cover' }).jpeg({ quality: 92 }).toFile(part);
  await rename(part, path);
  return path;
}

async function fetchPackage(target: string): Promise<void> {
  await mkdir(CACHE, { recursive: true });
  const folder = await mkdtemp(join(CACHE, 'fetching-'));
  try {
    // A fresh machine has no package lists yet.
    await run('apt-get', ['download', PACKAGE], { cwd: folder }).catch(async () => {
      await run('apt-get', ['update', '-qq']);
      await run('apt-get', ['download', PACKAGE], { cwd: folder });
    });
    const [archive] = (await readdir(folder)).filter((name) => name.endsWith('.deb'));
    if (!archive) throw new Error(`apt-get fetched no ${PACKAGE}`);
    await run('dpkg-deb', ['-x', archive, 'unpacked'], { cwd: folder });
    // Another process may have been quicker.
    await rename(join(folder, 'unpacked'), target).catch((error: unknown) => {
      if (!existsSync(target)) throw error;
    });
  } finally {
    await rm(folder, { recursive: true, force: true });
  }
}
