import { once } from 'node:events';
import { mkdtemp, readdir, rm } from 'node:fs/promises';
import type { Server } from 'node:http';
import { connect, type AddressInfo, type Socket } from 'node:net';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import express from 'express';
import { afterEach, expect, it } from 'vitest';
import { createReceiveUpload } from '#server/services/receive-upload';
import { Incoming } from '#server/storage/incoming';
import { AppError } from '#shared/errors';

/** More than are received at once. */
const MANY = 40;
const BODY = '--edge\r\ncontent-disposition: form-data; name="file"; filename="a.jpg"\r\n\r\npixels\r\n--edge--\r\n';

const closers: (() => Promise<unknown>)[] = [];
afterEach(async () => {
  for (const close of closers.splice(0).reverse()) await close();
});

/** A server with nothing but the receiver of uploads, which answers with the file's name or the error's code. */
async function serve(requireRoom: (bytes: number) => Promise<void>, stallMs?: number) {
  const parent = await mkdtemp(join(tmpdir(), 'pairleaf-receive-'));
  closers.push(() => rm(parent, { recursive: true, force: true }));
  const incoming = await Incoming.open(parent);
  const receive = createReceiveUpload(incoming, requireRoom, stallMs);
  const app = express();
  app.post('/', async (req, res) => {
    const answer = await receive(req, res).then(
      ({ fileName }) => fileName,
      (error: unknown) => (error instanceof AppError ? error.code : String(error)),
    );
    res.send(answer);
  });
  const server: Server = app.listen(0, '127.0.0.1');
  await once(server, 'listening');
  closers.push(async () => {
    server.closeAllConnections();
    await new Promise((resolve) => server.close(resolve));
  });
  const { port } = server.address() as AddressInfo;
  const begin = async (sent: string): Promise<Socket> => {
    const socket = connect(port, '127.0.0.1');
    socket.on('error', () => undefined);
    await once(socket, 'connect');
    socket.write(`POST / HTTP/1.1\r\nHost: x\r\nContent-Type: multipart/form-data; boundary=edge\r\nContent-Length: ${BODY.length}\r\n\r\n${sent}`);
    return socket;
  };
  const send = async (): Promise<string> => {
    const headers = { 'content-type': 'multipart/form-data; boundary=edge' };
    return (await fetch(`http://127.0.0.1:${port}/`, { method: 'POST', headers, body: BODY, signal: AbortSignal.timeout(5_000) })).text();
  };
  return { begin, send, files: () => readdir(incoming.folder) };
}

it('gives the place of somebody who left before being read to the next', async () => {
  let open: () => void = () => undefined;
  const gate = new Promise<void>((resolve) => (open = resolve));
  let asked = 0;
  const { begin, send, files } = await serve(() => {
    asked += 1;
    return gate;
  });
  const leaving = await Promise.all(Array.from({ length: MANY }, () => begin('--edge')));
  await expect.poll(() => asked).toBe(32);
  for (const socket of leaving) socket.destroy();
  await new Promise((resolve) => setTimeout(resolve, 100));
  open();
  expect(await send()).toBe('a.jpg');
  expect(await files()).toHaveLength(1);
});

it('hangs up on somebody who sends nothing more, and keeps nothing of it', async () => {
  const { begin, send, files } = await serve(async () => undefined, 150);
  const silent = await Promise.all(Array.from({ length: MANY }, () => begin(BODY.slice(0, -20))));
  await Promise.all(silent.map((socket) => socket.destroyed || once(socket, 'close')));
  expect(await send()).toBe('a.jpg');
  await expect.poll(files).toHaveLength(1);
});

it('asks for room for all that is on its way, not for each alone', async () => {
  const asked: number[] = [];
  let open: () => void = () => undefined;
  const gate = new Promise<void>((resolve) => (open = resolve));
  const { send } = await serve((bytes) => {
    asked.push(bytes);
    return gate;
  });
  const both = Promise.all([send(), send()]);
  await expect.poll(() => asked.length).toBe(2);
  open();
  await both;
  await send();
  expect(asked).toEqual([BODY.length, 2 * BODY.length, BODY.length]);
});
