import { useState } from 'react';
import { Button } from '@/components/button';
import { Notice } from '@/components/notice';
import { useComposer, useComposerStore } from '@/features/composer/hooks/composer-context';

const when = new Intl.DateTimeFormat('en-GB', { weekday: 'long', hour: '2-digit', minute: '2-digit' });

/** Offers what an earlier visit could not save any more. */
export function DraftOffer() {
  const store = useComposerStore();
  const draft = useComposer((state) => state.draft);
  const [isAsking, setIsAsking] = useState(false);
  const [isRefused, setIsRefused] = useState(false);
  if (!draft) return null;
  const count = draft.edits.length === 1 ? 'One change' : `${draft.edits.length} changes`;
  const apply = async (): Promise<void> => {
    setIsAsking(true);
    setIsRefused(!(await store.getState().applyDraft()));
    setIsAsking(false);
  };
  return (
    <Notice tone="note" alert className="draft-offer">
      <span>
        {count} from {when.format(new Date(draft.at))} did not reach the server before the tab closed.
        {isRefused && ' The server could not be asked just now; they stay kept here.'}
      </span>
      <Button variant="ink" working={isAsking} onClick={() => void apply()}>
        Put back
      </Button>
      <Button onClick={() => store.getState().discardDraft()}>Let go</Button>
    </Notice>
  );
}
