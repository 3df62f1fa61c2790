import { IsNull, In, LessThan, Not, type DataSource } from 'typeorm';
import { z } from 'zod';
import {
  EXPORT_FORMATS,
  EXPORT_SIZES,
  KEEP_EXPORTS_DAYS,
  type CreateExport,
} from '../../shared/contracts/exports';
import { AppError } from '../../shared/errors';
import type { UserId } from '../../shared/model/ids';
import type { Print } from '../../shared/model/print';
import { printUses } from '../../shared/model/print-use';
import type { SpreadDocument } from '../../shared/model/spread';
import { buildScene } from '../../shared/scene/build-scene';
import { exportPixels } from '../../shared/scene/export-size';
import { JobEntity } from '../entities/job-entity';
import { PrintEntity } from '../entities/print-entity';
import { SpreadEntity } from '../entities/spread-entity';
import type { ExportPool } from '../images/pools';
import { WorkerEndedError } from '../images/worker-process';
import type { JobContext } from '../jobs/job-handler';
import { presentPrint } from '../presenters/present-print';
import { requireFreeDisk } from '../storage/free-disk';
import type { Incoming } from '../storage/incoming';
import { exportKey, originalKey, type LocalCopy, type Storage, type StorageKey } from '../storage/storage';
import { EXPORT_EXTENSIONS, isJobKept } from './export-files';
import { documentAt } from './history';
import { invalidField } from './invalid-field';
import type { JobService } from './job-service';

export const EXPORT_KIND = 'spread.export';
const DAY_MS = 24 * 60 * 60_000;
/** Three bytes for each are held while drawing: the largest that fits the worker's memory beside the photos. */
const MAX_EXPORT_PIXELS = 120_000_000;
/** More than any PNG of that many pixels takes. */
const MAX_RESULT_BYTES = 400 * 1024 * 1024;

const payloadSchema = z.object({ revision: z.int(), format: z.enum(EXPORT_FORMATS), size: z.enum(EXPORT_SIZES) });

export const exportResultSchema = z.object({
  format: z.enum(EXPORT_FORMATS),
  extension: z.enum(['png', 'jpg']),
  bytes: z.int(),
  widthPx: z.int(),
  heightPx: z.int(),
});
export type StoredExport = z.infer<typeof exportResultSchema>;

export interface ExportDeps {
  readonly dataSource: DataSource;
  readonly storage: Storage;
  readonly incoming: Incoming;
  readonly pool: ExportPool;
  readonly jobs: JobService;
  readonly freeDiskBytes: number;
  readonly now: () => Date;
}

export class ExportService {
  constructor(private readonly deps: ExportDeps) {}

  /**
   * Puts an export of the spread, as it was at that revision, in the queue.
   *
   * @throws AppError `invalid-input` for a revision that is not reached, or pages too large to draw at 300 ppi ·
   *   `disk-full` · `already-exists`.
   */
  async request(spread: SpreadEntity, { id, ...payload }: CreateExport, userId: UserId | null): Promise<JobEntity> {
    if (payload.revision > spread.revision) throw invalidField('revision', `the spread is at revision ${spread.revision} only`);
    await requireFreeDisk(this.deps.storage, MAX_RESULT_BYTES, this.deps.freeDiskBytes);
    const scene = buildScene(await this.documentAt(spread, payload.revision), new Map());
    const pixels = exportPixels(scene, payload.size);
    if (pixels.width * pixels.height > MAX_EXPORT_PIXELS) {
      throw invalidField('size', 'these pages are too large to be drawn at 300 ppi: choose the screen size');
    }
    return this.deps.jobs.enqueue({
      id,
      studioId: spread.studioId,
      spreadId: spread.id,
      kind: EXPORT_KIND,
      payload,
      dedupeKey: [EXPORT_KIND, spread.id, payload.revision, payload.format, payload.size].join(':'),
      createdBy: userId,
    });
  }

