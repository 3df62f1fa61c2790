import type { PrintId } from '../model/ids';
import type { Print } from '../model/print';
import type { SpreadDocument, TrimSettings } from '../model/spread';
import type { CommandArgs, CommandId } from './calls';

/** What a command may know besides the document. Nothing random or timed happens inside a command. */
export interface CommandContext {
  readonly prints: ReadonlyMap<PrintId, Print>;
  readonly trim: TrimSettings;
  /** Makes a UUID for a new mat or pane group. */
  readonly newId: () => string;
}

/** Why a command does nothing. Words for each stand in `shared/words/en/commands.ts`. */
export const REASONS = [
  'nothing-to-do',
  'no-such-mat',
  'no-such-page',
  'no-such-print',
  'no-such-detail',
  'no-such-group',
  'off-page',
  'onto-another-mat',
  'no-free-place',
  'no-print-there',
  'not-for-prints',
  'content-does-not-fit',
  'has-an-up',
  'not-digital',
  'is-whole',
  'does-not-fit-whole',
  'whole-panes',
  'no-room-for-photo',
  'no-room-for-inner-mat',
  'true-size-too-large',
  'too-few-mats',
  'on-two-pages',
  'not-a-rectangle',
  'too-small-to-split',
  'single-page',
  'still-placed',
  'spread-full',
] as const;
export type Reason = (typeof REASONS)[number];

export interface Refusal {
  readonly refused: Reason;
}

/** What a command wants the document to be, or why it will not do it. */
export type Outcome = SpreadDocument | Refusal;

export const refuse = (refused: Reason): Refusal => ({ refused });

export const isRefusal = (outcome: Outcome): outcome is Refusal => 'refused' in outcome;

/**
 * A command is pure. It says only what the person asked for; `runCommand` settles what follows from it
 * (windows re-fitted, pane groups tidied) and takes the difference, so that no command writes a patch
 * or its own inverse.
 */
export type CommandRun<Id extends CommandId> = (doc: SpreadDocument, args: CommandArgs[Id], context: CommandContext) => Outcome;
