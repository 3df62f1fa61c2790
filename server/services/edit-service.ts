import { isDeepStrictEqual } from 'node:util';
import { In, type DataSource, type EntityManager } from 'typeorm';
import { documentSchema } from '../../shared/contracts/document';
import type { Edit, PostEdits, StaleSpread } from '../../shared/contracts/edits';
import { fieldFaults } from '../../shared/contracts/field-faults';
import { AppError } from '../../shared/errors';
import { findDocumentFaults } from '../../shared/model/document-faults';
import { applyPatch, readKey, touchedByBoth, type Patch } from '../../shared/model/patch';
import type { Actor } from '../../shared/model/people';
import { copiesUsed, namedPrints } from '../../shared/model/print-use';
import { SCHEMA_VERSION, type SpreadDocument } from '../../shared/model/spread';
import { PrintEntity } from '../entities/print-entity';
import { SpreadEditEntity } from '../entities/spread-edit-entity';
import { SpreadEntity } from '../entities/spread-entity';
import { SpreadPrintEntity } from '../entities/spread-print-entity';
import { SpreadSnapshotEntity } from '../entities/spread-snapshot-entity';
import { StudioEntity } from '../entities/studio-entity';
import { presentEdit } from '../presenters/present-edit';
import { readLog, SNAPSHOT_EVERY } from './history';
import { readDocument } from './spread-service';

/** What the poster is told: the revision after the edits, and what others did since the base. */
export interface Applied {
  readonly revision: number;
  readonly missed: readonly SpreadEditEntity[];
}

export class EditService {
  constructor(
    private readonly dataSource: DataSource,
    private readonly now: () => Date,
  ) {}

  /**
   * Applies an ordered list of edits in one transaction, one revision each, and appends them to the log. Edits of
   * others since the base are merged as long as no key was touched by both; a repeat is answered as the first time.
   *
   * @throws AppError `stale-revision` (`staleSpreadSchema`) where a touched key changed since the base, or is not what the edit says it was.
   *   `document-refused` naming every fault of the result, `invalid-input` for a base that is not
   *   reached yet or a value that no document can hold, `already-exists` for an id under which another edit is saved.
   */
  post(spreadId: string, posted: PostEdits, actor: Actor): Promise<Applied> {
    return this.dataSource.transaction(async (manager) => {
      const spread = await manager.findOne(SpreadEntity, { where: { id: spreadId }, lock: { mode: 'pessimistic_write' } });
      if (!spread) throw new AppError('not-found');
      if (posted.baseRevision > spread.revision) {
        const fields = [{ path: 'baseRevision', message: `the spread is at revision ${spread.revision} only` }];
        throw new AppError('invalid-input', { where: 'body', fields });
      }
      const ids = posted.edits.map(({ id }) => id);
      const known = await manager.findBy(SpreadEditEntity, { spreadId, id: In(ids) });
      const knownIds = new Set(known.map(({ id }) => id));
      refuseOtherEdits(posted.edits, known);
      const log = await readLog(manager, spreadId, { after: posted.baseRevision });
      const foreign = log.filter(({ id }) => !ids.includes(id));
      const fresh = posted.edits.filter(({ id }) => !knownIds.has(id));
      if (fresh.length === 0) {
        const revision = Math.max(...known.map((edit) => edit.revision));
        return { revision, missed: foreign.filter((edit) => edit.revision < revision) };
      }
      refuseConflicts(spread, fresh, foreign);
      const { doc, logged, snapshots } = this.apply(spread, fresh, actor, foreign);
      await requireSound(manager, spread.studioId, doc);
      await write(manager, spread, doc, fresh.length, this.now());
      await manager.insert(SpreadEditEntity, logged);
      if (snapshots.length > 0) await manager.insert(SpreadSnapshotEntity, snapshots);
      return { revision: spread.revision + fresh.length, missed: foreign };
    });
  }

