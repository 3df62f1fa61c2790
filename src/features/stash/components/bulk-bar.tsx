import { useState, type FormEvent } from 'react';
import type { BulkStash } from '#shared/contracts/stash';
import { sheetCount } from '#shared/words/en/stash';
import { Button } from '@/components/button';
import { useAnnounce } from '@/components/live-region';
import { useBulkStash } from '../api/stash-mutations';
import { readCount, readPrice } from '../model/sheet-words';

type Change = BulkStash['change'];

/** What can be given to many sheets at once, and how its text is read; null says that it does not fit. */
const FIELDS: readonly { readonly key: keyof Change; readonly label: string; readonly hint: string; readonly read: (text: string) => Change | null }[] = [
  { key: 'place', label: 'Place', hint: 'Drawer 2', read: (text) => ({ place: text.trim() }) },
  { key: 'maker', label: 'Maker', hint: 'Their maker', read: (text) => ({ maker: text.trim() }) },
  { key: 'texture', label: 'Texture', hint: 'linen', read: (text) => ({ texture: text.trim() }) },
  {
    key: 'lowAt',
    label: 'Low at',
    hint: '1, or nothing for never',
    read: (text) => {
      const count = text.trim() === '' ? null : readCount(text);
      return count === undefined ? null : { lowAt: count };
    },
  },
  {
    key: 'price',
    label: 'Price of one',
    hint: '0.95',
    read: (text) => {
      const price = readPrice(text);
      return price === undefined ? null : { price };
    },
  },
  {
    key: 'quantityBy',
    label: 'Sheets, more or fewer',
    hint: '+4 or -1',
    read: (text) => (/^[+−-]?\d{1,4}$/.test(text.trim()) ? { quantityBy: Number(text.trim().replace('−', '-')) } : null),
  },
];

interface BulkBarProps {
  readonly studioId: string;
  readonly sheetIds: readonly string[];
  readonly onDone: () => void;
  readonly onFail: (error: unknown) => void;
}

/** Gives all chosen sheets one value. */
export function BulkBar({ studioId, sheetIds, onDone, onFail }: BulkBarProps) {
  const [key, setKey] = useState<keyof Change>('place');
  const [text, setText] = useState('');
  const [isWrong, setIsWrong] = useState(false);
  const bulk = useBulkStash(studioId);
  const announce = useAnnounce();
  const field = FIELDS.find((candidate) => candidate.key === key)!;
  const submit = (event: FormEvent): void => {
    event.preventDefault();
    const change = field.read(text);
    if (change === null) return setIsWrong(true);
    const done = (): void => {
      setText('');
      announce(`${field.label} set on ${sheetCount(sheetIds.length)}`);
    };
    bulk.mutate({ sheetIds: [...sheetIds], change }, { onSuccess: done, onError: onFail });
  };
  return (
    <form className="bulk-bar" aria-label="Change the chosen sheets" onSubmit={submit}>
      <b>
        <span className="num">{sheetIds.length}</span> chosen
      </b>
      <select className="field-input" aria-label="What to set" value={key} onChange={(event) => (setKey(event.target.value as keyof Change), setIsWrong(false))}>
        {FIELDS.map(({ key: option, label }) => (
          <option key={option} value={option}>
            {label}
          </option>
        ))}
      </select>
      <input
        className="field-input"
        aria-label={`${field.label} for all of them`}
        aria-invalid={isWrong || undefined}
        aria-describedby={isWrong ? 'bulk-fault' : undefined}
        placeholder={field.hint}
        maxLength={80}
        value={text}
        onChange={(event) => (setText(event.target.value), setIsWrong(false))}
      />
      <Button type="submit" variant="ink" working={bulk.isPending}>
        Set
      </Button>
      <button type="button" className="link-button" onClick={onDone}>
        Choose none
      </button>
      {isWrong && (
        <p id="bulk-fault" role="alert" className="w-full text-13 text-cut-deep">
          This does not fit: write it like {field.hint}.
        </p>
      )}
    </form>
  );
}
