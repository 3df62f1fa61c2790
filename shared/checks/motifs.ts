import { inReadingOrder } from '../geometry/cells';
import type { Side } from '../model/ids';
import type { Mat } from '../model/spread';
import type { SpreadView } from './check';
import type { MotifKind } from './messages';

/** A group of mats that the eye reads as one figure. Cells are in steps of the page's grid. */
export interface Motif {
  readonly kind: MotifKind;
  readonly page: Side;
  /** In drawing order. */
  readonly mats: readonly Mat[];
}

/** Fewer mats in a row are a pair, not a strip. Common practice. */
const STRIP_LENGTH = 3;

const known = new WeakMap<SpreadView, readonly Motif[]>();

/** The split prints, strips and pinwheels of both pages. Mats laid over others belong to none. */
export function motifsOf(view: SpreadView): readonly Motif[] {
  let motifs = known.get(view);
  if (!motifs) known.set(view, (motifs = findMotifs(view)));
  return motifs;
}

function findMotifs({ doc, matById }: SpreadView): Motif[] {
  const splits = doc.panes.flatMap((group): Motif[] => {
    const mats = group.matIds.flatMap((id) => matById.get(id) ?? []);
    return group.content && mats[0] ? [{ kind: 'split-print', page: mats[0].page, mats }] : [];
  });
  return [...splits, ...(['left', 'right'] as const).flatMap((page) => figuresOf(page, doc.mats))];
}

function figuresOf(page: Side, all: readonly Mat[]): Motif[] {
  const mats = all.filter((mat) => mat.page === page && !mat.laidOver && mat.content.kind !== 'pane');
  const byCorner = new Map(mats.map((mat) => [corner(mat.x, mat.y), mat]));
  const at = (x: number, y: number, w: number, h: number): Mat | undefined => {
    const mat = byCorner.get(corner(x, y));
    return mat && mat.w === w && mat.h === h ? mat : undefined;
  };
  return [
    ...mats.flatMap((mat) => strip(mat, at, 'x')),
    ...mats.flatMap((mat) => strip(mat, at, 'y')),
    ...mats.flatMap((mat) => pinwheel(mat, at)),
  ].map(({ kind, members }) => ({ kind, page, mats: members }));
}

const corner = (x: number, y: number): number => x * 1024 + y;
type Lookup = (x: number, y: number, w: number, h: number) => Mat | undefined;
interface Figure {
  readonly kind: MotifKind;
  readonly members: readonly Mat[];
}

/** Three or more mats of one size that touch in a row or a column; found at its first mat only. */
function strip(first: Mat, at: Lookup, axis: 'x' | 'y'): Figure[] {
  const stepX = axis === 'x' ? first.w : 0;
  const stepY = axis === 'y' ? first.h : 0;
  if (at(first.x - stepX, first.y - stepY, first.w, first.h)) return [];
  const members = [first];
  for (;;) {
    const last = members.at(-1)!;
    const next = at(last.x + stepX, last.y + stepY, first.w, first.h);
    if (!next) break;
    members.push(next);
  }
  return members.length >= STRIP_LENGTH ? [{ kind: 'strip', members }] : [];
}

/** Four mats a × b, each turned against the last, round a middle of |a − b| squared; found at its top flat mat. */
function pinwheel(top: Mat, at: Lookup): Figure[] {
  const { x, y, w: a, h: b } = top;
  if (a <= b) return [];
  const turns = [
    // Clockwise: the top mat stands left, the right-hand one hangs from the top edge.
    [at(x + a, y, b, a), at(x + b, y + a, a, b), at(x, y + b, b, a)],
    // Its mirror: the top mat stands right.
    [at(x - b, y, b, a), at(x - b, y + a, a, b), at(x + a - b, y + b, b, a)],
  ];
  return turns.flatMap((others) => {
    const members = others.flatMap((mat) => mat ?? []);
    return members.length === 3 ? [{ kind: 'pinwheel' as const, members: [top, ...members] }] : [];
  });
}

/** A motif's shape and place as one comparable text: every member's cells, in reading order. */
export function footprint(motif: Motif): string {
  return [...motif.mats]
    .sort(inReadingOrder)
    .map(({ x, y, w, h }) => `${y},${x},${w},${h}`)
    .join(' ');
}
