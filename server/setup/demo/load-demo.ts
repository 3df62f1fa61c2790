import { randomUUID } from 'node:crypto';
import type { AppDeps } from '../../app-deps';
import { MembershipEntity } from '../../entities/membership-entity';
import { UserEntity } from '../../entities/user-entity';
import { hashPassword } from '../../services/passwords';
import { loadContents } from './load-contents';
import type { DemoAccount } from './accounts';
import { DEMO_ACCOUNTS, DEMO_STUDIO } from './accounts';

/** Makes the demo's studio with its four members, its prints and its album. */
export async function loadDemo(deps: AppDeps): Promise<readonly DemoAccount[]> {
  const { dataSource, services: { accounts, studios }, now } = deps;
  const [owner, ...members] = DEMO_ACCOUNTS;
  if (!owner) return [];
  const { id: ownerId } = await accounts.signUp({ ...owner, studioName: DEMO_STUDIO });
  const studioId = (await studios.listOf(ownerId))[0]?.studio.id;
  if (studioId === undefined) throw new Error('The demo owner has no studio.');
  for (const { email, name, password, role } of members) {
    const user = { id: randomUUID(), email, name, passwordHash: await hashPassword(password), createdAt: now() };
    await dataSource.transaction(async (manager) => {
      await manager.insert(UserEntity, user);
      await manager.insert(MembershipEntity, { studioId, userId: user.id, role, createdAt: user.createdAt });
    });
  }
  await loadContents(deps, { studioId, userId: ownerId });
  return DEMO_ACCOUNTS;
}
