import type { PrintId } from '../model/ids';
import type { Patch } from '../model/patch';
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

/**
 * A command is pure: document in, patch out. An empty patch means that there was nothing to do, or that
 * it cannot be done (off the page, onto another mat); no command ever leaves a faulty document.
 */
export interface Command<Id extends CommandId> {
  readonly id: Id;
  readonly run: (doc: SpreadDocument, args: CommandArgs[Id], context: CommandContext) => Patch;
}