  private apply(spread: SpreadEntity, edits: readonly Edit[], actor: Actor, foreign: readonly SpreadEditEntity[]) {
    const at = this.now();
    const snapshots: { spreadId: string; revision: number; document: SpreadDocument; schemaVersion: number; at: Date }[] = [];
    let doc = readDocument(spread);
    let { revision } = spread;
    const logged = edits.map(({ id, command, patch }) => {
      const wrong = Object.keys(patch).filter((key) => !isDeepStrictEqual(readKey(doc, key), patch[key]!.before));
      if (wrong.length > 0) throw stale(spread, wrong.sort(), foreign);
      refuseOtherIds(patch);
      doc = applyPatch(doc, patch);
      revision += 1;
      if (revision % SNAPSHOT_EVERY === 0) snapshots.push({ spreadId: spread.id, revision, document: doc, schemaVersion: SCHEMA_VERSION, at });
      return { spreadId: spread.id, revision, id, command, patch, userId: actor.userId, at };
    });
    return { doc, logged, snapshots };
  }
}

/** Taking another edit for a repeat would tell its maker that it is saved. */
function refuseOtherEdits(edits: readonly Edit[], known: readonly SpreadEditEntity[]): void {
  const saved = new Map(known.map(({ id, patch }) => [id, patch]));
  const other = edits.find(({ id, patch }) => saved.has(id) && !isDeepStrictEqual(asStored(patch), saved.get(id)));
  if (other) throw new AppError('already-exists', { what: 'saved edit', id: other.id });
}

const asStored = (patch: Patch): unknown => JSON.parse(JSON.stringify(patch));

function refuseConflicts(spread: SpreadEntity, fresh: readonly Edit[], foreign: readonly SpreadEditEntity[]): void {
  const keys = touchedByBoth(fresh, foreign);
  if (keys.length > 0) throw stale(spread, keys, foreign);
}

/** A key names the id of its value; another id would let one key change two things. */
function refuseOtherIds(patch: Patch): void {
  const fields = Object.entries(patch).flatMap(([key, { after }]) => {
    const named = key.startsWith('mat/') || key.startsWith('panes/');
    if (!named || after === null) return [];
    const id = typeof after === 'object' && 'id' in after ? after.id : null;
    return id === key.slice(key.indexOf('/') + 1) ? [] : [{ path: `${key}.after.id`, message: 'must be the id that the key names' }];
  });
  if (fields.length > 0) throw new AppError('invalid-input', { where: 'body', fields });
}

/** @throws AppError unless the document fits its schema and all its rules. */
async function requireSound(manager: EntityManager, studioId: string, doc: SpreadDocument): Promise<void> {
  const shape = documentSchema.safeParse(doc);
  if (!shape.success) throw new AppError('invalid-input', { where: 'body', fields: fieldFaults(shape.error.issues) });
  const ids = [...namedPrints(doc)];
  // The share lock keeps a print from being deleted before the spread points to it.
  const lock = { mode: 'pessimistic_read' as const };
  const rows = ids.length === 0 ? [] : await manager.find(PrintEntity, { select: { id: true }, where: { id: In(ids), studioId }, lock });
  const prints = new Set(rows.map(({ id }) => id));
  const faults = findDocumentFaults(doc, { print: (id) => prints.has(id) });
  if (faults.length > 0) throw new AppError('document-refused', { faults });
}

/** The stale write is refused in the statement itself, whatever lock is held. */
async function write(manager: EntityManager, spread: SpreadEntity, doc: SpreadDocument, edits: number, at: Date): Promise<void> {
  const { affected } = await manager.update(
    SpreadEntity,
    { id: spread.id, revision: spread.revision },
    // TypeORM's partial type cannot hold a readonly document; the column itself is plain JSON.
    { document: doc as object, schemaVersion: SCHEMA_VERSION, revision: spread.revision + edits, updatedAt: at },
  );
  if (affected !== 1) throw stale(spread, [], []);
  await manager.delete(SpreadPrintEntity, { spreadId: spread.id });
  const { tolerance } = await manager.findOneByOrFail(StudioEntity, { id: spread.studioId });
  const rows = [...copiesUsed(doc, tolerance)].map(([printId, copies]) => ({ spreadId: spread.id, printId, copies }));
  if (rows.length > 0) await manager.insert(SpreadPrintEntity, rows);
}

function stale(spread: SpreadEntity, keys: readonly string[], missed: readonly SpreadEditEntity[]): AppError {
  const data: StaleSpread = { revision: spread.revision, keys: [...keys], missed: missed.map(presentEdit) };
  return new AppError('stale-revision', { ...data });
}
