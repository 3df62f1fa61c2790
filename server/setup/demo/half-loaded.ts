import { existsSync, rmSync, writeFileSync } from 'node:fs';
import { join } from 'node:path';
import { createDataSource } from '../../data-source';

/** Lies in the data folder while the demo is being loaded: one found at a start tells of a load that was cut short. */
const markerIn = (dataDir: string): string => join(dataDir, 'demo-half-loaded');

/** Runs a load of the demo; if it ends half-way, the next start knows. */
export async function markWhile(dataDir: string, load: () => Promise<unknown>): Promise<void> {
  writeFileSync(markerIn(dataDir), '');
  await load();
  rmSync(markerIn(dataDir));
}

/**
 * Empties a private database whose demo was cut short, so that it is loaded anew. Nobody has worked in it: the
 * product says that it is ready only after the demo.
 */
export async function clearHalfLoadedDemo(dataDir: string, migrationUrl: string): Promise<void> {
  if (!existsSync(markerIn(dataDir))) return;
  const dataSource = await createDataSource(migrationUrl).initialize();
  try {
    await dataSource.dropDatabase();
  } finally {
    await dataSource.destroy();
  }
  rmSync(markerIn(dataDir));
}
