import { createStore, type StoreApi } from 'zustand/vanilla';
import { MAX_FILES_AT_ONCE, MAX_UPLOAD_BYTES, type UploadedPrint } from '#shared/contracts/prints';

/** One file on its way in. */
export interface Arrival {
  /** Also the id that its print will have, so that sending it twice makes one print. */
  readonly id: string;
  readonly name: string;
  readonly state: 'waiting' | 'sending' | 'reading' | 'arrived' | 'known' | 'refused' | 'unsent';
  /** Share of the bytes sent, 0 to 1. */
  readonly share: number;
  /** Why it was refused, in one sentence for people. */
  readonly reason: string | null;
  readonly printId: string | null;
}

export interface UploadQueueDeps {
  readonly send: (file: File, id: string, pileId: string | null, onProgress: (share: number) => void) => Promise<UploadedPrint>;
  readonly makeId: () => string;
  readonly onArrived: () => void;
  /** The sentence of a failed request, and whether sending again may help. */
  readonly explain: (error: unknown) => { readonly reason: string; readonly mayRetry: boolean };
}

export interface UploadQueueState {
  readonly arrivals: readonly Arrival[];
  readonly add: (files: readonly File[], pileId: string | null) => void;
  readonly retry: (id: string) => void;
  /** Takes everything that is settled off the list. */
  readonly clear: () => void;
}

/** Requests in flight at a time: enough to fill a home line, few enough for the server's one picture worker. */
const AT_A_TIME = 3;

/** A file's name as it may be shown: without control characters and marks that turn the reading direction. */
export const shownName = (name: string): string =>
  name.replace(/[\p{Cc}\u200e\u200f\u202a-\u202e\u2066-\u2069]/gu, '').trim() || 'A file without a name';

const MEGABYTE = 1024 * 1024;

/** What is wrong with a file before it is even sent, or null. The server has the last word on all others. */
export function refusalBeforeSending(file: Pick<File, 'size'>, index: number): string | null {
  if (index >= MAX_FILES_AT_ONCE) return `Only ${MAX_FILES_AT_ONCE} files go up at a time: send this one when the others are in.`;
  if (file.size === 0) return 'The file is empty: choose the photograph itself, or copy it again from where it came.';
  if (file.size > MAX_UPLOAD_BYTES) {
    return `The file has ${Math.ceil(file.size / MEGABYTE)} MB and the limit is ${MAX_UPLOAD_BYTES / MEGABYTE} MB: save it as a JPEG and send that.`;
  }
  return null;
}

export const isSettled = ({ state }: Arrival): boolean => state === 'arrived' || state === 'known' || state === 'refused' || state === 'unsent';

/** Sends files a few at a time; each has its own progress and its own result, and none holds up another. */
export function createUploadQueue({ send, makeId, onArrived, explain }: UploadQueueDeps): StoreApi<UploadQueueState> {
  const files = new Map<string, { readonly file: File; readonly pileId: string | null }>();
  let inFlight = 0;

  const store = createStore<UploadQueueState>()((set, get) => {
    const update = (id: string, change: Partial<Arrival>): void =>
      set(({ arrivals }) => ({ arrivals: arrivals.map((arrival) => (arrival.id === id ? { ...arrival, ...change } : arrival)) }));

    const run = async (id: string): Promise<void> => {
      const waiting = files.get(id);
      if (waiting === undefined) return;
      inFlight += 1;
      update(id, { state: 'sending', share: 0, reason: null });
      try {
        const { print, known } = await send(waiting.file, id, waiting.pileId, (share) =>
          update(id, { share, state: share >= 1 ? 'reading' : 'sending' }),
        );
        files.delete(id);
        update(id, { state: known ? 'known' : 'arrived', share: 1, printId: print.id });
        onArrived();
      } catch (error) {
        const { reason, mayRetry } = explain(error);
        if (!mayRetry) files.delete(id);
        update(id, { state: mayRetry ? 'unsent' : 'refused', reason });
      } finally {
        inFlight -= 1;
        fill();
      }
    };

    const fill = (): void => {
      for (const { id, state } of get().arrivals) {
        if (inFlight >= AT_A_TIME) return;
        if (state === 'waiting') void run(id);
      }
    };

    return {
      arrivals: [],
      add: (added, pileId) => {
        const underWay = get().arrivals.filter((arrival) => !isSettled(arrival)).length;
        const arrivals = added.map((file, index): Arrival => {
          const reason = refusalBeforeSending(file, underWay + index);
          const id = makeId();
          if (reason === null) files.set(id, { file, pileId });
          return { id, name: shownName(file.name), state: reason === null ? 'waiting' : 'refused', share: 0, reason, printId: null };
        });
        set({ arrivals: [...get().arrivals, ...arrivals] });
        fill();
      },
      retry: (id) => {
        update(id, { state: 'waiting', reason: null });
        fill();
      },
      clear: () => {
        for (const arrival of get().arrivals) if (isSettled(arrival)) files.delete(arrival.id);
        set({ arrivals: get().arrivals.filter((arrival) => !isSettled(arrival)) });
      },
    };
  });
  return store;
}
