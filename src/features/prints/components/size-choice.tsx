import { useState, type FormEvent } from 'react';
import type { Print } from '#shared/model/print';
import type { Size } from '#shared/model/rect';
import { formatLength, formatSize, type Unit } from '#shared/words/measure';
import { Button } from '@/components/button';
import { TextField } from '@/components/field';
import { hasSize, laidLike, readPaperLength, sizesFor } from '../model/paper-edit';
import type { PrintChange } from '../api/print-mutations';
import { Fact } from './fact';

interface SizeChoiceProps {
  readonly print: Print;
  readonly unit: Unit;
  readonly mayEdit: boolean;
  readonly onSave: (change: PrintChange) => void;
}

/** How many of the common sizes stand ready before "Other". */
const READY = 4;

/** The physical size of a print: the common ones, and any other in inches or centimetres. */
export function SizeChoice({ print, unit, mayEdit, onSave }: SizeChoiceProps) {
  const [isOther, setIsOther] = useState(false);
  const sizes = sizesFor(unit);
  const current = sizes.find((size) => hasSize(print, size));
  const ready = sizes.slice(0, READY);
  const isListed = current !== undefined && ready.includes(current);
  return (
    <Fact label="Size">
      {ready.map((size) => (
        <button
          key={size.name}
          type="button"
          className="opt"
          aria-pressed={size === current}
          disabled={!mayEdit}
          onClick={() => size !== current && onSave(asPaper(laidLike(size, print)))}
        >
          <span className="num">{size === current ? laidName(print, size.name, unit) : size.name}</span>
        </button>
      ))}
      {!isListed && (
        <button type="button" className="opt" aria-pressed="true" disabled={!mayEdit} onClick={() => setIsOther(true)}>
          <span className="num">{current?.name ?? formatSize({ width: print.paperWidth, height: print.paperHeight }, unit)}</span>
        </button>
      )}
      {mayEdit && (
        <button type="button" className="opt" aria-expanded={isOther} onClick={() => setIsOther(!isOther)}>
          Other
        </button>
      )}
      {isOther && <OtherSize print={print} unit={unit} onSave={onSave} onDone={() => setIsOther(false)} />}
    </Fact>
  );
}

const asPaper = ({ width, height }: Size): PrintChange => ({ paperWidth: width, paperHeight: height });

/** An inch size is read as it lies: 6 × 4 for a flat print. Rounded centimetre names stay as they are sold. */
function laidName(print: Print, name: string, unit: Unit): string {
  return name.endsWith(' in') && unit === 'in' ? formatSize({ width: print.paperWidth, height: print.paperHeight }, 'in') : name;
}

function OtherSize({ print, unit, onSave, onDone }: Pick<SizeChoiceProps, 'print' | 'unit' | 'onSave'> & { readonly onDone: () => void }) {
  const shown = (length: number): string => (unit === 'in' ? formatLength(length, 'in') : String(Math.round(length / 16) / 100));
  const [entryUnit, setEntryUnit] = useState<Unit>(unit);
  const [width, setWidth] = useState(shown(print.paperWidth));
  const [height, setHeight] = useState(shown(print.paperHeight));
  const [error, setError] = useState<string>();
  const submit = (event: FormEvent): void => {
    event.preventDefault();
    const [typedWidth, typedHeight] = [width, height].map((text) => readPaperLength(text, entryUnit === 'in' ? 'in' : 'cm'));
    const paper = { width: typedWidth ?? null, height: typedHeight ?? null };
    if (paper.width === null || paper.height === null) {
      return setError(entryUnit === 'in' ? 'Write inches such as 3 1/2 or 3.5, from 1/2 to 40.' : 'Write centimetres such as 8.9, from 1.3 to 101.');
    }
    onSave(asPaper({ width: paper.width, height: paper.height }));
    onDone();
  };
  const listed = sizesFor(unit).slice(READY);
  return (
    <form onSubmit={submit} className="my-2 grid w-full gap-3 border-l-2 border-pencil pl-3" noValidate>
      <div className="flex flex-wrap gap-1">
        {listed.map((size) => (
          <button
            key={size.name}
            type="button"
            className="opt"
            aria-pressed={hasSize(print, size)}
            onClick={() => {
              onSave({ ...asPaper(laidLike(size, print)), ...(size.instantFilm && { marks: { instantFilm: true } }) });
              onDone();
            }}
          >
            <span className="num">{size.name}</span>
          </button>
        ))}
      </div>
      <div className="flex flex-wrap items-end gap-2">
        <TextField label="Width" className="w-20" value={width} onChange={(event) => setWidth(event.target.value)} />
        <TextField label="Height" className="w-20" value={height} onChange={(event) => setHeight(event.target.value)} />
        <span role="group" aria-label="Unit" className="flex">
          {(['in', 'mm'] as const).map((choice) => (
            <button key={choice} type="button" className="opt" aria-pressed={entryUnit === choice} onClick={() => setEntryUnit(choice)}>
              {choice === 'in' ? 'in' : 'cm'}
            </button>
          ))}
        </span>
        <Button type="submit" variant="paper">
          Set size
        </Button>
      </div>
      {error !== undefined && (
        <p role="alert" className="text-13 text-cut-deep">
          {error}
        </p>
      )}
    </form>
  );
}
