import type { CommandCall } from '#shared/commands/calls';
import type { CommandContext, Reason } from '#shared/commands/command';
import { tryCommand } from '#shared/commands/run-command';
import { applyPatch, composePatches, type Patch } from '#shared/model/patch';
import type { SpreadDocument } from '#shared/model/spread';

/** What several commands, one after the other, do as one step. */
export interface Trial {
  readonly doc: SpreadDocument;
  readonly command: string;
  readonly patch: Patch;
}

/**
 * Runs commands one after the other as one step. The step is called after the first that does something;
 * a command with nothing to do is passed over, and one that cannot be done refuses the whole step.
 */
export function tryCalls(doc: SpreadDocument, calls: readonly CommandCall[], context: CommandContext): Trial | { readonly refused: Reason } {
  let trial: Trial = { doc, command: '', patch: {} };
  for (const call of calls) {
    const result = tryCommand(trial.doc, call, context);
    if (result.reason === 'nothing-to-do') continue;
    if (result.reason !== null) return { refused: result.reason };
    trial = {
      doc: applyPatch(trial.doc, result.patch),
      command: trial.command || call.id,
      patch: composePatches(trial.patch, result.patch),
    };
  }
  return Object.keys(trial.patch).length > 0 ? trial : { refused: 'nothing-to-do' };
}


export const asList = (calls: CommandCall | readonly CommandCall[]): readonly CommandCall[] => ('id' in calls ? [calls] : calls);

/** A drag or resize: every preview starts from where the hand came down, then one undo step or none. */
export interface Gesture {
  /** Shows what the calls would do; no calls show the start. @returns whether they can be done. */
  readonly preview: (calls: CommandCall | readonly CommandCall[]) => boolean;
  /** @returns whether a step was made. */
  readonly commit: () => boolean;
  readonly cancel: () => void;
}

export interface OpenGesture extends Gesture {
  /** The document under the hand changed (others' edits came in): previews the latest calls on it. */
  readonly showAgain: () => void;
}

interface GestureHost {
  readonly getDoc: () => SpreadDocument;
  readonly tryCalls: (calls: readonly CommandCall[]) => Trial | { readonly refused: Reason };
  readonly show: (doc: SpreadDocument) => void;
  /** Once, with the step that the hand made or null. */
  readonly onEnd: (step: Trial | null) => void;
}

/** Refused previews of these leave the mat at the last place that it could have, as a hand would feel an edge. */
const HOLDS: ReadonlySet<string> = new Set<CommandCall['id']>(['mats.move', 'mats.resize']);

export function createGesture({ getDoc, tryCalls: tryOn, show, onEnd }: GestureHost): OpenGesture {
  let latest: readonly CommandCall[] = [];
  let trial: Trial | null = null;
  let isOver = false;

  const backToStart = (): void => {
    [trial, latest] = [null, []];
    show(getDoc());
  };
  const preview = (calls: readonly CommandCall[]): boolean => {
    const tried = tryOn(calls);
    if (!('refused' in tried)) {
      [trial, latest] = [tried, calls];
      show(tried.doc);
      return true;
    }
    const holds = tried.refused !== 'nothing-to-do' && calls.every(({ id }) => HOLDS.has(id));
    if (!holds) backToStart();
    return false;
  };
  const end = (step: Trial | null): boolean => {
    if (isOver) return false;
    isOver = true;
    onEnd(step);
    return step !== null;
  };
  return {
    preview: (calls) => !isOver && preview(asList(calls)),
    commit: () => end(trial),
    cancel: () => void end(null),
    showAgain: () => {
      const calls = latest;
      // What was tried on the old document must not be committed on the new one.
      backToStart();
      preview(calls);
    },
  };
}
