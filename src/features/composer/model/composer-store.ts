import { createStore, type StoreApi } from 'zustand/vanilla';
import type { CommandCall } from '#shared/commands/calls';
import type { CommandContext, Reason } from '#shared/commands/command';
import type { SpreadDetail } from '#shared/contracts/albums';
import type { CheckSetting, CheckSettings } from '#shared/contracts/check-settings';
import type { Edit, LoggedEdit } from '#shared/contracts/edits';
import type { MatId, PrintId } from '#shared/model/ids';
import { applyPatch, touchedKeys, type Patch } from '#shared/model/patch';
import type { Print } from '#shared/model/print';
import type { SpreadDocument, TrimSettings } from '#shared/model/spread';
import type { Unit } from '#shared/words/measure';
import { createAutosave, type AutosaveDeps, type SaveState } from './autosave';
import { applyEdits, describeConflict, resolveConflict, type ConflictView } from './conflict';
import { findDraft, joinDraft } from './draft-offer';
import type { Draft } from './drafts';
import { asList, createGesture, tryCalls, type Gesture, type OpenGesture } from './gesture';
import { EMPTY_HISTORY, forgetKeys, record, stepBack, stepForward, type History, type Step } from './history';

/** What the page tells the composer; each returns nothing and may be called at any time. */
export interface PageListener {
  readonly hide: () => void;
  readonly leave: () => void;
  readonly online: () => void;
  readonly offline: () => void;
}

export interface ComposerDeps extends AutosaveDeps {
  readonly newId: () => string;
  /** Starts listening to the page; the result stops. */
  readonly listenToPage: (listener: PageListener) => () => void;
}

export interface ComposerState {
  /** The document as shown, a gesture's preview included. Saved. */
  readonly doc: SpreadDocument;
  /** From the server; changes by server actions outside undo. */
  readonly prints: ReadonlyMap<PrintId, Print>;
  readonly trim: TrimSettings;
  readonly unit: Unit;
  readonly usedElsewhere: Readonly<Record<PrintId, number>>;
  /** Which spread this is, and of which studio; both for good. */
  readonly spreadId: string;
  readonly studioId: string;
  /** What studio and spread say about checks; from the server, outside undo. */
  readonly checks: CheckSettings;
  readonly mayEdit: boolean;
  /** Chosen mats; dropped with the tab, no part of undo. */
  readonly selection: readonly MatId[];
  readonly save: SaveState;
  /** Unsaved edits of an earlier visit, to be applied or discarded. */
  readonly draft: Draft | null;
  readonly canUndo: boolean;
  readonly canRedo: boolean;
  /** Ids of the commands that undo and redo would take; words in `shared/words`. */
  readonly undoCommand: string | null;
  readonly redoCommand: string | null;

  /** Runs one command, or several as one step. @returns whether anything changed. */
  readonly run: (calls: CommandCall | readonly CommandCall[]) => boolean;
  /** Why the command would do nothing, or null where it would do something. */
  readonly whyNot: (calls: CommandCall | readonly CommandCall[]) => Reason | null;
  readonly beginGesture: () => Gesture;
  readonly undo: () => boolean;
  readonly redo: () => boolean;
  readonly select: (matIds: readonly MatId[]) => void;
  /** Takes in prints that were added or changed on the server. */
  readonly putPrints: (prints: readonly Print[]) => void;
  /** Takes in what the server answers about checks. */
  readonly putChecks: (scope: keyof CheckSettings, settings: readonly CheckSetting[]) => void;
  /** Saves now. @returns whether everything is saved. */
  readonly flush: () => Promise<boolean>;
  /** The server's revision that holds everything saved so far. */
  readonly savedRevision: () => number;
  readonly describeConflict: () => ConflictView | null;
  readonly resolveConflict: (choice: 'mine' | 'theirs') => void;
  /** @returns whether the draft was taken over; false where the server could not be asked. */
  readonly applyDraft: () => Promise<boolean>;
  readonly discardDraft: () => void;
  /** Stops listening and saves what is left. @returns whether everything is saved. */
  readonly close: () => Promise<boolean>;
}

export type ComposerStore = StoreApi<ComposerState>;
export type { Gesture };

/** After these, what was made is chosen. */
const SELECTS_NEW = new Set<string>(['mats.add', 'mats.duplicate']);

