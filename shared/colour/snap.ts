import type { Hex } from '../model/ids';
import type { Size } from '../model/rect';
import type { StashSheet } from '../model/stash';
import { ciede2000Each } from './ciede2000';
import { hexToLab } from './convert';
import { DIFFERENCE_LIMITS, differenceWord, type Difference } from './difference-words';

/** A plain side of a sheet that a colour can be held against. */
interface Entry {
  readonly sheet: StashSheet;
  readonly hex: Hex;
  readonly uncertainty: number;
}

/** A stash made ready for many questions. */
export interface StashIndex {
  readonly entries: readonly Entry[];
  /** Lab D65 triples in the order of the entries. */
  readonly labs: Float64Array;
}

/** A sheet that looks like a colour. */
export interface StashMatch {
  readonly sheet: StashSheet;
  readonly hex: Hex;
  /** CIEDE2000 between the colour asked for and the sheet as it is known. */
  readonly deltaE: number;
  readonly word: Difference;
}

/** Every plain side of every sheet: a patterned side is no colour that a mat could have. */
export function indexStash(sheets: readonly StashSheet[]): StashIndex {
  const entries = sheets.flatMap((sheet) =>
    sheet.sides.filter(({ pattern }) => pattern === 'plain').map(({ hex, uncertainty }): Entry => ({ sheet, hex, uncertainty })),
  );
  const labs = new Float64Array(entries.length * 3);
  entries.forEach(({ hex }, i) => labs.set(hexToLab(hex), i * 3));
  return { entries, labs };
}

/** Whether a piece can be cut from a sheet, turned or not. */
export const fitsSheet = (piece: Size, sheet: Size): boolean =>
  Math.min(piece.width, piece.height) <= Math.min(sheet.width, sheet.height) && Math.max(piece.width, piece.height) <= Math.max(sheet.width, sheet.height);

/**
 * The sheet nearest to a colour by CIEDE2000, or null where no sheet is even near (6 or more away). Ties go to the
 * sheet with the smaller id, so that the same stash answers the same.
 *
 * @param isFit - sheets to leave out, such as those too small.
 */
export function nearestSheet({ entries, labs }: StashIndex, hex: Hex, isFit: (sheet: StashSheet) => boolean = () => true): StashMatch | null {
  const differences = ciede2000Each(labs, hexToLab(hex));
  let best = -1;
  for (let i = 0; i < entries.length; i += 1) {
    if (differences[i]! >= DIFFERENCE_LIMITS.near || !isFit(entries[i]!.sheet)) continue;
    const isNearer = best < 0 || differences[i]! < differences[best]! || (differences[i] === differences[best] && entries[i]!.sheet.id < entries[best]!.sheet.id);
    if (isNearer) best = i;
  }
  if (best < 0) return null;
  const { sheet, hex: found, uncertainty } = entries[best]!;
  return { sheet, hex: found, deltaE: differences[best]!, word: differenceWord(differences[best]!, uncertainty) };
}
