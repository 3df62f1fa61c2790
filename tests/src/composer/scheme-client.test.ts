import { afterEach, describe, expect, it, vi } from 'vitest';
import { suggestPlaced } from '#shared/colour/suggest-placed';
import { TRIM_SETTINGS_INCH } from '#shared/model/trim-settings';
import { createSchemeAnswers } from '@/features/composer/workers/answer-schemes';
import { createSchemeClient } from '@/features/composer/workers/scheme-client';
import type { SchemeRequest } from '@/features/composer/workers/scheme-messages';
import { buildMat, buildPrint, buildSpread, printContent, printsById } from '../../support/builders';

const print = buildPrint();
const doc = buildSpread({ mats: [buildMat({ content: printContent(print) })] });
const input = { doc, prints: printsById([print]), trim: TRIM_SETTINGS_INCH };

/** A worker that answers as the real one does, over cloned messages, until it breaks. */
class FakeWorker {
  static started: FakeWorker[] = [];
  static breaks = false;
  readonly received: SchemeRequest[] = [];
  isEnded = false;
  onmessage: ((event: { data: unknown }) => void) | null = null;
  onerror: (() => void) | null = null;
  private readonly answer = createSchemeAnswers();
  constructor() {
    FakeWorker.started.push(this);
  }
  postMessage(message: SchemeRequest): void {
    const request = structuredClone(message);
    this.received.push(request);
    queueMicrotask(() => {
      if (FakeWorker.breaks) return this.onerror?.();
      const given = this.answer(request);
      if (given) this.onmessage?.({ data: structuredClone(given) });
    });
  }
  terminate(): void {
    this.isEnded = true;
  }
}

afterEach(() => {
  vi.unstubAllGlobals();
  FakeWorker.started = [];
  FakeWorker.breaks = false;
});

describe('the scheme client', () => {
  it('gives from a worker what the pure function gives, and sends prints only when they change', async () => {
    vi.stubGlobal('Worker', FakeWorker);
    const client = createSchemeClient();
    const suggested = await client.suggest(input, {});
    expect(suggested).toEqual(suggestPlaced(input));
    expect(await client.place(input, suggested[0]!.scheme)).toEqual(suggested[0]!.args);
    const [worker] = FakeWorker.started;
    expect(worker!.received.map(({ kind }) => kind)).toEqual(['prints', 'suggest', 'place']);
    await client.suggest({ ...input, prints: printsById([print]) }, {});
    expect(worker!.received.map(({ kind }) => kind).slice(3)).toEqual(['prints', 'suggest']);
    client.close();
    expect(worker!.isEnded).toBe(true);
  });

  it('answers on this thread what a worker that breaks has left unanswered', async () => {
    vi.stubGlobal('Worker', FakeWorker);
    FakeWorker.breaks = true;
    const client = createSchemeClient();
    expect(await client.suggest(input, {})).toEqual(suggestPlaced(input));
    expect(FakeWorker.started[0]!.isEnded).toBe(true);
    expect(await client.suggest(input, { withSkin: true })).toEqual(suggestPlaced(input, { withSkin: true }));
  });
});