/** The open spread: its document, undo, gestures, and what of it is saved. */
export function createComposerStore(detail: SpreadDetail, deps: ComposerDeps): ComposerStore {
  /** The document without any preview. */
  let current: SpreadDocument = detail.document;
  let history: History = EMPTY_HISTORY;
  let gesture: OpenGesture | null = null;
  const tabId = deps.newId();

  const context = (): CommandContext => ({ prints: store.getState().prints, trim: detail.trim, newId: deps.newId });

  const show = (doc: SpreadDocument, change: Partial<ComposerState> = {}): void => {
    const { selection } = store.getState();
    const kept = selection.filter((id) => doc.mats.some((mat) => mat.id === id));
    store.setState({ doc, ...(kept.length < selection.length && { selection: kept }), ...change });
  };

  const undoState = () => ({
    canUndo: history.done.length > 0,
    canRedo: history.undone.length > 0,
    undoCommand: history.done.at(-1)?.command ?? null,
    redoCommand: history.undone.at(-1)?.command ?? null,
  });

  /** Others' edits come in under whatever the hand is doing. */
  const takeMissed = (missed: readonly LoggedEdit[]): void => {
    current = applyEdits(current, missed);
    history = forgetKeys(history, touchedKeys(missed));
    show(current, undoState());
    gesture?.showAgain();
  };

  const autosave = createAutosave({
    spreadId: detail.id,
    tabId,
    base: { doc: detail.document, revision: detail.revision },
    deps,
    onMissed: takeMissed,
    onState: (save) => {
      store.setState({ save });
      // Both sides did the very same: there is nothing to decide.
      if (save.conflict && view()?.differences.length === 0) resolve('theirs');
    },
  });

  const pushEdit = (edit: Omit<Edit, 'id'>, change: Partial<ComposerState> = {}): void => {
    current = applyPatch(current, edit.patch);
    show(current, { ...undoState(), ...change });
    autosave.push({ id: deps.newId(), ...edit });
  };

  const execute = (command: string, patch: Patch): void => {
    history = record(history, { command, patch });
    const added = Object.entries(patch).flatMap(([key, { before }]) => (before === null && key.startsWith('mat/') ? [key.slice(4)] : []));
    pushEdit({ command, patch }, SELECTS_NEW.has(command) ? { selection: added } : {});
  };

  const run = (calls: CommandCall | readonly CommandCall[]): boolean => {
    gesture?.cancel();
    if (!detail.may.edit) return false;
    const trial = tryCalls(current, asList(calls), context());
    if ('refused' in trial) return false;
    execute(trial.command, trial.patch);
    return true;
  };

  const takeStep = (command: 'undo' | 'redo', step: Step | null): boolean => {
    if (!step) return false;
    history = step.history;
    pushEdit({ command, patch: step.patch });
    return true;
  };

  const beginGesture = (): Gesture => {
    gesture?.cancel();
    const begun = createGesture({
      getDoc: () => current,
      tryCalls: (calls) => (detail.may.edit ? tryCalls(current, calls, context()) : { refused: 'nothing-to-do' }),
      show,
      onEnd: (step) => {
        gesture = null;
        if (step) execute(step.command, step.patch);
        else show(current);
      },
    });
    gesture = begun;
    return begun;
  };

  const view = (): ConflictView | null => {
    const { conflict } = store.getState().save;
    return conflict && describeConflict(autosave.getBase().doc, current, conflict);
  };

  const resolve = (choice: 'mine' | 'theirs'): void => {
    const { conflict } = store.getState().save;
    if (!conflict) return;
    gesture?.cancel();
    const resolution = resolveConflict(autosave.getBase().doc, current, conflict, choice);
    const lost = resolution.doc === resolution.theirs ? touchedKeys(autosave.getUnsaved()) : [];
    history = forgetKeys(history, [...lost, ...touchedKeys(conflict.missed)]);
    current = resolution.doc;
    show(current, undoState());
    const isChanged = Object.keys(resolution.patch).length > 0;
    const edits = isChanged ? [{ id: deps.newId(), command: `conflict.${choice}`, patch: resolution.patch }] : [];
    autosave.restart({ doc: resolution.theirs, revision: conflict.revision }, edits, null);
  };

  const lookForDraft = async (): Promise<void> => {
    if (!detail.may.edit) return;
    const draft = await findDraft(detail.id, tabId, deps);
    if (draft) store.setState({ draft });
  };

  const forgetDraft = (draft: Draft): void => {
    deps.drafts.clear(draft.spreadId, draft.tabId);
    store.setState({ draft: null });
  };

  const applyDraft = async (): Promise<boolean> => {
    const { draft } = store.getState();
    if (!draft || !(await autosave.flush())) return false;
    const log = await deps.getEdits(detail.id, draft.baseRevision).catch(() => null);
    if (!log) return false;
    const joined = joinDraft(autosave.getBase(), draft, log);
    for (const { command, patch } of joined.edits) history = record(history, { command, patch });
    current = applyEdits(joined.base.doc, joined.edits);
    show(current, undoState());
    autosave.restart(joined.base, joined.edits, joined.conflict);
    forgetDraft(draft);
    void lookForDraft();
    return true;
  };

  const stopListening = deps.listenToPage(autosave);

  const store = createStore<ComposerState>()((set, get) => ({
    doc: detail.document,
    prints: new Map(detail.prints.map((print) => [print.id, print])),
    trim: detail.trim,
    unit: detail.unit,
    usedElsewhere: detail.usedElsewhere,
    spreadId: detail.id,
    studioId: detail.studioId,
    checks: detail.checks,
    mayEdit: detail.may.edit,
    selection: [],
    save: { status: 'saved', at: null, failure: null, conflict: null, isKept: true },
    draft: null,
    ...undoState(),
    run,
    whyNot: (calls) => {
      const trial = tryCalls(current, asList(calls), context());
      return 'refused' in trial ? trial.refused : null;
    },
    beginGesture,
    undo: () => {
      gesture?.cancel();
      return takeStep('undo', stepBack(history, current));
    },
    redo: () => {
      gesture?.cancel();
      return takeStep('redo', stepForward(history, current));
    },
    select: (matIds) => set({ selection: matIds.filter((id) => get().doc.mats.some((mat) => mat.id === id)) }),
    putChecks: (scope, settings) => set({ checks: { ...get().checks, [scope]: settings } }),
    putPrints: (prints) => set({ prints: new Map([...get().prints, ...prints.map((print) => [print.id, print] as const)]) }),
    flush: autosave.flush,
    savedRevision: () => autosave.getBase().revision,
    describeConflict: view,
    resolveConflict: resolve,
    applyDraft,
    discardDraft: () => {
      const { draft } = get();
      if (draft) forgetDraft(draft);
      void lookForDraft();
    },
    close: () => {
      gesture?.cancel();
      stopListening();
      return autosave.flush().finally(autosave.stop);
    },
  }));
  void lookForDraft();
  return store;
}
