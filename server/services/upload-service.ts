import { randomUUID } from 'node:crypto';
import { rm } from 'node:fs/promises';
import { IsNull, type DataSource, type EntityManager } from 'typeorm';
import { TITLE_MAX } from '../../shared/contracts/prints';
import { AppError } from '../../shared/errors';
import { centreCrop } from '../../shared/geometry/paper';
import { guessPrintSize } from '../../shared/model/guess-print-size';
import type { StudioId, UserId } from '../../shared/model/ids';
import type { PictureRefusal } from '../../shared/model/picture-refusal';
import { titleFromFileName } from '../../shared/model/title-from-file-name';
import { UNTITLED_PRINT } from '../../shared/words/en/pictures';
import { FileEntity } from '../entities/file-entity';
import { PrintEntity } from '../entities/print-entity';
import { StudioEntity } from '../entities/studio-entity';
import { UserEntity } from '../entities/user-entity';
import type { IntakeResult } from '../images/intake';
import type { IntakePool } from '../images/pools';
import { Refusal } from '../images/worker-messages';
import { WorkerEndedError } from '../images/worker-process';
import { requireFreeDisk } from '../storage/free-disk';
import type { Incoming } from '../storage/incoming';
import { originalKey, pictureKey, type Storage } from '../storage/storage';
import { isDangling } from './database-errors';
import { invalidField } from './invalid-field';
import type { ReceivedUpload } from './receive-upload';
import { lockStudio, removeUnlessKnown, SIZES } from './stored-pictures';

export interface UploadDeps {
  readonly dataSource: DataSource;
  readonly storage: Storage;
  readonly incoming: Incoming;
  readonly pool: IntakePool;
  readonly freeDiskBytes: number;
  readonly now: () => Date;
}

export interface Uploader {
  readonly studioId: StudioId;
  readonly userId: UserId | null;
  /** Throws unless this person may add to the pile that the upload names. */
  readonly mayAdd: () => Promise<void>;
  /** Whether this person may be shown a print that the studio already has. */
  readonly maySee: (print: PrintEntity) => boolean;
}

export interface Uploaded {
  readonly print: PrintEntity;
  readonly known: boolean;
}

export class UploadService {
  constructor(private readonly deps: UploadDeps) {}

  /**
   * Takes a received file in as a print, and removes the received file whatever happens.
   *
   * @throws AppError `picture-refused` · `quota-exceeded` · `disk-full` · `already-exists` (the id is another thing's) ·
   *   `unavailable`, and what `mayAdd` throws.
   */
  async take(upload: ReceivedUpload, uploader: Uploader): Promise<Uploaded> {
    try {
      await uploader.mayAdd();
      const before = await this.findBefore(upload, uploader);
      if (before) return before;
      await this.requireRoom(upload, uploader);
      return await this.deps.incoming.withFolder(async (outputFolder) => {
        const result = await this.read(upload.path, outputFolder);
        return this.store(upload, uploader, result);
      });
    } catch (error) {
      if (isDangling(error)) throw invalidField('pileId', 'there is no such pile in this studio any more');
      throw error;
    } finally {
      await rm(upload.path, { force: true });
    }
  }

  /** A repeated request, or a file that the studio has. */
  private async findBefore(upload: ReceivedUpload, uploader: Uploader, manager = this.deps.dataSource.manager): Promise<Uploaded | null> {
    const { studioId } = uploader;
    if (upload.id !== undefined) {
      const repeated = await manager.findOne(PrintEntity, { where: { id: upload.id }, relations: { file: true } });
      if (repeated) {
        if (repeated.studioId === studioId && repeated.file?.sha256 === upload.sha256) return { print: repeated, known: false };
        throw new AppError('already-exists', { what: 'print', id: upload.id });
      }
    }
    const sameFile = await manager.find(PrintEntity, {
      where: { studioId, file: { sha256: upload.sha256 }, binnedAt: IsNull() },
      order: { createdAt: 'ASC', id: 'ASC' },
    });
    const print = sameFile.find(uploader.maySee);
    return print ? { print, known: true } : null;
  }

  /** Checked again when storing; here only so that no work is done in vain. */
  private async requireRoom({ bytes }: ReceivedUpload, { studioId, userId }: Uploader): Promise<void> {
    const { dataSource, storage, freeDiskBytes } = this.deps;
    await requireFreeDisk(storage, bytes, freeDiskBytes);
    requireQuota('studio', await dataSource.manager.findOneByOrFail(StudioEntity, { id: studioId }), bytes);
    if (userId !== null) requireQuota('account', await dataSource.manager.findOneByOrFail(UserEntity, { id: userId }), bytes);
  }

