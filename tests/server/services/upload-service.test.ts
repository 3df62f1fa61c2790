import { createHash, randomUUID } from 'node:crypto';
import { mkdtemp, readdir, readFile, rm, writeFile } from 'node:fs/promises';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { buffer } from 'node:stream/consumers';
import { afterAll, afterEach, beforeAll, beforeEach, describe, expect, it } from 'vitest';
import { FileEntity } from '#server/entities/file-entity';
import { PileEntity } from '#server/entities/pile-entity';
import { PrintEntity } from '#server/entities/print-entity';
import { StudioEntity } from '#server/entities/studio-entity';
import { UserEntity } from '#server/entities/user-entity';
import { createIntakePool, type IntakePool } from '#server/images/pools';
import type { ReceivedUpload } from '#server/services/receive-upload';
import { removeUnlessKnown } from '#server/services/stored-pictures';
import { UploadService, type Uploader } from '#server/services/upload-service';
import { Incoming, sweepIncoming } from '#server/storage/incoming';
import { localDiskStorage } from '#server/storage/local-disk';
import { originalKey, pictureKey, type Storage } from '#server/storage/storage';
import { inches } from '#shared/model/length';
import { withDatabase } from '../../support/database';
import { noisy, sharpOf } from '../../support/pictures';

const database = withDatabase();
let pool: IntakePool;
let folder: string;
let storage: Storage;
let incoming: Incoming;
let studioId: string;

beforeAll(() => {
  pool = createIntakePool();
});
afterAll(() => pool.close());

beforeEach(async () => {
  folder = await mkdtemp(join(tmpdir(), 'pairleaf-upload-'));
  storage = localDiskStorage(join(folder, 'files'));
  incoming = await Incoming.open(join(folder, 'incoming'));
  studioId = await studio();
});
afterEach(() => rm(folder, { recursive: true, force: true }));

async function studio(values: Partial<StudioEntity> = {}): Promise<string> {
  const { manager } = database().dataSource;
  const id = randomUUID();
  await manager.insert(StudioEntity, {
    id,
    name: 'Harbour Row',
    unit: 'in',
    tolerance: 254,
    finestMark: 254,
    hidden: false,
    bytesUsed: 0,
    bytesQuota: 1e9,
    createdAt: new Date(),
    ...values,
  });
  return id;
}

async function account(bytesQuota: number): Promise<string> {
  const id = randomUUID();
  const values = { id, email: `${id}@example.org`, name: 'Ada', passwordHash: 'none', bytesUsed: 0, bytesQuota, createdAt: new Date() };
  await database().dataSource.manager.insert(UserEntity, values);
  return id;
}

const usedBy = async (id: string) => (await database().dataSource.manager.findOneByOrFail(UserEntity, { id })).bytesUsed;

function service(parts: { storage?: Storage; pool?: IntakePool; freeDiskBytes?: number } = {}): UploadService {
  return new UploadService({
    dataSource: database().dataSource,
    storage: parts.storage ?? storage,
    incoming,
    pool: parts.pool ?? pool,
    freeDiskBytes: parts.freeDiskBytes ?? 0,
    now: () => new Date(),
  });
}

const jpeg = (seed: number) => sharpOf(noisy(600, 400, seed)).jpeg().toBuffer();

async function received(bytes: Buffer, values: Partial<ReceivedUpload> = {}): Promise<ReceivedUpload> {
  const path = incoming.path();
  await writeFile(path, bytes);
  const sha256 = createHash('sha256').update(bytes).digest('hex');
  return { path, fileName: 'holiday.jpg', bytes: bytes.length, sha256, id: undefined, pileId: null, ...values };
}

const uploader = (values: Partial<Uploader> = {}): Uploader => ({ studioId, userId: null, mayAdd: async () => undefined, maySee: () => true, ...values });

/** Every file under the data folder, in any place. */
async function allFiles(): Promise<string[]> {
  const entries = await readdir(folder, { recursive: true, withFileTypes: true });
  return entries.filter((entry) => entry.isFile()).map((entry) => entry.name);
}

const rows = async () => ({
  files: await database().dataSource.manager.countBy(FileEntity, { studioId }),
  prints: await database().dataSource.manager.countBy(PrintEntity, { studioId }),
  bytesUsed: (await database().dataSource.manager.findOneByOrFail(StudioEntity, { id: studioId })).bytesUsed,
});

