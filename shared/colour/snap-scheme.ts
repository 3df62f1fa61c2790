import { innerMatRect, matRect } from '../geometry/grid';
import { SIDES, type Hex } from '../model/ids';
import type { Size } from '../model/rect';
import type { Scheme, SchemeRole, SpreadDocument } from '../model/spread';
import { DEFAULT_SHEET_SIDE, freeSheets, type StashSheet } from '../model/stash';
import { fitsSheet, nearestSheet, type StashIndex, type StashMatch } from './snap';

const ROLES: readonly SchemeRole[] = ['base', 'main', 'second', 'accent'];
const USUAL_SHEET: Size = { width: DEFAULT_SHEET_SIDE, height: DEFAULT_SHEET_SIDE };

/** One colour of a scheme, held against the stash. */
export interface SnappedColor {
  readonly role: SchemeRole;
  readonly hex: Hex;
  /** Null where nothing in the stash is near. */
  readonly match: StashMatch | null;
  /** Whole sheets that the spread needs of this colour; 0 where no card has it. */
  readonly needed: number;
  /** Of `needed`, how many must be bought. */
  readonly buy: number;
}

/**
 * The scheme's colours as sheets. For each colour, of the sheets that hold its largest piece: the nearest that has a
 * free sheet, or else the nearest. Two colours that fall on the same sheet share what is free, in the order of roles.
 *
 * Until there are cutting plans, sheets are counted by area: every page, mat and inner mat is a whole piece of card,
 * also where a photo hides it; their areas are added and divided by the sheet's, rounded up. What a cutting plan
 * adds in waste is not in it, so the count is the least that can do. Without a match, sheets are 12 × 12 in.
 *
 * @param doc - the spread with the scheme applied.
 */
export function snapScheme(doc: SpreadDocument, scheme: Scheme, stash: StashIndex): readonly SnappedColor[] {
  const pieces = piecesByColor(doc);
  const taken = new Map<string, number>();
  const counted = new Set<Hex>();
  return ROLES.map((role) => {
    const { hex } = scheme.colors[role];
    // Two roles of one colour: its pieces count once, for the first.
    const own = counted.has(hex) ? [] : (pieces.get(hex) ?? []);
    counted.add(hex);
    const isLargeEnough = (sheet: StashSheet): boolean => own.every((piece) => fitsSheet(piece, sheet));
    const freeOf = (sheet: StashSheet): number => Math.max(0, freeSheets(sheet) - (taken.get(sheet.id) ?? 0));
    const match =
      nearestSheet(stash, hex, (sheet) => isLargeEnough(sheet) && freeOf(sheet) > 0) ?? nearestSheet(stash, hex, isLargeEnough);
    const needed = sheetsFor(own, match?.sheet ?? USUAL_SHEET);
    const buy = Math.max(0, needed - (match ? freeOf(match.sheet) : 0));
    if (match) taken.set(match.sheet.id, (taken.get(match.sheet.id) ?? 0) + needed);
    return { role, hex, match, needed, buy };
  });
}

/** The scheme in the colours of the sheets that were found; a colour that must be bought without a match stays as it is. */
export function schemeOfSheets(scheme: Scheme, snapped: readonly SnappedColor[]): Scheme {
  const colors = { ...scheme.colors };
  for (const { role, match } of snapped) if (match) colors[role] = { ...colors[role], hex: match.hex };
  return { ...scheme, colors };
}

/** Least number of sheets whose area holds all pieces. */
function sheetsFor(pieces: readonly Size[], sheet: Size): number {
  const area = pieces.reduce((sum, { width, height }) => sum + width * height, 0);
  return Math.ceil(area / (sheet.width * sheet.height));
}

/** Every piece of card of the spread, by its colour. */
function piecesByColor(doc: SpreadDocument): ReadonlyMap<Hex, readonly Size[]> {
  const byColor = new Map<Hex, Size[]>();
  const add = (color: Hex, piece: Size): void => void byColor.set(color, [...(byColor.get(color) ?? []), piece]);
  for (const side of SIDES) {
    const page = doc.pages[side];
    if (page) add(page.color, doc.format);
  }
  for (const mat of doc.mats) {
    add(mat.color, matRect(doc.format, mat));
    const inner = innerMatRect(doc.format, doc.reveal, mat);
    if (inner) add(mat.inner!.color, inner);
  }
  return byColor;
}
