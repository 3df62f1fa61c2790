import { createDataSource } from '../data-source';
import { SetupFailure } from './setup-failure';

/**
 * Brings the tables up to date.
 *
 * @param url - of an account that may change tables.
 * @throws SetupFailure when the server does not answer or a migration fails.
 */
export async function migrate(url: string, onProgress: (line: string) => void): Promise<void> {
  const dataSource = createDataSource(url);
  try {
    await dataSource.initialize();
  } catch (error) {
    throw new SetupFailure(
      `The database at ${placeOf(url)} cannot be used.`,
      'Check DATABASE_URL, and that the server runs and lets this account in.',
      wordsOf(error),
    );
  }
  try {
    if (await dataSource.showMigrations()) {
      onProgress('Bringing the tables up to date …');
      await dataSource.runMigrations();
    }
  } catch (error) {
    throw new SetupFailure(
      'Bringing the tables up to date failed.',
      'The account needs the right to change tables; MIGRATION_DATABASE_URL can name another account than DATABASE_URL.',
      wordsOf(error),
    );
  } finally {
    await dataSource.destroy();
  }
}

/** Host and database of an address, without its password. */
function placeOf(url: string): string {
  const { host, pathname } = new URL(url);
  return host + pathname;
}

const wordsOf = (error: unknown): string => (error instanceof Error ? error.message : String(error));
