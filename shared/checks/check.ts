import type { CommandCall } from '../commands/calls';
import { clamp } from '../geometry/clamp';
import type { PlacedPhoto } from '../geometry/placed-photos';
import type { MatId, PrintId, Side } from '../model/ids';
import type { Print } from '../model/print';
import type { Mat, SchemeCharacter, SpreadDocument, TrimSettings } from '../model/spread';
import type { CheckId } from './check-ids';
import type { NoteMessageId, NoteMessages, RemedyMessageId, RemedyMessages } from './messages';

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
  readonly checkId: CheckId;
  readonly messageId: NoteMessageId;
  readonly severity: Severity;
  /** The mats it speaks of, the one its leader ends in first. */
  readonly matIds: readonly MatId[];
  /** The page in whose margin it stands. */
  readonly page: Side;
  readonly data: NoteData;
  /** A one-press way out, itself an undoable command that never makes another stop. */
  readonly remedy: Remedy | null;
}

/** The message's data is the one that `RemedyMessages` names for it. */
export type Remedy = {
  [Id in RemedyMessageId]: { readonly messageId: Id; readonly data: RemedyMessages[Id]; readonly call: CommandCall };
}[RemedyMessageId];

interface FindingBase {
  readonly matIds: readonly MatId[];
  /** Needed only where no mat is named; otherwise the first mat's page. */
  readonly page?: Side;
  /** In order of preference; the first that makes no new stop is offered. Asked for only when the note is shown. */
  readonly remedies?: () => readonly Remedy[];
}

/** A message with the data that `NoteMessages` names for it. */
export type Message = { [Id in NoteMessageId]: { readonly messageId: Id; readonly data: NoteMessages[Id] } }[NoteMessageId];

/** What a check returns; `runChecks` adds the rest. */
export type Finding = Message & FindingBase;

/** A number that a studio may set; held to its range. */
export interface Threshold {
  readonly default: number;
  readonly min: number;
  readonly max: number;
  readonly unit: 'length' | 'steps' | 'share' | 'points' | 'ratio' | 'count' | 'degrees';
}

export type ThresholdValues<T extends Readonly<Record<string, Threshold>>> = { readonly [Name in keyof T]: number };

interface CheckTraits {
  readonly id: CheckId;
  readonly severity: Severity;
  /** A published measure names its source; the rest is common practice in the trade. */
  readonly basis: { readonly kind: 'published'; readonly source: string } | { readonly kind: 'common-practice' };
  /** Design checks judge the spread as a whole and keep silent while pages are half filled (`areFilled`). */
  readonly needsFilledPages: boolean;
  /** Checks whose finding on the same mat has the same cause, and says it better. */
  readonly yieldsTo?: readonly CheckId[];
  /** Schemes that contradict the check by nature: it is off while one of them is on. */
  readonly offUnder?: readonly SchemeCharacter[];
}

export interface Check extends CheckTraits {
  readonly thresholds: Readonly<Record<string, Threshold>>;
  /** @param set - thresholds that the studio or the spread sets; the rest are the defaults. */
  readonly run: (view: SpreadView, set?: Readonly<Record<string, number>>) => readonly Finding[];
}

interface CheckDefinition<T extends Readonly<Record<string, Threshold>>> extends CheckTraits {
  readonly thresholds: T;
  readonly find: (view: SpreadView, thresholds: ThresholdValues<T>) => readonly Finding[];
}

/** A check from its rule: set thresholds are held to their ranges, and a value that is no number falls back to the default. */
export function defineCheck<const T extends Readonly<Record<string, Threshold>>>({ find, ...traits }: CheckDefinition<T>): Check {
  const defaults = thresholdValues(traits.thresholds, {});
  return {
    ...traits,
    run: (view, set) => find(view, set ? thresholdValues(traits.thresholds, set) : defaults),
  };
}

function thresholdValues<T extends Readonly<Record<string, Threshold>>>(thresholds: T, set: Readonly<Record<string, number>>): ThresholdValues<T> {
  const values = Object.entries(thresholds).map(([name, threshold]) => {
    const value = set[name];
    const isUsable = value !== undefined && !Number.isNaN(value);
    return [name, isUsable ? clamp(value, threshold.min, threshold.max) : threshold.default];
  });
  return Object.fromEntries(values) as ThresholdValues<T>;
}