describe('an upload', () => {
  it('becomes a print with its original untouched, its sizes, palette and guessed size', async () => {
    const bytes = await jpeg(1);
    const upload = await received(bytes, { fileName: '../../Beach_day.JPG' });
    const { print, known } = await service().take(upload, uploader());
    expect(known).toBe(false);
    expect(print).toMatchObject({
      title: 'Beach day',
      paperWidth: inches(6),
      paperHeight: inches(4),
      imageWidth: 600,
      imageHeight: 400,
      paperRect: { x: 0, y: 0, width: 600, height: 400 },
      copies: 1,
      revision: 0,
    });
    expect(print.palette.length).toBeGreaterThan(2);
    expect(print.raster).toMatchObject({ width: 64, height: 43 });
    const original = await storage.get(originalKey(studioId, upload.sha256));
    expect(await buffer(original!.stream)).toEqual(bytes);
    for (const size of ['small', 'medium', 'large'] as const) {
      expect(await storage.exists(pictureKey(studioId, upload.sha256, size))).toBe(true);
    }
    expect(await readdir(incoming.folder)).toEqual([]);
    expect(await rows()).toEqual({ files: 1, prints: 1, bytesUsed: bytes.length });
  });

  it('of the same file again is recognised and stores nothing new', async () => {
    const bytes = await jpeg(2);
    const first = await service().take(await received(bytes), uploader());
    const before = await allFiles();
    const second = await service().take(await received(bytes, { fileName: 'copy of it.jpg' }), uploader());
    expect(second).toMatchObject({ known: true, print: { id: first.print.id, title: 'holiday' } });
    expect(await allFiles()).toEqual(before);
    expect(await rows()).toEqual({ files: 1, prints: 1, bytesUsed: bytes.length });
  });

  it('of the same file many times at once makes one print', async () => {
    const bytes = await jpeg(3);
    const uploads = await Promise.all(Array.from({ length: 6 }, () => received(bytes)));
    const answers = await Promise.all(uploads.map((upload) => service().take(upload, uploader())));
    expect(new Set(answers.map(({ print }) => print.id)).size).toBe(1);
    expect(answers.filter(({ known }) => !known)).toHaveLength(1);
    expect(await rows()).toMatchObject({ files: 1, prints: 1 });
  });

  it('of a file that the person may not see as a print shares the file and makes a print of their own', async () => {
    const bytes = await jpeg(4);
    const first = await service().take(await received(bytes), uploader());
    const second = await service().take(await received(bytes), uploader({ maySee: () => false }));
    expect(second.known).toBe(false);
    expect(second.print.id).not.toBe(first.print.id);
    expect(await rows()).toEqual({ files: 1, prints: 2, bytesUsed: bytes.length });
  });

  it('of the same file in another studio is stored there too', async () => {
    const bytes = await jpeg(5);
    await service().take(await received(bytes), uploader());
    const other = await studio();
    const { known } = await service().take(await received(bytes), uploader({ studioId: other }));
    expect(known).toBe(false);
  });

  it('repeated with its id is answered as the first time; the id of another print is refused', async () => {
    const id = randomUUID();
    const bytes = await jpeg(6);
    const first = await service().take(await received(bytes, { id }), uploader());
    const repeat = await service().take(await received(bytes, { id }), uploader());
    expect(repeat).toMatchObject({ known: false, print: { id: first.print.id } });
    const other = service().take(await received(await jpeg(7), { id }), uploader());
    await expect(other).rejects.toMatchObject({ code: 'already-exists' });
    expect(await readdir(incoming.folder)).toEqual([]);
  });

  it('lies last in its pile', async () => {
    const pileId = randomUUID();
    const pile = { id: pileId, studioId, name: 'Us', position: 0, sharedWithContributors: false, createdAt: new Date() };
    await database().dataSource.manager.insert(PileEntity, pile);
    const positions = [];
    for (const seed of [8, 9]) {
      const { print } = await service().take(await received(await jpeg(seed), { pileId }), uploader());
      positions.push([print.pileId, print.position]);
    }
    expect(positions).toEqual([[pileId, 0], [pileId, 1]]);
  });

  it('is refused when the account is full, over all its studios', async () => {
    const bytes = await jpeg(20);
    const userId = await account(bytes.length + 10);
    await service().take(await received(bytes), uploader({ userId }));
    expect(await usedBy(userId)).toBe(bytes.length);
    studioId = await studio();
    await expect(service().take(await received(bytes), uploader({ userId }))).rejects.toMatchObject({ code: 'quota-exceeded', data: { whose: 'account' } });
    expect(await rows()).toEqual({ files: 0, prints: 0, bytesUsed: 0 });
  });

  it('is taken once when one person sends to two studios at once and has room for one', async () => {
    const bytes = await jpeg(21);
    const userId = await account(bytes.length + 10);
    const other = await studio();
    const both = [uploader({ userId }), uploader({ userId, studioId: other })];
    const ends = await Promise.allSettled(both.map(async (to) => service().take(await received(bytes), to)));
    expect(ends.map(({ status }) => status).sort()).toEqual(['fulfilled', 'rejected']);
    expect(await usedBy(userId)).toBe(bytes.length);
  });
});

