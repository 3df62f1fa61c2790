import { IsNull, Not, type DataSource, type EntityManager } from 'typeorm';
import type { UpdatePrint } from '../../shared/contracts/prints';
import { AppError } from '../../shared/errors';
import { changePrint, printFaults } from '../../shared/model/change-print';
import type { Actor, Target } from '../../shared/model/people';
import { FileEntity } from '../entities/file-entity';
import { PileEntity } from '../entities/pile-entity';
import { PrintEntity } from '../entities/print-entity';
import { SpreadEntity } from '../entities/spread-entity';
import { StudioEntity } from '../entities/studio-entity';
import { UserEntity } from '../entities/user-entity';
import { presentPrint } from '../presenters/present-print';
import type { Storage } from '../storage/storage';
import { recordAudit } from './audit';
import { isDangling, isReferenced } from './database-errors';
import { invalidField } from './invalid-field';
import { readCursor, writeCursor } from './cursor';
import { lockStudio, removeUnlessKnown } from './stored-pictures';

interface Deps {
  readonly dataSource: DataSource;
  readonly storage: Storage;
  readonly now: () => Date;
}

interface PrintQuery {
  readonly cursor?: string | undefined;
  readonly limit: number;
  readonly pileId?: string | undefined;
  readonly binned: boolean;
}

export class PrintService {
  constructor(private readonly deps: Deps) {}

  /** @throws AppError('not-found'). */
  async get(id: string): Promise<PrintEntity> {
    const print = await this.deps.dataSource.manager.findOneBy(PrintEntity, { id });
    if (!print) throw new AppError('not-found');
    return print;
  }

  async locate(id: string): Promise<{ readonly target: Target; readonly subject: PrintEntity }> {
    const subject = await this.get(id);
    return { target: targetOfPrint(subject), subject };
  }

  /** One page of a studio's prints, oldest first. @throws AppError('invalid-input') for a cursor that is none of ours. */
  async list(studioId: string, { cursor, limit, pileId, binned }: PrintQuery): Promise<{ prints: PrintEntity[]; nextCursor: string | null }> {
    const query = this.deps.dataSource.manager
      .createQueryBuilder(PrintEntity, 'print')
      .where({ studioId, binnedAt: binned ? Not(IsNull()) : IsNull(), ...(pileId !== undefined && { pileId }) })
      .orderBy('print.createdAt', 'ASC')
      .addOrderBy('print.id', 'ASC')
      .take(limit + 1);
    if (cursor !== undefined) {
      const { at, id } = readCursor(cursor);
      query.andWhere('(print.createdAt > :at OR (print.createdAt = :at AND print.id > :id))', { at, id });
    }
    const found = await query.getMany();
    const prints = found.slice(0, limit);
    const last = prints.at(-1);
    return { prints, nextCursor: found.length > limit && last ? writeCursor({ at: last.createdAt, id: last.id }) : null };
  }

  /**
   * Changes what a person set and nothing else, if the print is still as that person saw it.
   *
   * @throws AppError `stale-revision` with the print as it stands, `invalid-input` by field, `in-use` for a print that
   *   is to go to the bin while a spread uses it.
   */
  async update(print: PrintEntity, { baseRevision, binned, ...changes }: UpdatePrint): Promise<PrintEntity> {
    if (baseRevision !== print.revision) throw await this.stale(print.id);
    const next = changePrint(presentPrint(print), changes);
    const fields = printFaults(next, changes);
    if (fields.length > 0) throw new AppError('invalid-input', { where: 'body', fields });
    await this.requirePile(print.studioId, changes.pileId);
    if (binned === true) await this.requireUnused(print.id);
    const at = this.deps.now();
    const { id: _id, studioId: _studioId, marks, revision: _revision, palette: _palette, raster: _raster, ...columns } = next;
    const update = this.deps.dataSource.manager.update(
      PrintEntity,
      { id: print.id, revision: baseRevision },
      {
        ...columns,
        ...marks,
        // TypeORM's partial type wants mutable lists.
        details: [...columns.details],
        faces: [...columns.faces],
        revision: baseRevision + 1,
        updatedAt: at,
        ...(binned !== undefined && { binnedAt: binned ? (print.binnedAt ?? at) : null }),
      },
    );
    const { affected } = await update.catch((error: unknown) => {
      // The pile was deleted since it was looked for.
      throw isDangling(error) ? noSuchPile() : error;
    });
    if (affected !== 1) throw await this.stale(print.id);
    return this.get(print.id);
  }

