import { useState, type FormEvent } from 'react';
import { DEFAULT_SHEET_SIDE, type StashSide } from '#shared/model/stash';
import type { Unit } from '#shared/words/measure';
import { Button } from '@/components/button';
import { TextField } from '@/components/field';
import { useAnnounce } from '@/components/live-region';
import { useAddSheet } from '../api/stash-mutations';
import { PLAIN_SIDE, readCount } from '../model/sheet-words';
import { ColorField } from './color-field';
import { SheetDialog } from './sheet-dialog';

interface QuickAddProps {
  readonly studioId: string;
  readonly unit: Unit;
  readonly onFail: (error: unknown) => void;
}

/** The line above the table on which sheets are entered one after the other; all else about them has a form of its own. */
export function QuickAdd({ studioId, unit, onFail }: QuickAddProps) {
  const [name, setName] = useState('');
  const [count, setCount] = useState('1');
  const [side, setSide] = useState<StashSide>(PLAIN_SIDE);
  const [isWide, setIsWide] = useState(false);
  const [faults, setFaults] = useState<{ readonly name?: string; readonly count?: string }>({});
  const add = useAddSheet(studioId);
  const announce = useAnnounce();
  const quantity = readCount(count);
  const facts = { name: name.trim(), maker: '', texture: '', place: '', width: DEFAULT_SHEET_SIDE, height: DEFAULT_SHEET_SIDE, quantity: quantity ?? 1, lowAt: null, price: null, sides: [side] as const };
  const clear = (): void => {
    announce(`${facts.name} added`);
    setName('');
    setCount('1');
  };
  const submit = (event: FormEvent): void => {
    event.preventDefault();
    if (facts.name === '' || quantity === undefined) return setFaults({ ...(facts.name === '' && { name: 'Write a name first.' }), ...(quantity === undefined && { count: 'Write a count.' }) });
    setFaults({});
    add.mutate(facts, { onSuccess: clear, onError: onFail });
  };
  return (
    <form className="quick-add" aria-label="Add sheets" onSubmit={submit} noValidate>
      <TextField label="Add" placeholder="Name of the sheet" value={name} maxLength={80} autoComplete="off" error={faults.name} onChange={({ target }) => setName(target.value)} />
      <ColorField label="Colour" studioId={studioId} side={side} onChange={setSide} />
      <TextField label="Sheets" className="quick-count" inputMode="numeric" value={count} maxLength={5} error={faults.count} onChange={({ target }) => setCount(target.value)} />
      <span className="quick-buttons">
        <Button type="submit" variant="ink" working={add.isPending}>
          Add
        </Button>
        <button type="button" className="link-button" onClick={() => setIsWide(true)}>
          With maker, size, sides …
        </button>
      </span>
      {isWide && (
        <SheetDialog
          studioId={studioId}
          unit={unit}
          facts={facts}
          title="Add sheets"
          action="Add"
          onSave={async (all) => {
            await add.mutateAsync(all);
            clear();
          }}
          onClose={() => setIsWide(false)}
        />
      )}
    </form>
  );
}
