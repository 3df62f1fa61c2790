import { mkdtemp, rm } from 'node:fs/promises';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import type { TestProject } from 'vitest/node';
import { startPrivateMariadb } from '#server/setup/mariadb/private-mariadb';

declare module 'vitest' {
  export interface ProvidedContext {
    /** Address of the tests' own database server, with all rights. */
    databaseRootUrl: string;
  }
}

/** Vitest's global set-up of the server tests: one database server for the run, with its data in a temporary folder. */
export default async function startDatabaseServer(project: TestProject): Promise<() => Promise<void>> {
  const folder = await mkdtemp(join(tmpdir(), 'pairleaf-test-'));
  const server = await startPrivateMariadb({ folder, fast: true });
  project.provide('databaseRootUrl', server.rootUrl);
  return async () => {
    await server.stop();
    await rm(folder, { recursive: true, force: true });
  };
}
