import { shareCells } from '../geometry/cells';
import { cellRect, contentRect, gridOf, innerMatRect } from '../geometry/grid';
import type { MatId, PaneGroupId, PrintId } from './ids';
import { inDrawingOrder } from './patch';
import { MAX_DOCUMENT_BYTES, MAX_MATS, type Mat, type SpreadDocument } from './spread';
import { utf8Length } from './utf8-length';

/** What a document's shape cannot say by itself. Words for each stand in `shared/words/en/document.ts`. */
export const DOCUMENT_FAULT_CODES = [
  'off-grid',
  'overlap',
  'page-missing',
  'duplicate-id',
  'unknown-print',
  'print-listed-twice',
  'true-size-too-large',
  'no-room-for-photo',
  'no-room-for-inner-mat',
  'pane-too-few',
  'pane-member-missing',
  'pane-two-pages',
  'pane-content-differs',
  'pane-in-two-groups',
  'pane-without-group',
  'out-of-order',
  'too-many-mats',
  'document-too-large',
] as const;
export type DocumentFaultCode = (typeof DOCUMENT_FAULT_CODES)[number];

/** One thing that is wrong with a document; plain JSON, so that it can travel in an error's data. */
export interface DocumentFault {
  readonly code: DocumentFaultCode;
  readonly matIds: readonly MatId[];
  readonly data: Readonly<Record<string, string | number>>;
}

/** What the caller can tell of things outside the document; without it, prints are taken on trust. */
export interface Knows {
  readonly print: (id: PrintId) => boolean;
}

/**
 * Everything that is wrong with a document, in the order: whole document, single mats in drawing order,
 * pairs of mats, pane groups, prints. An empty list means that it may be stored.
 *
 * What depends on a print's marks (a turned print that has an up, a scaled print that is not digital) is
 * left to commands and checks: marks change outside the document, and a document must not become
 * unsaveable because somebody ticked a box on a print.
 */
export function findDocumentFaults(doc: SpreadDocument, knows?: Knows): DocumentFault[] {
  return [
    ...wholeFaults(doc),
    ...doc.mats.flatMap((mat) => matFaults(doc, mat)),
    ...overlapFaults(doc.mats),
    ...paneFaults(doc),
    ...(knows ? printFaults(doc, knows) : []),
  ];
}

const fault = (code: DocumentFaultCode, matIds: readonly MatId[] = [], data: DocumentFault['data'] = {}): DocumentFault => ({
  code,
  matIds,
  data,
});

function wholeFaults(doc: SpreadDocument): DocumentFault[] {
  const faults: DocumentFault[] = [];
  if (doc.mats.length > MAX_MATS) faults.push(fault('too-many-mats', [], { count: doc.mats.length, max: MAX_MATS }));
  const bytes = utf8Length(JSON.stringify(doc));
  if (bytes > MAX_DOCUMENT_BYTES) faults.push(fault('document-too-large', [], { bytes, max: MAX_DOCUMENT_BYTES }));
  const seen = new Set<string>();
  for (const id of [...doc.mats, ...doc.panes].map((thing): string => thing.id)) {
    if (seen.has(id)) faults.push(fault('duplicate-id', doc.mats.some((mat) => mat.id === id) ? [id] : [], { id }));
    seen.add(id);
  }
  const listed = new Set<PrintId>();
  const twice = doc.table.find((id) => listed.has(id) || !listed.add(id));
  if (twice !== undefined) faults.push(fault('print-listed-twice', [], { printId: twice }));
  const late = doc.mats.find((mat, i) => i > 0 && inDrawingOrder(doc.mats[i - 1]!, mat) > 0);
  if (late) faults.push(fault('out-of-order', [late.id]));
  return faults;
}

function matFaults(doc: SpreadDocument, mat: Mat): DocumentFault[] {
  if (!doc.pages[mat.page]) return [fault('page-missing', [mat.id], { page: mat.page })];
  const grid = gridOf(doc.format);
  const onGrid =
    [mat.x, mat.y, mat.w, mat.h].every(Number.isInteger) &&
    mat.x >= 0 &&
    mat.y >= 0 &&
    mat.w > 0 &&
    mat.h > 0 &&
    mat.x + mat.w <= grid.columns &&
    mat.y + mat.h <= grid.rows;
  if (!onGrid) return [fault('off-grid', [mat.id], { columns: grid.columns, rows: grid.rows })];

  const faults: DocumentFault[] = [];
  const cells = cellRect(doc.format, mat);
  if (mat.trueSize && (mat.trueSize.width > cells.width || mat.trueSize.height > cells.height)) {
    faults.push(fault('true-size-too-large', [mat.id], { width: cells.width, height: cells.height }));
  }
  const inner = innerMatRect(doc.format, doc.reveal, mat);
  if (inner && (inner.width <= 0 || inner.height <= 0)) faults.push(fault('no-room-for-inner-mat', [mat.id]));
  if (mat.content.kind === 'print' || mat.content.kind === 'pane') {
    const photo = contentRect(doc.format, doc.reveal, mat);
    if (photo.width <= 0 || photo.height <= 0) faults.push(fault('no-room-for-photo', [mat.id]));
  }
  return faults;
}

function overlapFaults(mats: readonly Mat[]): DocumentFault[] {
  const flat = mats.filter((mat) => !mat.laidOver);
  return flat.flatMap((a, i) => flat.slice(i + 1).flatMap((b) => (cellsOverlap(a, b) ? [fault('overlap', [a.id, b.id])] : [])));
}

/** True where two mats of one page share a cell of the grid. */
export const cellsOverlap = (a: Mat, b: Mat): boolean => a.page === b.page && shareCells(a, b);

function paneFaults(doc: SpreadDocument): DocumentFault[] {
  const faults: DocumentFault[] = [];
  const byId = new Map(doc.mats.map((mat) => [mat.id, mat]));
  const groupOf = new Map<MatId, PaneGroupId>();
  for (const group of doc.panes) {
    const data = { groupId: group.id };
    if (new Set(group.matIds).size < 2) faults.push(fault('pane-too-few', group.matIds, data));
    const members = group.matIds.flatMap((id) => byId.get(id) ?? []);
    if (members.length < group.matIds.length) faults.push(fault('pane-member-missing', members.map((mat) => mat.id), data));
    if (new Set(members.map((mat) => mat.page)).size > 1) faults.push(fault('pane-two-pages', group.matIds, data));
    for (const mat of members) {
      if (groupOf.has(mat.id)) faults.push(fault('pane-in-two-groups', [mat.id], data));
      else if (mat.content.kind !== 'pane' || mat.content.groupId !== group.id) {
        faults.push(fault('pane-content-differs', [mat.id], data));
      }
      groupOf.set(mat.id, group.id);
    }
  }
  for (const mat of doc.mats) {
    if (mat.content.kind === 'pane' && !groupOf.has(mat.id)) faults.push(fault('pane-without-group', [mat.id]));
  }
  return faults;
}

function printFaults(doc: SpreadDocument, knows: Knows): DocumentFault[] {
  const unknown = (printId: PrintId, matIds: readonly MatId[]): DocumentFault[] =>
    knows.print(printId) ? [] : [fault('unknown-print', matIds, { printId })];
  return [
    ...doc.mats.flatMap((mat) => (mat.content.kind === 'print' ? unknown(mat.content.printId, [mat.id]) : [])),
    ...doc.panes.flatMap((group) => (group.content ? unknown(group.content.printId, group.matIds) : [])),
    ...doc.table.flatMap((printId) => unknown(printId, [])),
  ];
}
