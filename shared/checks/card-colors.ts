import { innerMatRect, matRect, revealOf } from '../geometry/grid';
import { area } from '../geometry/rects';
import type { Hex, MatId, Side } from '../model/ids';
import type { Mat } from '../model/spread';
import type { SpreadView } from './check';

/** One colour of card, with every mat that shows it. */
export interface CardColor {
  readonly hex: Hex;
  /** In drawing order; a mat and its inner mat count for their own colours. */
  readonly mats: readonly Mat[];
  /** Area of these cards in square Lengths, what lies on them included. */
  readonly area: number;
}

const known = new WeakMap<SpreadView, readonly CardColor[]>();

/** The colours of all card that shows on mats, pages left out, in the order of their first mat. */
export function cardColors(view: SpreadView): readonly CardColor[] {
  let colors = known.get(view);
  if (!colors) known.set(view, (colors = collect(view)));
  return colors;
}

function collect({ doc }: SpreadView): CardColor[] {
  const byHex = new Map<Hex, { mats: Mat[]; area: number }>();
  const add = (hex: Hex, mat: Mat, units: number): void => {
    let entry = byHex.get(hex);
    if (!entry) byHex.set(hex, (entry = { mats: [], area: 0 }));
    if (entry.mats.at(-1) !== mat) entry.mats.push(mat);
    entry.area += units;
  };
  for (const mat of doc.mats) {
    if (!doc.pages[mat.page]) continue;
    if (showsCard(mat, doc.reveal)) add(mat.color, mat, area(matRect(doc.format, mat)));
    const inner = mat.inner && mat.inner.reveal > 0 ? innerMatRect(doc.format, doc.reveal, mat) : null;
    if (inner && mat.inner) add(mat.inner.color, mat, area(inner));
  }
  return [...byHex].map(([hex, entry]) => ({ hex, ...entry }));
}

/** Photos and patterned paper hide card that has no reveal. */
function showsCard(mat: Mat, spreadReveal: number): boolean {
  const { kind } = mat.content;
  const isHidden = kind === 'print' || kind === 'pane' || kind === 'paper';
  return !isHidden || revealOf(mat, spreadReveal) > 0;
}

export const idsOf = (mats: readonly Mat[]): readonly MatId[] => mats.map((mat) => mat.id);
export const pagesOf = (mats: readonly Mat[]): ReadonlySet<Side> => new Set(mats.map((mat) => mat.page));
