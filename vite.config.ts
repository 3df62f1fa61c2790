import { fileURLToPath } from 'node:url';
import tailwindcss from '@tailwindcss/vite';
import react from '@vitejs/plugin-react';
import { defineConfig } from 'vite';

const apiPort = process.env.PORT ?? '3000';

export default defineConfig({
  plugins: [react(), tailwindcss()],
  resolve: { alias: { '@': fileURLToPath(new URL('./src', import.meta.url)) } },
  build: {
    outDir: 'dist',
    target: 'es2022',
    // The content security policy forbids data: fonts and inline scripts, so nothing is inlined.
    assetsInlineLimit: 0,
    sourcemap: false,
    rolldownOptions: {
      output: {
        // Zod compiles schemas with `new Function` where it may. The content security policy says that it may not, and
        // would report the attempt on every page; the setting must stand before zod's first line runs.
        banner: ({ moduleIds }) => (moduleIds.some((id) => id.includes('/zod/v4/core/')) ? 'globalThis.__zod_globalConfig = { jitless: true };' : ''),
      },
    },
  },
  server: { host: '127.0.0.1', proxy: { '/api': `http://127.0.0.1:${apiPort}` } },
});
