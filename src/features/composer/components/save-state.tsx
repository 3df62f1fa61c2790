import { useComposer, useComposerStore } from '@/features/composer/hooks/composer-context';

const time = new Intl.DateTimeFormat('en-GB', { hour: '2-digit', minute: '2-digit' });

/** Whether what is on the screen is safe on the server. */
export function SaveState({ mayEdit }: { mayEdit: boolean }) {
  const store = useComposerStore();
  const save = useComposer((state) => state.save);
  if (!mayEdit) return <span className="save-state">Read only</span>;
  const words = {
    saved: save.at ? `Saved ${time.format(new Date(save.at))}` : 'Saved',
    dirty: 'Saving…',
    saving: 'Saving…',
    offline: 'Offline: kept on this machine',
    failed: 'Not saved',
    conflict: 'Changed elsewhere',
  }[save.status];
  const isBad = save.status === 'failed' || save.status === 'conflict';
  return (
    <span className="save-state" role="status" data-status={save.status} data-tone={isBad ? 'stop' : undefined}>
      {words}
      {save.status === 'failed' && (
        <button type="button" className="link-button ml-2" onClick={() => void store.getState().flush()}>
          Try again
        </button>
      )}
    </span>
  );
}
