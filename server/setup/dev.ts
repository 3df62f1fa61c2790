/** `npm run dev`: the API as in `npm start`, and the pages from Vite, which shows a changed source at once. */
import { createServer } from 'vite';
import { ROOT, startProduct } from './product';
import { runUntilStopped } from './until-stopped';

runUntilStopped(async ({ onOpened, fail }) => {
  const { url } = await startProduct({
    env: process.env,
    withPages: false,
    onProgress: (line) => console.log(line),
    onLost: () => fail('The database ended unexpectedly. Start again: it recovers by itself.'),
    onOpened,
  });
  // The Host header stays the page's own, or the API would take every request for a cross-site one.
  const vite = await createServer({ root: ROOT, server: { proxy: { '/api': { target: url, changeOrigin: false } } } });
  onOpened(() => vite.close());
  await vite.listen();
  vite.printUrls();
});
