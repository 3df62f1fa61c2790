import type { AppDeps } from '../../app-deps';
import { loadContents } from './load-contents';
import type { DemoAccount } from './accounts';
import { DEMO_ACCOUNTS, DEMO_STUDIO } from './accounts';

/** Makes the demo's studio with its four members, its prints and its album. */
export async function loadDemo(deps: AppDeps): Promise<readonly DemoAccount[]> {
  const { accounts, studios } = deps.services;
  const [owner, ...members] = DEMO_ACCOUNTS;
  if (!owner) return [];
  const { id: ownerId } = await accounts.signUp({ ...owner, studioName: DEMO_STUDIO });
  const studioId = (await studios.listOf(ownerId))[0]?.studio.id;
  if (studioId === undefined) throw new Error('The demo owner has no studio.');
  for (const { role, ...member } of members) await accounts.addMember(studioId, role, member);
  await loadContents(deps, { studioId, userId: ownerId });
  return DEMO_ACCOUNTS;
}
