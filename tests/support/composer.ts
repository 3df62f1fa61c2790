import type { SpreadDetail } from '#shared/contracts/albums';
import type { Edit, LoggedEdit, PostEdits, PostEditsResponse } from '#shared/contracts/edits';
import { findDocumentFaults } from '#shared/model/document-faults';
import { applyPatch, type Patch } from '#shared/model/patch';
import type { Print } from '#shared/model/print';
import type { SpreadDocument } from '#shared/model/spread';
import { TRIM_SETTINGS_INCH } from '#shared/model/trim-settings';
import type { Clock } from '@/features/composer/model/autosave';
import { createComposerStore, type ComposerStore, type PageListener } from '@/features/composer/model/composer-store';
import { storedDrafts, type DraftStore } from '@/features/composer/model/drafts';
import { buildSpread, idOf } from './builders';

export const SPREAD_ID = idOf(1, 20);
const AT = '2026-03-01T09:00:00.000Z';

class Refused extends Error {
  constructor(
    readonly code: string,
    readonly data: unknown = {},
  ) {
    super(code);
  }
}

/** A spread on a server that merges, refuses and repeats as MODEL.md 7 says, held in memory. */
export class FakeServer {
  readonly log: LoggedEdit[] = [];
  readonly posts: { readonly body: PostEdits; readonly keepalive: boolean }[] = [];
  /** What happens to the next posts: no answer at all, an answer that gets lost after the work was done, or a refusal. */
  next: ('no-answer' | 'lost-answer' | { readonly refuse: string })[] = [];
  revision = 1;

  constructor(public doc: SpreadDocument) {}

  /** Somebody else's edit, straight into the log. */
  otherEdit(patch: Patch, userName = 'Ines'): void {
    this.append({ id: idOf(this.log.length + 1, 30), command: 'mats.move', patch }, userName);
  }

  post = async (_spreadId: string, body: PostEdits, options?: { readonly keepalive?: boolean }): Promise<PostEditsResponse> => {
    this.posts.push({ body: JSON.parse(JSON.stringify(body)) as PostEdits, keepalive: options?.keepalive ?? false });
    const fate = this.next.shift();
    if (fate === 'no-answer') throw new TypeError('Failed to fetch');
    if (typeof fate === 'object') throw new Refused(fate.refuse, {});
    const answer = this.accept(body);
    if (fate === 'lost-answer') throw new TypeError('Failed to fetch');
    return answer;
  };

  getEdits = async (_spreadId: string, after: number): Promise<readonly LoggedEdit[]> => this.log.filter((edit) => edit.revision > after);

  private accept(body: PostEdits): PostEditsResponse {
    const ids = body.edits.map(({ id }) => id);
    const missed = this.log.filter((edit) => edit.revision > body.baseRevision && !ids.includes(edit.id));
    const fresh = body.edits.filter(({ id }) => !this.log.some((edit) => edit.id === id));
    const touched = new Set(missed.flatMap(({ patch }) => Object.keys(patch)));
    const keys = fresh.flatMap(({ patch }) => Object.keys(patch)).filter((key) => touched.has(key));
    if (keys.length > 0) throw new Refused('stale-revision', { revision: this.revision, keys, missed });
    const doc = fresh.reduce((next, { patch }) => applyPatch(next, patch), this.doc);
    const faults = findDocumentFaults(doc);
    if (faults.length > 0) throw new Refused('document-refused', { faults });
    for (const edit of fresh) this.append(edit, 'Me');
    return { revision: this.revision, missed };
  }

  private append(edit: Edit, userName: string): void {
    this.revision += 1;
    this.doc = applyPatch(this.doc, edit.patch);
    this.log.push({ ...edit, revision: this.revision, userId: idOf(userName.length, 31), userName, at: AT });
  }
}

/** Time that passes only when a test says so. */
export class FakeClock implements Clock {
  private time = Date.parse(AT);
  private waiting: { readonly at: number; readonly callback: () => void }[] = [];

  now = (): string => new Date(this.time).toISOString();

  after = (delayMs: number, callback: () => void): (() => void) => {
    const entry = { at: this.time + delayMs, callback };
    this.waiting.push(entry);
    return () => {
      this.waiting = this.waiting.filter((other) => other !== entry);
    };
  };

  /** Lets time pass, and everything that waits for promises meanwhile. */
  async pass(ms: number): Promise<void> {
    const end = this.time + ms;
    for (;;) {
      await settled();
      const due = this.waiting.filter(({ at }) => at <= end).sort((a, b) => a.at - b.at)[0];
      if (!due) break;
      this.time = due.at;
      this.waiting = this.waiting.filter((other) => other !== due);
      due.callback();
    }
    this.time = end;
  }
}

/** Until every promise that waits on nothing but others is done. */
export const settled = (): Promise<void> => new Promise((resolve) => setTimeout(resolve, 0));

export const memoryStorage = (): Storage => {
  const entries = new Map<string, string>();
  return {
    get length() {
      return entries.size;
    },
    clear: () => entries.clear(),
    getItem: (key) => entries.get(key) ?? null,
    key: (i) => [...entries.keys()][i] ?? null,
    removeItem: (key) => void entries.delete(key),
    setItem: (key, value) => void entries.set(key, value),
  };
};

let opened = 0;

export interface Tab {
  readonly store: ComposerStore;
  readonly server: FakeServer;
  readonly clock: FakeClock;
  readonly drafts: DraftStore;
  readonly page: PageListener;
}

interface TabParts {
  readonly doc?: SpreadDocument;
  readonly prints?: readonly Print[];
  readonly server?: FakeServer;
  readonly storage?: Storage;
  readonly mayEdit?: boolean;
}

/** A spread open in one browser tab. Tabs of the same test share a server, and a browser where `storage` is shared. */
export function openTab({ doc = buildSpread(), prints = [], server = new FakeServer(doc), storage = memoryStorage(), mayEdit = true }: TabParts = {}): Tab {
  const clock = new FakeClock();
  const drafts = storedDrafts(() => storage);
  const space = 100 + (opened += 1);
  let ids = 0;
  let page: PageListener | null = null;
  const store = createComposerStore(buildDetail(server, prints, mayEdit), {
    postEdits: server.post,
    getEdits: server.getEdits,
    drafts,
    clock,
    newId: () => idOf((ids += 1), space),
    listenToPage: (listener) => {
      page = listener;
      return () => undefined;
    },
  });
  return { store, server, clock, drafts, page: page! };
}

const buildDetail = (server: FakeServer, prints: readonly Print[], mayEdit: boolean): SpreadDetail => ({
  id: SPREAD_ID,
  albumId: idOf(1, 21),
  studioId: idOf(1, 9),
  title: 'Harbour day',
  position: 0,
  state: 'draft',
  revision: server.revision,
  updatedAt: AT,
  binned: false,
  document: server.doc,
  albumTitle: 'Summer by the water',
  studioName: 'Kitchen table',
  unit: 'in',
  trim: TRIM_SETTINGS_INCH,
  prints: [...prints] as SpreadDetail['prints'],
  usedElsewhere: {},
  checks: { studio: [], spread: [] },
  may: { edit: mayEdit, comment: true, export: true },
});
