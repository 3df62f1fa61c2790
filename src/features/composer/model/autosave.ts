import { staleSpreadSchema, type Edit, type LoggedEdit, type PostEdits, type PostEditsResponse, type StaleSpread } from '#shared/contracts/edits';
import { applyPatch, touchedByBoth } from '#shared/model/patch';
import type { SpreadDocument } from '#shared/model/spread';
import { utf8Length } from '#shared/model/utf8-length';
import { foreignEdits } from './conflict';
import type { DraftStore } from './drafts';

/**
 * `saved`: the server has everything. `dirty`: edits wait for the next save. `saving`: a save is on its way.
 * `offline`: no answer; it is tried again by itself. `failed`: refused for another reason, with its code.
 * `conflict`: others changed the same things; the person decides before anything is overwritten.
 */
export type SaveStatus = 'saved' | 'dirty' | 'saving' | 'offline' | 'failed' | 'conflict';

export interface SaveState {
  readonly status: SaveStatus;
  /** Time of the last save in this tab. */
  readonly at: string | null;
  /** The error's code while `failed`, and the server's sentence where it gave one. */
  readonly failure: { readonly code: string; readonly detail: string | null } | null;
  readonly conflict: StaleSpread | null;
  /** False where the browser would not keep unsaved edits, so that closing the tab would lose them. */
  readonly isKept: boolean;
}

export interface Clock {
  /** ISO time. */
  readonly now: () => string;
  /** Calls back once; the result cancels. */
  readonly after: (delayMs: number, callback: () => void) => () => void;
}

export interface AutosaveDeps {
  /** Throws an error with a `code` (and `data`) for a refusal, or a TypeError where no answer came. */
  readonly postEdits: (spreadId: string, body: PostEdits, options?: { readonly keepalive?: boolean }) => Promise<PostEditsResponse>;
  /** The log after a revision, in order. */
  readonly getEdits: (spreadId: string, afterRevision: number) => Promise<readonly LoggedEdit[]>;
  readonly drafts: DraftStore;
  readonly clock: Clock;
}

/** The document as the server last confirmed it. */
export interface Base {
  readonly doc: SpreadDocument;
  readonly revision: number;
}

interface AutosaveOptions {
  readonly spreadId: string;
  readonly tabId: string;
  readonly base: Base;
  readonly deps: AutosaveDeps;
  readonly onState: (state: SaveState) => void;
  /** Edits by others that touch nothing of this tab's unsaved ones. */
  readonly onMissed: (missed: readonly LoggedEdit[]) => void;
}

const DEBOUNCE_MS = 600;
const BACK_OFF_MS = [1_000, 2_000, 4_000, 8_000, 15_000, 30_000] as const;
const MAX_EDITS_PER_POST = 100;
const MAX_POST_BYTES = 200_000;
/** Browsers refuse a keepalive request over 64 KiB (Fetch standard); the rest is room for headers. */
const MAX_KEEPALIVE_BYTES = 60_000;

