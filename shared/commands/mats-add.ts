import { gridOf } from '../geometry/grid';
import { cellsOverlap } from '../model/document-faults';
import { SIDES, type Hex, type Side } from '../model/ids';
import type { Content, Mat, SpreadDocument } from '../model/spread';
import { refuse, type CommandRun } from './command';
import { matOf, matsOf, newZ, withMats } from './edit-mats';
import { dropPrint } from './pictures';
import { storedContent } from './stored-content';

/** Warm grey card, where the spread gives no hint. */
const PLAIN_CARD: Hex = '#8b857a';

/** The scheme's main colour, else the colour of most mats. */
function usualColor(doc: SpreadDocument): Hex {
  if (doc.scheme) return doc.scheme.colors.main.hex;
  const counts = new Map<Hex, number>();
  for (const { color } of doc.mats) counts.set(color, (counts.get(color) ?? 0) + 1);
  return [...counts].sort((a, b) => b[1] - a[1])[0]?.[0] ?? PLAIN_CARD;
}

export const addMat: CommandRun<'mats.add'> = (doc, args, context) => {
  const { page, laidOver = false, content = { kind: 'bare' } } = args;
  if (content.kind === 'pane') return refuse('not-for-prints');
  const stored: Content | null = content.kind === 'print' ? { kind: 'bare' } : storedContent(content);
  if (!stored) return refuse('content-does-not-fit');
  const mat: Mat = {
    id: context.newId(),
    page,
    x: Math.round(args.x),
    y: Math.round(args.y),
    w: Math.max(1, Math.round(args.w)),
    h: Math.max(1, Math.round(args.h)),
    z: newZ(doc, laidOver),
    color: args.color ?? usualColor(doc),
    reveal: null,
    inner: null,
    trueSize: null,
    laidOver,
    focal: false,
    content: stored,
  };
  const next = withMats(doc, [...doc.mats, mat]);
  if (content.kind !== 'print') return next;
  const print = context.prints.get(content.printId);
  return print ? dropPrint(next, { mat, group: null }, print, context) : refuse('no-such-print');
};

/** What a deleted mat carried goes back to the table. */
export const deleteMats: CommandRun<'mats.delete'> = (doc, { matIds }) => {
  const mats = matsOf(doc, matIds);
  if (!mats) return refuse('no-such-mat');
  return withMats(doc, doc.mats.filter((mat) => !mats.includes(mat)));
};

/**
 * A print is one piece of paper and a page has one focal, so a copy of a mat carries neither: it is bare
 * where the first carries a print or a pane.
 */
export const duplicateMat: CommandRun<'mats.duplicate'> = (doc, { matId }, context) => {
  const mat = matOf(doc, matId);
  if (!mat) return refuse('no-such-mat');
  const carriesPrint = mat.content.kind === 'print' || mat.content.kind === 'pane';
  const copy: Mat = {
    ...mat,
    id: context.newId(),
    z: newZ(doc, mat.laidOver),
    focal: false,
    content: carriesPrint ? { kind: 'bare' } : mat.content,
  };
  const place = nearestFreePlace(doc, copy);
  return place ? withMats(doc, [...doc.mats, { ...copy, ...place }]) : refuse('no-free-place');
};

interface FreePlace {
  readonly page: Side;
  readonly x: number;
  readonly y: number;
}

/**
 * The free place nearest to where the mat lies, on its own page first: beside before below, right before
 * left. A mat that is laid over may lie on others, but not just where it already lies.
 */
function nearestFreePlace(doc: SpreadDocument, mat: Mat): FreePlace | null {
  const { columns, rows } = gridOf(doc.format);
  const pages = [mat.page, ...SIDES.filter((side) => side !== mat.page && doc.pages[side])];
  for (const page of pages) {
    let best: (FreePlace & { readonly cost: number }) | null = null;
    for (let y = 0; y <= rows - mat.h; y += 1) {
      for (let x = 0; x <= columns - mat.w; x += 1) {
        const cost = (x - mat.x) ** 2 + (y - mat.y) ** 2;
        if (best && (cost > best.cost || (cost === best.cost && !preferred({ x, y }, best, mat)))) continue;
        if (isFree(doc, { ...mat, page, x, y })) best = { page, x, y, cost };
      }
    }
    if (best) return { page: best.page, x: best.x, y: best.y };
  }
  return null;
}

type At = { readonly x: number; readonly y: number };

function preferred(a: At, b: At, from: At): boolean {
  const beside = Math.abs(b.y - from.y) - Math.abs(a.y - from.y);
  return beside !== 0 ? beside > 0 : a.x !== b.x ? a.x > b.x : a.y > b.y;
}

function isFree(doc: SpreadDocument, mat: Mat): boolean {
  if (mat.laidOver) return !doc.mats.some((other) => other.laidOver && other.page === mat.page && other.x === mat.x && other.y === mat.y);
  return !doc.mats.some((other) => !other.laidOver && cellsOverlap(mat, other));
}
