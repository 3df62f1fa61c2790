import { randomUUID } from 'node:crypto';
import type { Browser, BrowserContextOptions } from 'playwright-core';
import type { Session } from '#shared/contracts/accounts';
import type { SpreadDetail } from '#shared/contracts/albums';
import type { CommandCall } from '#shared/commands/calls';
import { runCommand } from '#shared/commands/run-command';
import { applyPatch } from '#shared/model/patch';
import type { Print } from '#shared/model/print';
import { openPage, type WatchedPage } from '../browser';
import { snapshot } from './snapshots';

export interface Visitor extends WatchedPage {
  readonly studioId: string;
}

/** Somebody new, signed in, with an empty studio. */
export async function signUp(browser: Browser, productUrl: string, options: BrowserContextOptions = {}): Promise<Visitor> {
  const account = { email: `${randomUUID()}@example.org`, password: 'a quiet table by the window', name: 'Maud Ferrier', studioName: 'Ferrier at the Table' };
  return enter(await openPage(browser, productUrl, options), '/api/accounts', account);
}

export async function signIn(browser: Browser, productUrl: string, account: { readonly email: string; readonly password: string }, options: BrowserContextOptions = {}): Promise<Visitor> {
  return enter(await openPage(browser, productUrl, options), '/api/session', { email: account.email, password: account.password });
}

async function enter(visit: WatchedPage, path: string, data: unknown): Promise<Visitor> {
  const answer = await visit.page.request.post(path, { data });
  const body = (await answer.json()) as Partial<Session>;
  const studio = body.studios?.[0];
  if (studio === undefined) throw new Error(`The product did not let the test's person in: ${JSON.stringify(body)}`);
  return { ...visit, studioId: studio.id };
}

/** A new 12 × 12 in spread of the visitor's, with that many 6 × 4 in prints on its table, and commands already run. */
export async function laidSpread({ page, studioId }: Visitor, printCount: number, calls: (prints: readonly Print[]) => readonly CommandCall[] = () => []): Promise<SpreadDetail> {
  const { request } = page;
  const send = async (url: string, data: unknown): Promise<void> => {
    const answer = await request.post(url, { data });
    if (!answer.ok()) throw new Error(`${url} answered ${answer.status()}: ${await answer.text()}`);
  };
  const prints = await Promise.all(
    Array.from({ length: printCount }, async (_, at) => {
      const answer = await request.post(`/api/studios/${studioId}/prints`, { multipart: { file: await snapshot(at) } });
      return ((await answer.json()) as { print: Print }).print;
    }),
  );
  const albumId = randomUUID();
  const spreadId = randomUUID();
  await send(`/api/studios/${studioId}/albums`, { id: albumId, title: 'A year by the sea', formatId: '12x12in' });
  await send(`/api/albums/${albumId}/spreads`, { id: spreadId, title: 'The pier' });
  const { document, revision, trim } = await readSpread(page, spreadId);
  const known = new Map(prints.map((print) => [print.id, print]));
  let doc = document;
  const edits = [{ id: 'table.add', args: { printIds: [...known.keys()] } } as const, ...calls(prints)].map((call) => {
    const patch = runCommand(doc, call, { prints: known, trim, newId: randomUUID });
    doc = applyPatch(doc, patch);
    return { id: randomUUID(), command: call.id, patch };
  });
  await send(`/api/spreads/${spreadId}/edits`, { baseRevision: revision, edits: edits.filter(({ patch }) => Object.keys(patch).length > 0) });
  return readSpread(page, spreadId);
}

/** A spread as the server has it. */
export async function readSpread(page: WatchedPage['page'], spreadId: string): Promise<SpreadDetail> {
  const answer = await page.request.get(`/api/spreads/${spreadId}`);
  if (!answer.ok()) throw new Error(`The spread could not be read: ${answer.status()}`);
  return (await answer.json()) as SpreadDetail;
}