  private async stale(id: string): Promise<AppError> {
    return new AppError('stale-revision', { print: presentPrint(await this.get(id)) });
  }

  private async requirePile(studioId: string, pileId: string | null | undefined): Promise<void> {
    if (pileId === undefined || pileId === null) return;
    const exists = await this.deps.dataSource.manager.existsBy(PileEntity, { id: pileId, studioId });
    if (!exists) throw noSuchPile();
  }

  private async requireUnused(printId: string): Promise<void> {
    const spreads = await this.deps.dataSource.manager
      .createQueryBuilder(SpreadEntity, 'spread')
      .select(['spread.id', 'spread.title'])
      .innerJoin('spread_prints', 'used', 'used.spread_id = spread.id')
      .where('used.print_id = :printId', { printId })
      .orderBy('spread.title', 'ASC')
      .getMany();
    if (spreads.length > 0) throw new AppError('in-use', { spreads: spreads.map(({ id, title }) => ({ id, title })) });
  }

  /**
   * For good, with its file when no other print shows it. The database itself refuses while a spread uses the print.
   *
   * @throws AppError `in-use` naming the spreads, `not-found` when somebody else just did the same.
   */
  async remove(print: PrintEntity, actor: Actor): Promise<void> {
    const { dataSource, storage } = this.deps;
    await this.requireUnused(print.id);
    try {
      const orphan = await dataSource.transaction((manager) => this.removeRows(manager, print, actor));
      if (orphan) await removeUnlessKnown(dataSource, storage, { studioId: print.studioId, sha256: orphan.sha256 });
    } catch (error) {
      if (!isReferenced(error)) throw error;
      await this.requireUnused(print.id);
      throw error;
    }
  }

  /** @returns the file that no print shows any more. */
  private async removeRows(manager: EntityManager, print: PrintEntity, actor: Actor): Promise<FileEntity | null> {
    const studio = await lockStudio(manager, print.studioId);
    const { affected } = await manager.delete(PrintEntity, { id: print.id });
    if (affected !== 1) throw new AppError('not-found');
    await recordAudit(manager, { studioId: print.studioId, actor, action: 'print.delete', subjectId: print.id, at: this.deps.now() });
    if (await manager.existsBy(PrintEntity, { fileId: print.fileId })) return null;
    const file = await manager.findOneByOrFail(FileEntity, { id: print.fileId });
    await manager.delete(FileEntity, { id: file.id });
    await manager.update(StudioEntity, { id: studio.id }, { bytesUsed: Math.max(0, studio.bytesUsed - file.bytes) });
    if (file.addedBy !== null) await refundAccount(manager, file.addedBy, file.bytes);
    return file;
  }
}

const noSuchPile = (): AppError => invalidField('pileId', 'there is no such pile in this studio');

/** A print is in a pile; whether that pile is shared matters to uploads only. */
export const targetOfPrint = (print: PrintEntity): Target => ({
  studioId: print.studioId,
  pileId: print.pileId,
  contributedBy: print.contributedBy,
});

async function refundAccount(manager: EntityManager, userId: string, bytes: number): Promise<void> {
  await manager
    .createQueryBuilder()
    .update(UserEntity)
    .set({ bytesUsed: () => 'GREATEST(0, bytes_used - :bytes)' })
    .where('id = :userId', { userId, bytes })
    .execute();
}
