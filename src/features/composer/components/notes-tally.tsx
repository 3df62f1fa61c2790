import { Popover } from 'radix-ui';
import type { CheckId } from '#shared/checks/check-ids';
import { CHECK_IDS } from '#shared/checks/check-ids';
import type { CheckSettings } from '#shared/contracts/check-settings';
import { CHECK_NAMES } from '#shared/words/en/checks';
import { useComposer } from '@/features/composer/hooks/composer-context';
import { useSetCheck } from '@/features/composer/hooks/use-set-check';

interface NotesTallyProps {
  /** Left edge in px, from the spread's. */
  readonly x: number;
  readonly width: number;
  readonly noteCount: number;
  /** Notes to consider, and whether they are folded away. */
  readonly considerCount: number;
  readonly isFolded: boolean;
  readonly isEditable: boolean;
  readonly onFold: (isFolded: boolean) => void;
}

/** How many checks speak here and what they have to say; which are muted; the notes to consider, folded away on wish. */
export function NotesTally({ x, width, noteCount, considerCount, isFolded, isEditable, onFold }: NotesTallyProps) {
  const checks = useComposer((state) => state.checks);
  const muted = mutedIn(checks);
  return (
    <div className="tally" style={{ left: x, width }}>
      <p>
        {CHECK_IDS.length - muted.length} checks, {noteCount === 1 ? '1 note' : `${noteCount} notes`}
      </p>
      {considerCount > 0 && (
        <button type="button" className="link-button" onClick={() => onFold(!isFolded)}>
          {isFolded ? `Show ${considerCount} to consider` : `Fold ${considerCount} to consider`}
        </button>
      )}
      {muted.length > 0 && <MutedChecks muted={muted} isEditable={isEditable} />}
    </div>
  );
}

interface Muted {
  readonly checkId: CheckId;
  /** Where it is muted, and so where it must be heard again. */
  readonly scopes: readonly ('studio' | 'spread')[];
}

/** Muted checks in the checks' own order; a spread that hears what its studio mutes is right. */
function mutedIn({ studio, spread }: CheckSettings): Muted[] {
  const saidBy = (list: CheckSettings['studio'], checkId: CheckId): boolean | null => list.find((setting) => setting.checkId === checkId)?.muted ?? null;
  return CHECK_IDS.flatMap((checkId): Muted[] => {
    const ofStudio = saidBy(studio, checkId);
    const ofSpread = saidBy(spread, checkId);
    if (!(ofSpread ?? ofStudio ?? false)) return [];
    return [{ checkId, scopes: [...(ofStudio ? (['studio'] as const) : []), ...(ofSpread ? (['spread'] as const) : [])] }];
  });
}

function MutedChecks({ muted, isEditable }: { readonly muted: readonly Muted[]; readonly isEditable: boolean }) {
  const set = useSetCheck();
  const hear = async ({ checkId, scopes }: Muted): Promise<void> => {
    for (const scope of scopes) if (!(await set(scope, checkId, { muted: null }))) return;
  };
  return (
    <Popover.Root>
      <Popover.Trigger asChild>
        <button type="button" className="link-button">
          {muted.length} muted
        </button>
      </Popover.Trigger>
      {/* Without a portal, so that the list stays inside the landmark that its button is in. */}
      <Popover.Content className="action-sheet muted-sheet" align="start" side="top" sideOffset={6} collisionPadding={12} aria-label="Muted checks">
        <h2>Muted checks</h2>
        <ul>
          {muted.map((entry) => (
            <li key={entry.checkId}>
              <span>
                {CHECK_NAMES[entry.checkId]}
                <small>{entry.scopes.includes('studio') ? 'in the whole studio' : 'on this spread'}</small>
              </span>
              {isEditable && (
                <button type="button" className="remedy" aria-label={`Hear “${CHECK_NAMES[entry.checkId]}” again`} onClick={() => void hear(entry)}>
                  Hear it again
                </button>
              )}
            </li>
          ))}
        </ul>
      </Popover.Content>
    </Popover.Root>
  );
}
