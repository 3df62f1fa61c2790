import type { AppDeps } from '../../app-deps';
import { UserEntity } from '../../entities/user-entity';
import { markWhile } from './half-loaded';

/** Loads the demo into a database that has nobody in it yet. */
export async function loadDemoWhereEmpty(deps: AppDeps, onProgress: (line: string) => void): Promise<void> {
  if ((await deps.dataSource.manager.count(UserEntity)) > 0) return;
  onProgress('Loading the demo …');
  // Read only when it is needed: it brings the picture tools along.
  const { loadDemo } = await import('./load-demo');
  await markWhile(deps.config.dataDir, () => loadDemo(deps));
}