  private async read(sourcePath: string, outputFolder: string): Promise<IntakeResult> {
    try {
      return await this.deps.pool.run({ sourcePath, outputFolder });
    } catch (error) {
      if (error instanceof Refusal) throw new AppError('picture-refused', { reason: error.reason, ...error.data });
      if (!(error instanceof WorkerEndedError)) throw error;
      if (error.end === 'stopped') throw new AppError('unavailable', { reason: 'stopping' });
      const reason: PictureRefusal = error.end === 'crash' ? 'damaged' : 'too-heavy';
      throw new AppError('picture-refused', { reason });
    }
  }

  /** Files first, rows after, under a marker; two uploads of the same file in one studio wait for each other. */
  private async store(upload: ReceivedUpload, uploader: Uploader, result: IntakeResult): Promise<Uploaded> {
    const { dataSource, storage, incoming } = this.deps;
    const { studioId } = uploader;
    const content = { studioId, sha256: upload.sha256 };
    return incoming.withPending(
      content,
      () =>
        dataSource.transaction(async (manager) => {
          const studio = await lockStudio(manager, studioId);
          const before = await this.findBefore(upload, uploader, manager);
          if (before) return before;
          let file = await manager.findOneBy(FileEntity, content);
          if (!file) {
            requireQuota('studio', studio, upload.bytes);
            await storage.put(originalKey(studioId, upload.sha256), upload.path);
            for (const size of SIZES) await storage.put(pictureKey(studioId, upload.sha256, size), result.pictures[size]);
            file = await this.insertFile(manager, upload, uploader, result);
            await manager.update(StudioEntity, { id: studioId }, { bytesUsed: studio.bytesUsed + upload.bytes });
            if (uploader.userId !== null) await chargeAccount(manager, uploader.userId, upload.bytes);
          }
          return { print: await this.insertPrint(manager, upload, uploader, result, file, studio.unit), known: false };
        }),
      () => removeUnlessKnown(dataSource, storage, content),
    );
  }

  private insertFile(manager: EntityManager, upload: ReceivedUpload, { studioId, userId }: Uploader, result: IntakeResult): Promise<FileEntity> {
    return manager.save(
      manager.create(FileEntity, {
        id: randomUUID(),
        studioId,
        sha256: upload.sha256,
        bytes: upload.bytes,
        mediaType: result.mediaType,
        width: result.width,
        height: result.height,
        addedBy: userId,
        createdAt: this.deps.now(),
      }),
    );
  }

  private async insertPrint(
    manager: EntityManager,
    upload: ReceivedUpload,
    { studioId, userId }: Uploader,
    result: IntakeResult,
    file: FileEntity,
    unit: 'in' | 'mm',
  ): Promise<PrintEntity> {
    const now = this.deps.now();
    const guess = guessPrintSize(result, unit);
    const last = await manager.maximum(PrintEntity, 'position', { studioId, pileId: upload.pileId ?? IsNull() });
    return manager.save(
      manager.create(PrintEntity, {
        id: upload.id ?? randomUUID(),
        studioId,
        pileId: upload.pileId,
        fileId: file.id,
        contributedBy: userId,
        position: (last ?? -1) + 1,
        title: titleFromFileName(upload.fileName, TITLE_MAX) || UNTITLED_PRINT,
        paperWidth: guess.width,
        paperHeight: guess.height,
        turns: 0,
        copies: 1,
        noUp: false,
        oneOfAKind: false,
        borrowedUntil: null,
        instantFilm: guess.instantFilm,
        digital: false,
        imageWidth: result.width,
        imageHeight: result.height,
        paperRect: centreCrop(result, guess, 0),
        keepZone: null,
        details: [],
        faces: [],
        horizon: null,
        palette: result.palette,
        raster: result.raster,
        revision: 0,
        binnedAt: null,
        createdAt: now,
        updatedAt: now,
      }),
    );
  }
}

type Quota = Pick<StudioEntity | UserEntity, 'bytesUsed' | 'bytesQuota'>;

function requireQuota(whose: 'studio' | 'account', quota: Quota, bytes: number): void {
  if (quota.bytesUsed + bytes > quota.bytesQuota) throw quotaExceeded(whose, quota);
}

const quotaExceeded = (whose: 'studio' | 'account', { bytesUsed, bytesQuota }: Quota): AppError =>
  new AppError('quota-exceeded', { whose, usedBytes: bytesUsed, quotaBytes: bytesQuota });

/** In one statement, since the same person may be sending to two studios at once. */
async function chargeAccount(manager: EntityManager, userId: UserId, bytes: number): Promise<void> {
  const { affected } = await manager
    .createQueryBuilder()
    .update(UserEntity)
    .set({ bytesUsed: () => 'bytes_used + :bytes' })
    .where('id = :userId AND bytes_used + :bytes <= bytes_quota', { userId, bytes })
    .execute();
  if (affected === 1) return;
  // A locking read: the transaction's own view of the row may be older than what the statement met.
  const user = await manager.findOneOrFail(UserEntity, { where: { id: userId }, lock: { mode: 'pessimistic_read' } });
  throw quotaExceeded('account', user);
}
