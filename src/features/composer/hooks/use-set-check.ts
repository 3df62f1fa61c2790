import { useCallback } from 'react';
import type { CheckId } from '#shared/checks/check-ids';
import type { UpdateCheckSetting } from '#shared/contracts/check-settings';
import { CHECK_NAMES } from '#shared/words/en/checks';
import { useAnnounce } from '@/components/live-region';
import { sentenceOf } from '@/lib/form-errors';
import { setCheck } from '@/features/composer/api/check-settings';
import { useComposerStore } from './composer-context';
import { useTell } from './use-run';

export type SetCheck = (scope: 'studio' | 'spread', checkId: CheckId, change: UpdateCheckSetting) => Promise<boolean>;

/** Mutes a check, hears it again, or sets its limits, and says so; a failure is told where refused commands are. */
export function useSetCheck(): SetCheck {
  const store = useComposerStore();
  const tell = useTell();
  const announce = useAnnounce();
  return useCallback(
    async (scope, checkId, change) => {
      const { spreadId, studioId, putChecks } = store.getState();
      try {
        putChecks(scope, await setCheck({ kind: scope, id: scope === 'studio' ? studioId : spreadId }, checkId, change));
      } catch (error) {
        tell(sentenceOf(error));
        return false;
      }
      tell(null);
      if (change.muted !== undefined) announce(`${CHECK_NAMES[checkId]}: ${change.muted ? 'muted' : 'heard again'}.`);
      return true;
    },
    [store, tell, announce],
  );
}
