import type { CheckId } from '#shared/checks/check-ids';
import { CHECKS } from '#shared/checks/registry';
import { CHECK_NAMES } from '#shared/words/en/checks';
import { MoreIcon } from '@/components/icons';
import { Menu, MenuItem } from '@/components/menu';
import { useSetCheck } from '@/features/composer/hooks/use-set-check';

interface NoteMenuProps {
  readonly checkId: CheckId;
  /** Opens the sheet for the check's limit. */
  readonly onLimit: (checkId: CheckId) => void;
}

/** What can be done about a check rather than about the spread. */
export function NoteMenu({ checkId, onLimit }: NoteMenuProps) {
  const set = useSetCheck();
  return (
    <Menu
      align="end"
      trigger={
        <button type="button" className="note-more" aria-label={`More on “${CHECK_NAMES[checkId]}”`}>
          <MoreIcon />
        </button>
      }
    >
      <MenuItem onSelect={() => void set('spread', checkId, { muted: true })}>Mute on this spread</MenuItem>
      <MenuItem onSelect={() => void set('studio', checkId, { muted: true })}>Mute in the whole studio</MenuItem>
      {Object.keys(CHECKS[checkId].thresholds).length > 0 && <MenuItem onSelect={() => onLimit(checkId)}>Set its limit …</MenuItem>}
    </Menu>
  );
}
