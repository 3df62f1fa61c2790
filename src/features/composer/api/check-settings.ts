import type { CheckId } from '#shared/checks/check-ids';
import { checkSettingListSchema, type CheckSetting, type UpdateCheckSetting } from '#shared/contracts/check-settings';
import { api } from '@/lib/api';

/** For which spreads something is said about a check. */
export type CheckScope = { readonly kind: 'studio' | 'spread'; readonly id: string };

/** Says something about one check; the answer is all that is said in that scope. */
export async function setCheck({ kind, id }: CheckScope, checkId: CheckId, change: UpdateCheckSetting): Promise<readonly CheckSetting[]> {
  const { checks } = await api.patch(`/${kind === 'studio' ? 'studios' : 'spreads'}/${id}/checks/${checkId}`, checkSettingListSchema, change);
  return checks;
}
