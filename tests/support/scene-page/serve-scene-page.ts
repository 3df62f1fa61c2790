import { createServer, type Server } from 'node:http';
import { mkdtemp, readFile, rm } from 'node:fs/promises';
import type { AddressInfo } from 'node:net';
import { tmpdir } from 'node:os';
import { extname, join } from 'node:path';
import { fileURLToPath } from 'node:url';
import react from '@vitejs/plugin-react';
import sharp from 'sharp';
import { build } from 'vite';
import { WEBP_OPTIONS } from '#server/images/intake';
import { PICTURE_SIZES, type PictureSize } from '#shared/contracts/prints';

const TYPES: Readonly<Record<string, string>> = { '.html': 'text/html', '.js': 'text/javascript', '.css': 'text/css', '.woff2': 'font/woff2' };

export interface ScenePage {
  readonly url: string;
  readonly close: () => Promise<void>;
}

/**
 * Builds and serves a page with nothing but `SceneDrawing` on it, and the pictures it asks for.
 *
 * @param pictures - path of each print's picture file.
 */
export async function serveScenePage(pictures: ReadonlyMap<string, string>): Promise<ScenePage> {
  const folder = await mkdtemp(join(tmpdir(), 'scene-page-'));
  await build({
    configFile: false,
    root: fileURLToPath(new URL('.', import.meta.url)),
    logLevel: 'error',
    plugins: [react()],
    resolve: { alias: { '@': fileURLToPath(new URL('../../../src', import.meta.url)) } },
    build: { outDir: folder, emptyOutDir: true, assetsInlineLimit: 0, minify: false },
  });
  const server = createServer((request, response) => {
    const path = new URL(request.url ?? '/', 'http://page').pathname;
    answer(path, folder, pictures).then(
      ({ type, data }) => response.writeHead(200, { 'content-type': type }).end(data),
      () => response.writeHead(404).end(),
    );
  });
  await new Promise<void>((done) => server.listen(0, '127.0.0.1', done));
  return {
    url: `http://127.0.0.1:${(server.address() as AddressInfo).port}/`,
    close: async () => {
      await stop(server);
      await rm(folder, { recursive: true });
    },
  };
}

async function answer(path: string, folder: string, pictures: ReadonlyMap<string, string>): Promise<{ type: string; data: Buffer }> {
  const [, printId, size] = /^\/api\/pictures\/([^/]+)\/(small|medium|large)$/.exec(path) ?? [];
  if (printId && size) {
    const side = PICTURE_SIZES[size as PictureSize];
    const file = pictures.get(printId);
    if (!file) throw new RangeError(`no picture of print ${printId}`);
    const data = await sharp(file).autoOrient().resize(side, side, { fit: 'inside', withoutEnlargement: true }).webp(WEBP_OPTIONS).toBuffer();
    return { type: 'image/webp', data };
  }
  const name = path === '/' ? 'index.html' : path.slice(1);
  return { type: TYPES[extname(name)] ?? 'application/octet-stream', data: await readFile(join(folder, name)) };
}

async function stop(server: Server): Promise<void> {
  server.closeAllConnections();
  await new Promise((done) => server.close(done));
}
