import type { CommandArgs } from '#shared/commands/calls';
import type { PlaceInput, SchemeWishes } from '#shared/colour/schemes';
import type { PlacedScheme } from '#shared/colour/suggest-placed';
import type { Scheme } from '#shared/model/spread';
import { createSchemeAnswers } from './answer-schemes';
import type { SchemeAnswer, SchemeRequest } from './scheme-messages';

/** Schemes, worked out beside the page, so that no drag waits for them. */
export interface SchemeClient {
  readonly suggest: (input: PlaceInput, wishes: SchemeWishes) => Promise<PlacedScheme[]>;
  readonly place: (input: PlaceInput, scheme: Scheme) => Promise<CommandArgs['scheme.apply']>;
  /** Ends the worker; what is still asked is never answered. */
  readonly close: () => void;
}

interface Port {
  send(request: SchemeRequest): void;
  close(): void;
}

/** Uses a worker, or the same pure functions on this thread where there is none or it cannot be started. */
export function createSchemeClient(): SchemeClient {
  const waiting = new Map<number, (answer: SchemeAnswer) => void>();
  const unanswered = new Map<number, SchemeRequest>();
  let sentPrints: PlaceInput['prints'] | null = null;
  let lastId = 0;
  const take = (answer: SchemeAnswer): void => {
    unanswered.delete(answer.id);
    waiting.get(answer.id)?.(answer);
    waiting.delete(answer.id);
  };
  const fallBack = (): void => {
    port = hereAndNow(take);
    if (sentPrints) port.send({ kind: 'prints', prints: sentPrints });
    for (const request of [...unanswered.values()]) port.send(request);
  };
  let port: Port = typeof Worker === 'undefined' ? hereAndNow(take) : workerPort(take, fallBack);
  const ask = <Kind extends SchemeAnswer['kind']>(input: PlaceInput, request: (id: number) => SchemeRequest): Promise<Extract<SchemeAnswer, { kind: Kind }>> => {
    if (input.prints !== sentPrints) {
      sentPrints = input.prints;
      port.send({ kind: 'prints', prints: input.prints });
    }
    const id = (lastId += 1);
    return new Promise((resolve) => {
      waiting.set(id, (answer) => resolve(answer as Extract<SchemeAnswer, { kind: Kind }>));
      unanswered.set(id, request(id));
      port.send(request(id));
    });
  };
  return {
    suggest: async ({ doc, prints, trim }, wishes) => (await ask<'suggested'>({ doc, prints, trim }, (id) => ({ kind: 'suggest', id, doc, trim, wishes }))).schemes,
    place: async ({ doc, prints, trim }, scheme) => (await ask<'placed'>({ doc, prints, trim }, (id) => ({ kind: 'place', id, doc, trim, scheme }))).args,
    close: () => port.close(),
  };
}

function hereAndNow(take: (answer: SchemeAnswer) => void): Port {
  const answer = createSchemeAnswers();
  return {
    send: (request) => {
      const given = answer(request);
      if (given) take(given);
    },
    close: () => undefined,
  };
}

function workerPort(take: (answer: SchemeAnswer) => void, onFail: () => void): Port {
  const worker = new Worker(new URL('./scheme-worker.ts', import.meta.url), { type: 'module', name: 'schemes' });
  worker.onmessage = ({ data }: MessageEvent<SchemeAnswer>) => take(data);
  worker.onerror = () => {
    worker.terminate();
    onFail();
  };
  return { send: (request) => worker.postMessage(request), close: () => worker.terminate() };
}