  /** The job's handler: draws the spread in the export process and stores the file. */
  async run(job: JobEntity, { progress, signal }: JobContext): Promise<StoredExport> {
    const { revision, format, size } = payloadSchema.parse(job.payload);
    const { storage, incoming, pool } = this.deps;
    await this.dropExpired();
    const spread = await this.deps.dataSource.manager.findOneBy(SpreadEntity, { id: job.spreadId ?? '' });
    if (!spread) throw new AppError('not-found');
    const doc = await this.documentAt(spread, revision);
    const prints = await this.printsOf(spread, doc);
    const scene = buildScene(doc, new Map(prints.map(({ print }) => [print.id, print])));
    const extension = EXPORT_EXTENSIONS[format];
    const shown = new Set(scene.items.flatMap((item) => (item.kind === 'photo' ? [item.printId] : [])));
    const originals = await this.originals(spread, prints.filter(({ print }) => shown.has(print.id)));
    try {
      return await incoming.withFolder(async (folder) => {
        const outputPath = `${folder}/export.${extension}`;
        const picturePaths = Object.fromEntries([...originals].map(([id, { path }]) => [id, path]));
        const task = { scene, widthPx: exportPixels(scene, size).width, format, picturePaths, outputPath };
        const stop = (): void => void pool.close();
        signal.addEventListener('abort', stop, { once: true });
        // A lost claim shows when the job ends; a missed report is no reason to stop drawing.
        const result = await pool.run(task, (share) => void progress(share).catch(() => undefined)).finally(() => signal.removeEventListener('abort', stop));
        const key = exportKey(spread.studioId, job.id, extension);
        await storage.put(key, outputPath);
        if (!(await isJobKept(this.deps.dataSource.manager, job.id))) {
          await storage.delete(key);
          throw new AppError('not-found');
        }
        return { format, extension, ...result };
      });
    } catch (error) {
      if (error instanceof WorkerEndedError && (error.end === 'memory' || error.end === 'time')) {
        throw new AppError('unavailable', { reason: 'export-too-heavy' });
      }
      throw error;
    } finally {
      await Promise.all([...originals.values()].map((copy) => copy.release()));
    }
  }

  /** @throws AppError('not-found') unless the job is an export whose result is still kept. */
  fileOf(job: JobEntity): { readonly key: StorageKey; readonly result: StoredExport } {
    const result = exportResultSchema.safeParse(job.result);
    if (job.kind !== EXPORT_KIND || job.state !== 'done' || !result.success) throw new AppError('not-found');
    return { key: exportKey(job.studioId, job.id, result.data.extension), result: result.data };
  }

  /** Deletes results that are older than they are kept. */
  async dropExpired(): Promise<void> {
    const { dataSource, storage, now } = this.deps;
    const before = new Date(now().getTime() - KEEP_EXPORTS_DAYS * DAY_MS);
    const expired = await dataSource.manager.find(JobEntity, {
      where: { kind: EXPORT_KIND, state: 'done', finishedAt: LessThan(before), result: Not(IsNull()) },
    });
    for (const job of expired) {
      const result = exportResultSchema.safeParse(job.result);
      if (result.success) await storage.delete(exportKey(job.studioId, job.id, result.data.extension));
      await dataSource.manager.update(JobEntity, { id: job.id }, { result: null });
    }
  }

  private documentAt(spread: SpreadEntity, revision: number): Promise<SpreadDocument> {
    return documentAt(this.deps.dataSource.manager, spread, revision);
  }

  private async printsOf(spread: SpreadEntity, doc: SpreadDocument): Promise<{ print: Print; sha256: string }[]> {
    const ids = [...printUses(doc).keys()];
    if (ids.length === 0) return [];
    const rows = await this.deps.dataSource.manager.find(PrintEntity, {
      where: { studioId: spread.studioId, id: In(ids) },
      relations: { file: true },
    });
    return rows.flatMap((row) => (row.file ? [{ print: presentPrint(row), sha256: row.file.sha256 }] : []));
  }

  private async originals(spread: SpreadEntity, prints: readonly { print: Print; sha256: string }[]): Promise<Map<string, LocalCopy>> {
    const copies = new Map<string, LocalCopy>();
    for (const { print, sha256 } of prints) {
      const copy = await this.deps.storage.localCopy(originalKey(spread.studioId, sha256));
      if (!copy) throw new Error(`The original ${sha256} of print ${print.id} is not in the storage`);
      copies.set(print.id, copy);
    }
    return copies;
  }
}
