import { useSortable } from '@dnd-kit/sortable';
import { useState } from 'react';
import { Link } from 'react-router-dom';
import { SPREAD_STATES, type SpreadSummary } from '#shared/contracts/albums';
import type { PrintId } from '#shared/model/ids';
import type { Print } from '#shared/model/print';
import { IconButton } from '@/components/button';
import { MoreIcon } from '@/components/icons';
import { useAnnounce } from '@/components/live-region';
import { Menu, MenuItem, MenuRule } from '@/components/menu';
import { NameDialog } from '@/components/name-dialog';
import { useUpdateSpread } from '../api/album-mutations';
import { describeSpread, STATE_WORDS, stepsDone } from '../model/spread-words';
import { SpreadPicture } from './spread-picture';

interface SpreadCardProps {
  readonly spread: SpreadSummary;
  /** Its place in reading order, from 0, and how many there are. */
  readonly index: number;
  readonly count: number;
  readonly prints: ReadonlyMap<PrintId, Print>;
  readonly mayEdit: boolean;
  readonly onFail: (error: unknown) => void;
}

/** One spread on the album's thread: its picture, name and state, and what can be done with it. */
export function SpreadCard({ spread, index, count, prints, mayEdit, onFail }: SpreadCardProps) {
  const update = useUpdateSpread(spread.albumId);
  const announce = useAnnounce();
  const [isNaming, setIsNaming] = useState(false);
  const sortable = useSortable({ id: spread.id, disabled: !mayEdit });
  const { transform } = sortable;
  const move = (by: number): void => {
    update.mutate(
      { id: spread.id, position: index + by },
      { onError: onFail, onSuccess: () => announce(`${spread.title} is now spread ${index + by + 1} of ${count}`) },
    );
  };
  const bin = (): void => {
    update.mutate({ id: spread.id, binned: true }, { onError: onFail, onSuccess: () => announce(`${spread.title} is in the bin`) });
  };
  return (
    <li
      ref={sortable.setNodeRef}
      className={`spread-card ${sortable.isDragging ? 'is-in-hand' : ''}`}
      style={{ transform: transform ? `translate(${transform.x}px, ${transform.y}px)` : undefined, transition: sortable.transition }}
    >
      <div className="spread-thread">
        <SpreadPicture document={spread.document} prints={prints} />
      </div>
      <div className="mt-[9px] flex items-start gap-[9px]">
        {mayEdit ? (
          <button
            type="button"
            ref={sortable.setActivatorNodeRef}
            {...sortable.attributes}
            {...sortable.listeners}
            className="spread-handle num"
            aria-label={`Move ${spread.title}, spread ${index + 1} of ${count}`}
            title="Drag to another place in the album"
          >
            {index + 1}
          </button>
        ) : (
          <span className="num pt-px text-13 leading-[22px] text-ink-2" aria-label={`Spread ${index + 1}`}>
            {index + 1}
          </span>
        )}
        <h2 className="min-w-0 text-16 leading-[22px]">
          <Link to={`/spreads/${spread.id}`} className="spread-link">
            {spread.title}
          </Link>
        </h2>
        {mayEdit && (
          <Menu
            trigger={
              <IconButton label={`More for ${spread.title}`} className="relative z-10 -mt-[5px] -ml-1">
                <MoreIcon />
              </IconButton>
            }
          >
            <MenuItem onSelect={() => setIsNaming(true)}>Rename</MenuItem>
            <MenuItem onSelect={() => move(-1)} disabled={index === 0}>
              Move earlier
            </MenuItem>
            <MenuItem onSelect={() => move(1)} disabled={index === count - 1}>
              Move later
            </MenuItem>
            <MenuRule />
            <MenuItem onSelect={bin}>Put in the bin</MenuItem>
          </Menu>
        )}
        <StateRule state={spread.state} />
      </div>
      <p className="pl-[17px] text-12 text-ink-2">{describeSpread(spread.document)}</p>
      {isNaming && (
        <NameDialog
          title="Rename spread"
          label="Name"
          action="Rename"
          initial={spread.title}
          maxLength={120}
          onClose={() => setIsNaming(false)}
          onSave={(title) => update.mutateAsync({ id: spread.id, title })}
        />
      )}
    </li>
  );
}

/** How far a spread has come: a word over a rule of five divisions. */
function StateRule({ state }: { readonly state: SpreadSummary['state'] }) {
  const done = stepsDone(state);
  return (
    <div className="ml-auto flex-none text-right text-13 leading-[22px]">
      <span className="font-semibold">{STATE_WORDS[state]}</span>
      <span className="state-rule" aria-hidden="true">
        {SPREAD_STATES.map((step, i) => (
          <i key={step} data-done={i < done} />
        ))}
      </span>
    </div>
  );
}
