import type { Hex, SpreadId, StashSheetId, StudioId } from './ids';
import { inches, type Length } from './length';

/** How the colour of a side came to be known. */
export const COLOR_SOURCES = ['picked', 'typed', 'photographed'] as const;
export type ColorSource = (typeof COLOR_SOURCES)[number];

/** What is on a side: one colour, or a pattern over a ground. `print` is any other picture or drawing. */
export const SIDE_PATTERNS = ['plain', 'stripe', 'dot', 'check', 'print'] as const;
export type SidePattern = (typeof SIDE_PATTERNS)[number];

export const MAX_PALETTE = 8;

/** One face of a sheet. */
export interface StashSide {
  /** The colour, or the ground of a pattern. */
  readonly hex: Hex;
  readonly source: ColorSource;
  /** How far the true colour may lie from `hex`, in CIEDE2000; never 0. */
  readonly uncertainty: number;
  readonly pattern: SidePattern;
  /** A pattern's further colours, the most seen first; empty for a plain side. */
  readonly palette: readonly Hex[];
}

/** Front, and back where it looks different: card is dyed through, patterned paper is printed on both sides. */
export type StashSides = readonly [StashSide] | readonly [StashSide, StashSide];

/** What a person knows and sets of the sheets of one kind. */
export interface StashFacts {
  readonly name: string;
  /** Free text; empty where it is not known. */
  readonly maker: string;
  readonly texture: string;
  /** Where the sheets lie. */
  readonly place: string;
  readonly width: Length;
  readonly height: Length;
  /** Whole sheets on hand, those reserved included. */
  readonly quantity: number;
  /** So many free sheets or fewer are few; null asks for no mark. */
  readonly lowAt: number | null;
  /** Of one sheet, in hundredths of the studio's currency. */
  readonly price: number | null;
  readonly sides: StashSides;
}

/** Equal sheets in the stash. */
export interface StashSheet extends StashFacts {
  readonly id: StashSheetId;
  readonly studioId: StudioId;
  /** Of `quantity`, how many spreads have reserved. */
  readonly reserved: number;
  readonly revision: number;
}

/** So many sheets of one kind are set aside for a spread. */
export interface StashReservation {
  readonly sheetId: StashSheetId;
  readonly spreadId: SpreadId;
  readonly sheets: number;
}

/** The sheet that most cardstock is sold in. */
export const DEFAULT_SHEET_SIDE: Length = inches(12);

/**
 * CIEDE2000 uncertainty of a colour that was not measured. Common practice: a maker's own value for a colour
 * differs from the sheet in the hand by about a dye lot (2); a colour matched by eye on a screen by more (5).
 */
export const UNCERTAINTY = { picked: 5, typed: 2 } as const;

export const isPatterned = ({ sides }: Pick<StashFacts, 'sides'>): boolean => sides.some(({ pattern }) => pattern !== 'plain');

/** Sheets that no spread has reserved; never under 0. */
export const freeSheets = ({ quantity, reserved }: Pick<StashSheet, 'quantity' | 'reserved'>): number => Math.max(0, quantity - reserved);

/** Whether so few sheets are free that the person wants to be told. */
export const isLow = (sheet: Pick<StashSheet, 'quantity' | 'reserved' | 'lowAt'>): boolean => sheet.lowAt !== null && freeSheets(sheet) <= sheet.lowAt;
