import type { CommandCall } from '../commands/calls';
import type { PlacedPhoto } from '../geometry/placed-photos';
import type { MatId, PrintId, Side } from '../model/ids';
import type { Print } from '../model/print';
import type { Mat, SpreadDocument, TrimSettings } from '../model/spread';

/** `stop`: something would be spoiled. */
export type Severity = 'stop' | 'fix' | 'consider';

/** All that checks may look at. Made once per document by `viewSpread`. */
export interface SpreadView {
  readonly doc: SpreadDocument;
  readonly prints: ReadonlyMap<PrintId, Print>;
  readonly trim: TrimSettings;
  /** Copies that the studio's other live spreads use. */
  readonly usedElsewhere: Readonly<Record<PrintId, number>>;
  readonly matById: ReadonlyMap<MatId, Mat>;
  readonly photos: readonly PlacedPhoto[];
  readonly photosByMat: ReadonlyMap<MatId, PlacedPhoto>;
}

/** Plain data for the sentence in `shared/words`: lengths as numbers in 1/160 mm, colours as hex, titles as text. */
export type NoteData = Readonly<Record<string, string | number | boolean>>;

/** One thing that a check has to say about this spread. */
export interface Note {
  /** Stable while its cause lasts: check, mats and message. */
  readonly key: string;
  readonly checkId: string;
  readonly messageId: string;
  readonly severity: Severity;
  /** The mats it speaks of, the one its leader ends in first. */
  readonly matIds: readonly MatId[];
  /** The page in whose margin it stands. */
  readonly page: Side;
  readonly data: NoteData;
  /** A one-press way out, itself an undoable command that never makes another stop. */
  readonly remedy: Remedy | null;
}

export interface Remedy {
  readonly messageId: string;
  readonly data: NoteData;
  readonly call: CommandCall;
}

/** What a check returns; `runChecks` adds the rest. */
export interface Finding {
  readonly messageId: string;
  readonly matIds: readonly MatId[];
  readonly page?: Side;
  readonly data?: NoteData;
  /** In order of preference; the first that makes no new stop is offered. */
  readonly remedies?: readonly Remedy[];
}

export interface Check {
  readonly id: string;
  readonly severity: Severity;
  /** A published measure names its source; the rest is common practice in the trade. */
  readonly basis: { readonly kind: 'published'; readonly source: string } | { readonly kind: 'common-practice' };
  /** Design checks judge the spread as a whole and keep silent while pages are half filled. */
  readonly needsFilledPages: boolean;
  readonly run: (view: SpreadView) => readonly Finding[];
}
