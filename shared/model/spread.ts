import type { DetailId, Hex, MatId, PaneGroupId, PrintId, Side, Turns } from './ids';
import type { Length } from './length';
import type { Binding, PageFormat } from './page-format';

export const SCHEMA_VERSION = 1;
export const MAX_MATS = 160;
export const MAX_DOCUMENT_BYTES = 256 * 1024;

/** How one print lies on a mat. */
export interface Placement {
  readonly printId: PrintId;
  /** `whole`: uncut and centred. `window`: trimmed to the photo's size at (x, y) of the paper. */
  readonly mode: 'window' | 'whole';
  /**
   * The window's top-left corner on the paper (upright, before `turn`). Its size follows from the
   * mat: the photo's, with width and height exchanged for an odd `turn`. Kept while whole.
   */
  readonly x: Length;
  readonly y: Length;
  /** Quarter-turns clockwise of the piece on the page; only a print with no up may have any. */
  readonly turn: Turns;
  /** Only a digital photo: the width at which its whole paper would be printed. Null for a print. */
  readonly scaledWidth: Length | null;
  /** The detail of the print that this piece is for; null for the keep zone. A detail that is gone counts as null. */
  readonly detailId: DetailId | null;
}

export type Pattern = 'stripe' | 'dot' | 'check' | 'plain';

/** What a mat carries. */
export type Content =
  | { readonly kind: 'bare' }
  | ({ readonly kind: 'print' } & Placement)
  /** One piece of a split print; the picture stands in the pane group. */
  | { readonly kind: 'pane'; readonly groupId: PaneGroupId }
  | { readonly kind: 'paper'; readonly pattern: Pattern; readonly color: Hex; readonly ground: Hex }
  | { readonly kind: 'lettering'; readonly text: string; readonly color: Hex; /** Height of the capitals. */ readonly letterHeight: Length }
  | { readonly kind: 'journaling'; readonly text: string; readonly color: Hex; /** From one ruled line to the next. */ readonly lineHeight: Length }
  | { readonly kind: 'embellishment'; readonly name: string; readonly color: Hex }
  | {
      readonly kind: 'keepsake';
      readonly name: string;
      readonly width: Length;
      readonly height: Length;
      readonly thickness: Length;
      readonly fragile: boolean;
      readonly acidic: boolean;
    };

export type ContentKind = Content['kind'];

/** One piece of cardstock on a page, in whole steps of the page's grid. */
export interface Mat {
  readonly id: MatId;
  readonly page: Side;
  readonly x: number;
  readonly y: number;
  readonly w: number;
  readonly h: number;
  /** Drawing order; `mats` is sorted by (z, id). */
  readonly z: number;
  readonly color: Hex;
  /** Border of mat left visible round what it carries; null takes the spread's. */
  readonly reveal: Length | null;
  /** A thin mat between mat and photo, with a reveal of its own. */
  readonly inner: { readonly color: Hex; readonly reveal: Length } | null;
  /** A die's true size, centred in the grid rectangle; null fills the grid rectangle. */
  readonly trueSize: { readonly width: Length; readonly height: Length } | null;
  /** Lies on other mats and hides what is under it. */
  readonly laidOver: boolean;
  /** Declared as the mat that the eye should land on first. */
  readonly focal: boolean;
  readonly content: Content;
}

/** One print cut into panes over a group of small mats of one page. */
export interface PaneGroup {
  readonly id: PaneGroupId;
  /** In reading order. */
  readonly matIds: readonly MatId[];
  /**
   * `whole` is not used here. The window is the bounding box of the panes' photos; `behind`: gaps and
   * reveals swallow that much of the picture; `apart`: the picture is spread, nothing is lost.
   */
  readonly content: (Placement & { readonly run: 'behind' | 'apart' }) | null;
}

export interface Page {
  readonly color: Hex;
}

export type SchemeCharacter = 'echo' | 'quiet' | 'lift';
export type SchemeRole = 'base' | 'main' | 'second' | 'accent';

export interface SchemeColor {
  readonly hex: Hex;
  /** Prints the colour comes from, strongest first; empty for a neutral or a colour across the wheel. */
  readonly printIds: readonly PrintId[];
}

export interface Scheme {
  readonly character: SchemeCharacter;
  readonly colors: Readonly<Record<SchemeRole, SchemeColor>>;
}

/** The whole of a spread, as one JSON document. MODEL.md 5. */
export interface SpreadDocument {
  readonly schemaVersion: typeof SCHEMA_VERSION;
  readonly format: PageFormat;
  readonly binding: Binding;
  /** Either may be null: a first or last leaf has a single page. */
  readonly pages: { readonly left: Page | null; readonly right: Page | null };
  /** The reveal of every mat that sets none. */
  readonly reveal: Length;
  /** Sorted by (z, id): later mats are drawn over earlier ones. */
  readonly mats: readonly Mat[];
  readonly panes: readonly PaneGroup[];
  /** Prints lying ready at the table's edge, in order. */
  readonly table: readonly PrintId[];
  readonly scheme: Scheme | null;
}

/** What the maker's trimmer can do, a studio setting. */
export interface TrimSettings {
  /** Keep zones are held with this much to spare on every side. */
  readonly tolerance: Length;
  /** Windows sit on multiples of this. */
  readonly finestMark: Length;
}