/** Sends edits in order, one save in flight, and keeps in the browser whatever is not confirmed yet. */
export function createAutosave({ spreadId, tabId, base: startBase, deps, onState, onMissed }: AutosaveOptions) {
  let base = startBase;
  let queue: readonly Edit[] = [];
  let inFlight: Promise<void> | null = null;
  let failures = 0;
  let isStopped = false;
  let cancelTimer: () => void = () => undefined;
  let state: SaveState = { status: 'saved', at: null, failure: null, conflict: null, isKept: true };

  const set = (change: Partial<SaveState>): void => {
    state = { ...state, failure: null, ...change };
    onState(state);
  };

  /** @returns whether the browser holds everything that the server does not. */
  const keep = (): boolean => {
    if (queue.length > 0) return deps.drafts.write({ spreadId, tabId, baseRevision: base.revision, edits: [...queue], at: deps.clock.now() });
    deps.drafts.clear(spreadId, tabId);
    return true;
  };

  const schedule = (delayMs: number): void => {
    cancelTimer();
    if (!isStopped) cancelTimer = deps.clock.after(delayMs, () => void send());
  };

  function send(keepalive = false): Promise<void> {
    if (!inFlight && queue.length > 0 && !state.conflict && !isStopped) {
      cancelTimer();
      inFlight = post(nextBatch(queue), keepalive).finally(() => {
        inFlight = null;
      });
    }
    return inFlight ?? Promise.resolve();
  }

  async function post(batch: readonly Edit[], keepalive: boolean): Promise<void> {
    set({ status: 'saving' });
    const body: PostEdits = { baseRevision: base.revision, edits: [...batch] };
    try {
      const answer = await deps.postEdits(spreadId, body, { keepalive: keepalive && bytesOf(body) <= MAX_KEEPALIVE_BYTES });
      confirm(batch, answer);
    } catch (error) {
      await fail(error);
    }
  }

  function confirm(batch: readonly Edit[], { revision, missed }: PostEditsResponse): void {
    failures = 0;
    queue = queue.slice(batch.length);
    const foreign = foreignEdits(missed, batch);
    const saved = batch.reduce((doc, { patch }) => applyPatch(doc, patch), base.doc);
    const keys = touchedByBoth(queue, foreign);
    if (keys.length > 0) {
      base = { doc: saved, revision: base.revision };
      set({ status: 'conflict', conflict: { revision, keys, missed: [...foreign] }, isKept: keep(), at: deps.clock.now() });
      return;
    }
    base = { doc: foreign.reduce((doc, { patch }) => applyPatch(doc, patch), saved), revision };
    if (foreign.length > 0) onMissed(foreign);
    set({ status: queue.length > 0 ? 'dirty' : 'saved', isKept: keep(), at: deps.clock.now() });
    if (queue.length > 0) schedule(DEBOUNCE_MS);
  }

  async function fail(error: unknown): Promise<void> {
    const { code, data, detail } = readError(error);
    if (code === 'unavailable' || code === 'too-many-requests') {
      set({ status: 'offline' });
      schedule(BACK_OFF_MS[Math.min(failures, BACK_OFF_MS.length - 1)]!);
      failures += 1;
      return;
    }
    // A refused document is somebody else's doing where they changed it meanwhile: each half was sound, both together are not.
    const stale = code === 'stale-revision' || code === 'document-refused' ? await whatChanged(data) : null;
    if (stale) set({ status: 'conflict', conflict: stale });
    else set({ status: 'failed', failure: { code, detail } });
  }

  async function whatChanged(data: unknown): Promise<StaleSpread | null> {
    const told = staleSpreadSchema.safeParse(data);
    if (told.success && told.data.missed.length > 0) return told.data;
    const log = await deps.getEdits(spreadId, base.revision).catch(() => []);
    const missed = foreignEdits(log, queue);
    const last = missed.at(-1);
    return last ? { revision: last.revision, keys: touchedByBoth(queue, missed), missed: [...missed] } : null;
  }

  return {
    getBase: (): Base => base,
    getUnsaved: (): readonly Edit[] => queue,

    /** Takes one more edit. It is in the browser's keeping before this returns. */
    push(edit: Edit): void {
      queue = [...queue, edit];
      const isKept = keep();
      if (state.conflict) return set({ isKept });
      set({ status: state.status === 'saving' || state.status === 'offline' ? state.status : 'dirty', isKept });
      if (state.status === 'dirty') schedule(DEBOUNCE_MS);
    },

    /** Saves now. @returns whether everything is saved. */
    async flush(): Promise<boolean> {
      do await send();
      while (queue.length > 0 && state.status === 'dirty');
      return queue.length === 0;
    },

    /** The tab went to the background and may be dropped at any time: saves now, in a request that outlives it. */
    hide: (): void => void send(true),

    /** The page goes away. A save on its way may be cut off, so all is sent again; the server knows repeats by their ids. */
    leave(): void {
      if (!inFlight) return void send(true);
      const body: PostEdits = { baseRevision: base.revision, edits: queue.slice(0, MAX_EDITS_PER_POST) };
      if (queue.length === 0 || bytesOf(body) > MAX_KEEPALIVE_BYTES) return;
      // Nobody is left to hear the answer; what fails is offered again from the browser's keeping.
      deps.postEdits(spreadId, body, { keepalive: true }).catch(() => undefined);
    },

    /** The network is back. */
    online(): void {
      failures = 0;
      if (state.status === 'offline') void send();
    },

    offline(): void {
      if (state.status === 'dirty') set({ status: 'offline' });
    },

    /** Starts again from another base, with other unsaved edits: after a conflict, or from a draft. */
    restart(nextBase: Base, unsaved: readonly Edit[], conflict: StaleSpread | null): void {
      base = nextBase;
      queue = unsaved;
      const isKept = keep();
      const waiting = queue.length > 0 ? 'dirty' : 'saved';
      set({ status: conflict ? 'conflict' : waiting, conflict, isKept });
      if (!conflict && queue.length > 0) schedule(0);
    },

    stop(): void {
      isStopped = true;
      cancelTimer();
    },
  };
}

const bytesOf = (body: PostEdits): number => utf8Length(JSON.stringify(body));

/** As many edits from the front as one request may hold; always one. */
function nextBatch(queue: readonly Edit[]): Edit[] {
  const batch: Edit[] = [];
  let bytes = 0;
  for (const edit of queue.slice(0, MAX_EDITS_PER_POST)) {
    bytes += utf8Length(JSON.stringify(edit));
    if (batch.length > 0 && bytes > MAX_POST_BYTES) break;
    batch.push(edit);
  }
  return batch;
}

interface ReadError {
  readonly code: string;
  readonly data: unknown;
  readonly detail: string | null;
}

/** Fetch rejects with a TypeError where no answer came; everything else that has no code is a bug. */
function readError(error: unknown): ReadError {
  if (error instanceof TypeError) return { code: 'unavailable', data: null, detail: null };
  if (typeof error !== 'object' || error === null || !('code' in error)) return { code: 'bug', data: null, detail: null };
  const detail = 'detail' in error && typeof error.detail === 'string' ? error.detail : null;
  return { code: String(error.code), data: 'data' in error ? error.data : null, detail };
}
