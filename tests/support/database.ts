import { randomBytes } from 'node:crypto';
import { createConnection } from 'mysql2/promise';
import type { DataSource } from 'typeorm';
import { afterAll, beforeAll, inject } from 'vitest';
import { createDataSource } from '#server/data-source';

/** A migrated, empty database of one test file. */
export interface TestDatabase {
  /** What the app is given: it may read and write rows, and nothing else. */
  readonly url: string;
  /** May change tables as well. */
  readonly rootUrl: string;
  /** Connected with the app's rights. */
  readonly dataSource: DataSource;
  drop(): Promise<void>;
}

/**
 * A database for the tests of one file, made before them and dropped after them.
 *
 * @example const database = withDatabase(); … database().dataSource
 */
export function withDatabase(): () => TestDatabase {
  let database: TestDatabase | null = null;
  beforeAll(async () => {
    database = await createTestDatabase();
  });
  afterAll(async () => {
    await database?.drop();
  });
  return () => {
    if (!database) throw new Error('The test database is there from beforeAll on, not earlier.');
    return database;
  };
}

export async function createTestDatabase(): Promise<TestDatabase> {
  const name = `pairleaf_test_${randomBytes(6).toString('hex')}`;
  const password = randomBytes(18).toString('base64url');
  await asRoot([
    `CREATE DATABASE ${name} CHARACTER SET utf8mb4 COLLATE utf8mb4_unicode_ci`,
    `CREATE USER '${name}'@'127.0.0.1' IDENTIFIED BY '${password}'`,
    `GRANT SELECT, INSERT, UPDATE, DELETE ON ${name}.* TO '${name}'@'127.0.0.1'`,
  ]);
  const rootUrl = addressOf(name);
  await migrate(rootUrl);
  const url = addressOf(name, { user: name, password });
  const dataSource = await createDataSource(url).initialize();
  return {
    url,
    rootUrl,
    dataSource,
    drop: async () => {
      if (dataSource.isInitialized) await dataSource.destroy();
      await asRoot([`DROP DATABASE ${name}`, `DROP USER '${name}'@'127.0.0.1'`]);
    },
  };
}

async function migrate(url: string): Promise<void> {
  const dataSource = await createDataSource(url).initialize();
  await dataSource.runMigrations();
  await dataSource.destroy();
}

function addressOf(database: string, account?: { user: string; password: string }): string {
  const url = new URL(inject('databaseRootUrl'));
  url.pathname = `/${database}`;
  if (account) {
    url.username = account.user;
    url.password = account.password;
  }
  return url.href;
}

async function asRoot(statements: string[]): Promise<void> {
  const connection = await createConnection({ uri: inject('databaseRootUrl').replace(/^mariadb:/, 'mysql:') });
  try {
    for (const statement of statements) await connection.query(statement);
  } finally {
    await connection.end();
  }
}
