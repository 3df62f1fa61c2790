import { fileURLToPath } from 'node:url';
import react from '@vitejs/plugin-react';
import { defineConfig } from 'vitest/config';

const alias = { '@': fileURLToPath(new URL('./src', import.meta.url)) };

/** One project per kind of test; `server/setup/test.ts` runs them in turn and adds up their counts. */
export default defineConfig({
  test: {
    projects: [
      { resolve: { alias }, test: { name: 'shared', include: ['tests/shared/**/*.test.ts'] } },
      {
        resolve: { alias },
        test: {
          name: 'server',
          include: ['tests/server/**/*.test.ts'],
          globalSetup: ['tests/support/test-database-server.ts'],
          testTimeout: 60_000,
          hookTimeout: 120_000,
        },
      },
      {
        plugins: [react()],
        resolve: { alias },
        test: {
          name: 'src',
          include: ['tests/src/**/*.test.{ts,tsx}'],
          environment: 'jsdom',
          setupFiles: ['tests/support/src-setup.ts'],
        },
      },
      {
        resolve: { alias },
        test: {
          name: 'e2e',
          include: ['tests/e2e/**/*.test.ts'],
          globalSetup: ['tests/support/e2e/running-product.ts'],
          testTimeout: 120_000,
          hookTimeout: 180_000,
          maxWorkers: 2,
        },
      },
      {
        resolve: { alias },
        test: { name: 'refs', include: ['tests/refs/**/*.test.ts'], testTimeout: 120_000 },
      },
    ],
  },
});
