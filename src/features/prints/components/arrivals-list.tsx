import { Button } from '@/components/button';
import { StopMark, TickIcon } from '@/components/icons';
import { isSettled, type Arrival } from '../model/upload-queue';

interface ArrivalsListProps {
  readonly arrivals: readonly Arrival[];
  readonly onRetry: (id: string) => void;
  readonly onClear: () => void;
}

const WORDS: Record<Arrival['state'], string> = {
  waiting: 'waiting',
  sending: 'arriving',
  reading: 'being looked at',
  arrived: 'here',
  known: 'already here: nothing was added',
  refused: 'refused',
  unsent: 'not sent',
};

/** The files on their way in: each with its own progress, result, or reason for refusal. */
export function ArrivalsList({ arrivals, onRetry, onClear }: ArrivalsListProps) {
  if (arrivals.length === 0) return null;
  const settled = arrivals.filter(isSettled);
  const refused = arrivals.filter(({ state }) => state === 'refused' || state === 'unsent');
  const isDone = settled.length === arrivals.length;
  return (
    <section className="arrivals" aria-label="Arriving">
      <div className="flex items-baseline gap-3 border-b border-rule pb-1">
        <h2 className="text-15">{isDone ? 'Arrived' : 'Arriving'}</h2>
        <p className="text-12 text-ink-2" role="status">
          <span className="num">{settled.length - refused.length}</span> of <span className="num">{arrivals.length}</span> here
          {refused.length > 0 && (
            <>
              , <span className="num">{refused.length}</span> not taken
            </>
          )}
        </p>
        {settled.length > 0 && (
          <button type="button" className="link-button ml-auto text-12" onClick={onClear}>
            Clear the list
          </button>
        )}
      </div>
      <ul className="max-h-[264px] overflow-y-auto" tabIndex={0} aria-label="Files">
        {[...refused, ...arrivals.filter((arrival) => !refused.includes(arrival))].map((arrival) => (
          <ArrivalRow key={arrival.id} arrival={arrival} onRetry={onRetry} />
        ))}
      </ul>
    </section>
  );
}

function ArrivalRow({ arrival, onRetry }: { readonly arrival: Arrival; readonly onRetry: (id: string) => void }) {
  const { id, name, state, share, reason } = arrival;
  const isMoving = state === 'sending' || state === 'reading';
  return (
    <li className="arrival" data-state={state}>
      <span className="flex min-w-0 items-center gap-2">
        {state === 'refused' || state === 'unsent' ? (
          <StopMark />
        ) : state === 'arrived' || state === 'known' ? (
          <TickIcon className="size-[14px]!" />
        ) : (
          <i className="size-[13px] border border-dashed border-rule-2" aria-hidden="true" />
        )}
        <bdi className="truncate" title={name}>
          {name}
        </bdi>
      </span>
      <span className="flex-none text-ink-2">
        {state === 'sending' ? <span className="num">{Math.round(share * 100)}%</span> : WORDS[state]}
      </span>
      {reason !== null && (
        <p className="col-span-2 pb-1 pl-[21px] text-ink">
          {reason}{' '}
          {state === 'unsent' && (
            <Button variant="bare" className="h-6!" onClick={() => onRetry(id)}>
              Send again <span className="sr-only">{name}</span>
            </Button>
          )}
        </p>
      )}
      {isMoving && <progress className="arrival-line" value={state === 'reading' ? undefined : share} max={1} aria-label={`${name}, ${WORDS[state]}`} />}
    </li>
  );
}
