import { mkdtemp, readdir, rm, writeFile } from 'node:fs/promises';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { text } from 'node:stream/consumers';
import { afterEach, beforeEach, describe, expect, it } from 'vitest';
import { requireFreeDisk } from '#server/storage/free-disk';
import { localDiskStorage } from '#server/storage/local-disk';
import { exportKey, originalKey, pictureKey, type Storage } from '#server/storage/storage';

const STUDIO = '11111111-1111-4111-8111-111111111111';
const SHA = 'ab'.repeat(32);

let folder: string;
let storage: Storage;
beforeEach(async () => {
  folder = await mkdtemp(join(tmpdir(), 'pairleaf-storage-'));
  storage = localDiskStorage(join(folder, 'files'));
});
afterEach(() => rm(folder, { recursive: true, force: true }));

async function source(content: string): Promise<string> {
  const path = join(folder, `source-${content.length}`);
  await writeFile(path, content);
  return path;
}

describe('local disk storage', () => {
  it('takes a file over and gives it back', async () => {
    const path = await source('a picture');
    await storage.put(originalKey(STUDIO, SHA), path);
    const stored = await storage.get(originalKey(STUDIO, SHA));
    expect(stored?.sizeBytes).toBe(9);
    expect(await text(stored!.stream)).toBe('a picture');
    expect(await readdir(folder)).toEqual(['files']);
  });

  it('bears a repeated put and a repeated delete', async () => {
    const key = pictureKey(STUDIO, SHA, 'small');
    await storage.put(key, await source('same'));
    await storage.put(key, await source('same'));
    expect(await storage.exists(key)).toBe(true);
    await storage.delete(key);
    await storage.delete(key);
    expect(await storage.exists(key)).toBe(false);
    expect(await storage.get(key)).toBeNull();
    expect(await storage.localCopy(key)).toBeNull();
  });

  it('stores nothing when the source cannot be read', async () => {
    await expect(storage.put(originalKey(STUDIO, SHA), join(folder, 'missing'))).rejects.toThrow(/ENOENT/);
    expect(await storage.exists(originalKey(STUDIO, SHA))).toBe(false);
  });

  it('refuses to make a key that leaves the studio', () => {
    for (const bad of ['../x', '..', 'a/b', '', 'A\0', '.hidden']) {
      expect(() => originalKey(STUDIO, bad)).toThrow(/storage key/);
      expect(() => exportKey(bad, 'job', 'png')).toThrow(/storage key/);
    }
  });

  it('refuses what would eat into the reserve', async () => {
    const free = (await storage.freeBytes())!;
    expect(free).toBeGreaterThan(0);
    await expect(requireFreeDisk(storage, 1000, 0)).resolves.toBeUndefined();
    await expect(requireFreeDisk(storage, 1000, free * 2)).rejects.toMatchObject({ code: 'disk-full' });
    await expect(requireFreeDisk(storage, free * 2, 0)).rejects.toMatchObject({ code: 'disk-full' });
  });
});
