import { randomUUID } from 'node:crypto';
import { setTimeout as sleep } from 'node:timers/promises';
import { z } from 'zod';
import { healthSchema, sessionSchema } from '#shared/contracts/accounts';
import { albumListSchema, spreadListSchema } from '#shared/contracts/albums';
import { jobSchema } from '#shared/contracts/exports';
import { startApp, type AppProcess } from '../support/app-process';
import type { BenchRow } from './bench';
import { percentile, timed } from './timing';

const IDLE_CALLS = 300;
/** Between calls, as a person's own actions come. */
const PAUSE_MS = 10;
const FORMATS = ['png', 'jpeg'] as const;

type Ask = <T>(path: string, schema: z.ZodType<T>, body?: unknown) => Promise<T>;

/** Signs in as the demo's owner. */
async function signedIn({ url }: AppProcess): Promise<Ask> {
  let cookie = '';
  const ask: Ask = async (path, schema, body) => {
    const headers = { cookie, ...(body !== undefined && { 'content-type': 'application/json' }) };
    const init = body === undefined ? { headers } : { method: 'POST', headers, body: JSON.stringify(body) };
    const response = await fetch(`${url}/api${path}`, init);
    if (!response.ok) throw new Error(`${path} answered ${response.status}: ${await response.text()}`);
    const set = response.headers.getSetCookie();
    if (set.length > 0) cookie = set.map((line) => line.split(';')[0]).join('; ');
    return schema.parse(await response.json());
  };
  const { demoAccounts = [] } = await ask('/health', healthSchema);
  const owner = demoAccounts.find(({ role }) => role === 'owner');
  if (!owner) throw new Error('The demo has no owner');
  await ask('/session', sessionSchema, { email: owner.email, password: owner.password });
  return ask;
}

/** The spread that shows the most. */
async function fullestSpread(ask: Ask): Promise<{ id: string; revision: number }> {
  const { studios } = await ask('/session', sessionSchema);
  const { albums } = await ask(`/studios/${studios[0]!.id}/albums`, albumListSchema);
  const { spreads } = await ask(`/albums/${albums[0]!.id}/spreads`, spreadListSchema);
  return spreads.reduce((best, spread) => (spread.document.mats.length > best.document.mats.length ? spread : best));
}

/** How long a person waits for a spread to open: while nothing else happens, and while two exports are under way. */
export async function rows(): Promise<BenchRow[]> {
  const app = await startApp();
  try {
    const ask = await signedIn(app);
    const spread = await fullestSpread(ask);
    const call = async (): Promise<number> => {
      const took = await timed(() => ask(`/spreads/${spread.id}`, z.looseObject({ id: z.uuid() })));
      await sleep(PAUSE_MS);
      return took;
    };
    const idle: number[] = [];
    for (let i = 0; i < IDLE_CALLS; i += 1) idle.push(await call());

    const requests = FORMATS.map((format) => ({ id: randomUUID(), format, size: 'print', revision: spread.revision }));
    await Promise.all(requests.map((body) => ask(`/spreads/${spread.id}/exports`, jobSchema, body)));
    const busy: number[] = [];
    for (let areDone = false; !areDone; ) {
      for (let i = 0; i < 10; i += 1) busy.push(await call());
      const jobs = await Promise.all(requests.map(({ id }) => ask(`/jobs/${id}`, jobSchema)));
      const failed = jobs.find(({ state }) => state === 'failed');
      if (failed) throw new Error(`An export failed: ${failed.failure ?? ''}`);
      areDone = jobs.every(({ state }) => state === 'done');
    }
    const [value, floor] = [percentile(busy, 0.95), percentile(idle, 0.95)];
    return [{ id: 'export.load.api-p95', value, floor, ratio: value / floor, unit: 'ms', goal: 5, better: 'lower' }];
  } finally {
    await app.remove();
  }
}