describe('an upload that cannot be taken leaves nothing', () => {
  afterEach(async () => {
    expect(await allFiles()).toEqual([]);
    expect(await rows()).toEqual({ files: 0, prints: 0, bytesUsed: 0 });
  });

  it('when it is no picture', async () => {
    const upload = await received(Buffer.from('not a picture'));
    await expect(service().take(upload, uploader())).rejects.toMatchObject({ code: 'picture-refused', data: { reason: 'not-a-picture' } });
  });

  it('when the studio is full', async () => {
    studioId = await studio({ bytesQuota: 1000 });
    const upload = await received(await jpeg(10));
    await expect(service().take(upload, uploader())).rejects.toMatchObject({ code: 'quota-exceeded', data: { whose: 'studio' } });
  });

  it('when the disk is full', async () => {
    const upload = await received(await jpeg(11));
    const full = service({ freeDiskBytes: Number.MAX_SAFE_INTEGER });
    await expect(full.take(upload, uploader())).rejects.toMatchObject({ code: 'disk-full' });
  });

  it('when its worker is killed, twice', async () => {
    const upload = await received(await sharpOf(noisy(4000, 3000, 12)).png({ compressionLevel: 1 }).toBuffer());
    const own = createIntakePool();
    const killer = setInterval(() => own.busyPids.forEach((pid) => process.kill(pid, 'SIGKILL')), 20);
    try {
      const taken = service({ pool: own }).take(upload, uploader());
      await expect(taken).rejects.toMatchObject({ code: 'picture-refused', data: { reason: 'damaged' } });
    } finally {
      clearInterval(killer);
      await own.close();
    }
  });

  it('when storing fails half-way', async () => {
    let puts = 0;
    const failing: Storage = {
      ...storage,
      put: (key, path) => ((puts += 1) === 3 ? Promise.reject(new Error('disk trouble')) : storage.put(key, path)),
    };
    const upload = await received(await jpeg(13));
    await expect(service({ storage: failing }).take(upload, uploader())).rejects.toThrow('disk trouble');
    expect(puts).toBe(3);
  });

  it('when the server dies between storing and writing its row, once it starts again', async () => {
    const bytes = await jpeg(14);
    const upload = await received(bytes);
    const content = { studioId, sha256: upload.sha256 };
    // What the dead process had stored, and its marker: nobody undoes it.
    await storage.put(originalKey(studioId, upload.sha256), upload.path);
    await writeFile(join(incoming.folder, `${randomUUID()}.pending.json`), JSON.stringify(content));
    const next = await Incoming.open(join(folder, 'incoming'));
    await sweepIncoming(join(folder, 'incoming'), next, (pending) => removeUnlessKnown(database().dataSource, storage, pending));
  });
});

it('a marker of an upload whose row was written removes nothing', async () => {
  const bytes = await jpeg(15);
  const { print } = await service().take(await received(bytes), uploader());
  const sha256 = createHash('sha256').update(bytes).digest('hex');
  await removeUnlessKnown(database().dataSource, storage, { studioId, sha256 });
  expect(await storage.exists(originalKey(studioId, sha256))).toBe(true);
  const path = (await storage.localCopy(pictureKey(studioId, sha256, 'small')))!.path;
  expect((await readFile(path)).length).toBeGreaterThan(100);
  expect(print.studioId).toBe(studioId);
});
