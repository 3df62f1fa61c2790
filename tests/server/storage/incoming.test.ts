import { spawnSync } from 'node:child_process';
import { mkdir, mkdtemp, readdir, rm, writeFile } from 'node:fs/promises';
import { tmpdir } from 'node:os';
import { basename, join } from 'node:path';
import { randomUUID } from 'node:crypto';
import { afterEach, beforeEach, describe, expect, it } from 'vitest';
import { Incoming, sweepIncoming, type Pending } from '#server/storage/incoming';

const PENDING: Pending = { studioId: randomUUID(), sha256: 'cd'.repeat(32) };

let parent: string;
let own: Incoming;
beforeEach(async () => {
  parent = await mkdtemp(join(tmpdir(), 'pairleaf-incoming-'));
  own = await Incoming.open(parent);
});
afterEach(() => rm(parent, { recursive: true, force: true }));

/** The number of a process that has ended. */
const deadPid = (): number => spawnSync(process.execPath, ['-e', '']).pid;

async function leftBehind(pid: number): Promise<string> {
  const folder = join(parent, `${pid}-${randomUUID()}`);
  await mkdir(folder);
  await writeFile(join(folder, randomUUID()), 'half an upload');
  await writeFile(join(folder, `${randomUUID()}.pending.json`), JSON.stringify(PENDING));
  return folder;
}

describe('incoming files', () => {
  it('leave nothing of a folder once its use has failed', async () => {
    const failed = own.withFolder(async (folder) => {
      await writeFile(join(folder, 'large.webp'), 'half');
      throw new Error('worker ended');
    });
    await expect(failed).rejects.toThrow('worker ended');
    expect(await readdir(own.folder)).toEqual([]);
  });

  it('are marked while they are being stored, and unmarked after', async () => {
    let during: string[] = [];
    await own.withPending(PENDING, async () => void (during = await readdir(own.folder)), async () => undefined);
    expect(during).toHaveLength(1);
    expect(await readdir(own.folder)).toEqual([]);
  });

  it('are undone when storing fails', async () => {
    const undone: Pending[] = [];
    const failed = own.withPending(PENDING, () => Promise.reject(new Error('no row')), async (p) => void undone.push(p));
    await expect(failed).rejects.toThrow('no row');
    expect(undone).toEqual([PENDING]);
    expect(await readdir(own.folder)).toEqual([]);
  });

  it('of a process that died are swept, and what it was storing is undone', async () => {
    await leftBehind(deadPid());
    const undone: Pending[] = [];
    expect(await sweepIncoming(parent, own, async (p) => void undone.push(p))).toBe(1);
    expect(undone).toEqual([PENDING]);
    expect(await readdir(parent)).toEqual([basename(own.folder)]);
  });

  it('of an earlier process with our own number are swept too', async () => {
    await leftBehind(process.pid);
    expect(await sweepIncoming(parent, own, async () => undefined)).toBe(1);
  });

  it('of a process that is still at work are left alone', async () => {
    const folder = await leftBehind(process.ppid);
    expect(await sweepIncoming(parent, own, async () => undefined)).toBe(0);
    expect(await readdir(folder)).toHaveLength(2);
  });

  it('survive a marker that was cut short', async () => {
    const folder = join(parent, `${deadPid()}-${randomUUID()}`);
    await mkdir(folder);
    await writeFile(join(folder, `${randomUUID()}.pending.json`), '{"studioId":');
    const undone: Pending[] = [];
    expect(await sweepIncoming(parent, own, async (p) => void undone.push(p))).toBe(1);
    expect(undone).toEqual([]);
  });
});
