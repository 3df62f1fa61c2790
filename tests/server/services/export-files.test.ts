import { randomUUID } from 'node:crypto';
import { readdir, writeFile } from 'node:fs/promises';
import { join } from 'node:path';
import { beforeEach, describe, expect, it } from 'vitest';
import { AlbumEntity } from '#server/entities/album-entity';
import { JobEntity } from '#server/entities/job-entity';
import { SpreadEntity } from '#server/entities/spread-entity';
import type { ExportTask } from '#server/images/export-spread';
import type { ExportPool } from '#server/images/pools';
import { ExportService } from '#server/services/export-service';
import type { Actor } from '#shared/model/people';
import { beginSpread, insertPrint, withApp, type Person } from '../../support/app';

describe('what was made of a spread goes with it', () => {
  const app = withApp({ limits: { freeDiskBytes: 0 } });
  let owner: Person;
  let spread: SpreadEntity;
  let album: AlbumEntity;
  let actor: Actor;

  beforeEach(async () => {
    owner = await app().signUp();
    actor = { userId: owner.userId, memberships: [{ studioId: owner.studioId, role: 'owner' }], grants: [] };
    const { id, albumId } = await beginSpread(owner);
    const { manager } = app().deps.dataSource;
    [spread, album] = [await manager.findOneByOrFail(SpreadEntity, { id }), await manager.findOneByOrFail(AlbumEntity, { id: albumId })];
  });

  const pictures = (): Promise<string[]> => readdir(join(app().deps.config.dataDir, 'files', owner.studioId, 'exports')).catch(() => []);
  const services = () => app().deps.services;

  /** An export whose drawing is over at once, after what happens meanwhile. */
  async function exported(meanwhile: () => Promise<void> = async () => undefined): Promise<void> {
    const run = async ({ outputPath }: ExportTask) => {
      await meanwhile();
      await writeFile(outputPath, 'pixels');
      return { widthPx: 2400, heightPx: 1200, bytes: 6 };
    };
    const { deps } = app();
    const pool = { run } as unknown as ExportPool;
    const exports = new ExportService({ ...deps, pool, jobs: deps.services.jobs, freeDiskBytes: 0 });
    const job = { id: randomUUID(), studioId: owner.studioId, spreadId: spread.id, kind: 'test.export', payload: { revision: 0, format: 'jpeg', size: 'screen' } };
    await deps.services.jobs.enqueue({ ...job, dedupeKey: null, createdBy: owner.userId });
    const context = { progress: async () => undefined, signal: new AbortController().signal };
    await exports.run(await deps.dataSource.manager.findOneByOrFail(JobEntity, { id: job.id }), context);
  }

  it('with a spread', async () => {
    await exported();
    expect(await pictures()).toHaveLength(1);
    await owner.agent.delete(`/api/spreads/${spread.id}`).expect(204);
    expect(await pictures()).toEqual([]);
  });

  it('with an album, and nothing of another', async () => {
    await exported();
    const other = await beginSpread(owner);
    spread = await app().deps.dataSource.manager.findOneByOrFail(SpreadEntity, { id: other.id });
    await exported();
    await owner.agent.delete(`/api/albums/${album.id}`).expect(204);
    expect(await pictures()).toHaveLength(1);
    await owner.agent.get(`/api/spreads/${spread.id}`).expect(200);
  });

  it('also where it was deleted while the picture was drawn', async () => {
    await expect(exported(() => services().spreads.remove(spread, actor))).rejects.toMatchObject({ code: 'not-found' });
    expect(await pictures()).toEqual([]);
  });

  it.each([
    ['a spread', () => services().spreads.create(album, { id: randomUUID(), title: 'Late', pages: 'both' })],
    ['a move', () => services().spreads.update(spread, { position: 0 })],
    ['an export', () => services().exports.request(spread, { id: randomUUID(), format: 'png', size: 'screen', revision: 0 }, owner.userId)],
  ])('%s that comes too late finds nothing', async (_name, act) => {
    await services().albums.remove(album, actor);
    await expect(act()).rejects.toMatchObject({ code: 'not-found' });
  });

  it('a print that is deleted twice is gone the second time', async () => {
    const { id } = await insertPrint(app().deps, owner.studioId);
    const print = await services().prints.get(id);
    await services().prints.remove(print, actor);
    await expect(services().prints.remove(print, actor)).rejects.toMatchObject({ code: 'not-found' });
  });
});
