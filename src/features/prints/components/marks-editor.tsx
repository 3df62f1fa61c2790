import { useId, type ReactNode } from 'react';
import type { Print } from '#shared/model/print';
import type { PrintChange } from '../api/print-mutations';
import { Fact } from './fact';

interface MarksEditorProps {
  readonly print: Print;
  readonly mayEdit: boolean;
  readonly onSave: (change: PrintChange) => void;
}

/** What a print is: its up, its copies, whose it is, what it is made of. */
export function MarksEditor({ print, mayEdit, onSave }: MarksEditorProps) {
  const { marks, copies } = print;
  const id = useId();
  return (
    <>
      <Choice
        label="Up"
        mayEdit={mayEdit}
        options={[
          { label: 'Has an up', isOn: !marks.noUp, change: { marks: { noUp: false } } },
          { label: 'No up, may turn', isOn: marks.noUp, change: { marks: { noUp: true } } },
        ]}
        onSave={onSave}
      />
      <Choice
        label="Copies"
        mayEdit={mayEdit}
        options={[
          { label: 'One of a kind', isOn: marks.oneOfAKind, change: { copies: 1, marks: { oneOfAKind: true } } },
          { label: 'Can be printed again', isOn: !marks.oneOfAKind, change: { marks: { oneOfAKind: false } } },
        ]}
        onSave={onSave}
      >
        {!marks.oneOfAKind && (
          <span className="flex items-center gap-2">
            <label htmlFor={`${id}-copies`} className="text-13 text-ink-2">
              in hand
            </label>
            <input
              key={copies}
              id={`${id}-copies`}
              type="number"
              min={1}
              max={99}
              className="field-input num w-16!"
              defaultValue={copies}
              disabled={!mayEdit}
              onBlur={(event) => {
                const count = event.target.valueAsNumber;
                if (Number.isInteger(count) && count >= 1 && count <= 99 && count !== copies) onSave({ copies: count });
                else event.target.value = String(copies);
              }}
              onKeyDown={(event) => event.key === 'Enter' && event.currentTarget.blur()}
            />
          </span>
        )}
      </Choice>
      <Choice
        label="Kind"
        mayEdit={mayEdit}
        options={[
          { label: 'Paper print', isOn: !marks.digital && !marks.instantFilm, change: { marks: { digital: false, instantFilm: false } } },
          { label: 'Instant film', isOn: marks.instantFilm, change: { marks: { digital: false, instantFilm: true } } },
          { label: 'Digital, not printed yet', isOn: marks.digital, change: { marks: { digital: true, instantFilm: false } } },
        ]}
        onSave={onSave}
      />
      <Fact label="Borrowed" htmlFor={`${id}-borrowed`}>
        <span className="text-13 text-ink-2">until</span>
        <input
          key={marks.borrowedUntil}
          id={`${id}-borrowed`}
          type="date"
          className="field-input num w-40!"
          defaultValue={marks.borrowedUntil ?? ''}
          disabled={!mayEdit}
          onBlur={(event) => {
            const date = event.target.value === '' ? null : event.target.value;
            if (date !== marks.borrowedUntil) onSave({ marks: { borrowedUntil: date } });
          }}
        />
        {marks.borrowedUntil !== null && mayEdit && (
          <button type="button" className="opt" onClick={() => onSave({ marks: { borrowedUntil: null } })}>
            It is ours
          </button>
        )}
      </Fact>
    </>
  );
}

interface ChoiceProps extends Omit<MarksEditorProps, 'print'> {
  readonly label: string;
  readonly options: readonly { readonly label: string; readonly isOn: boolean; readonly change: PrintChange }[];
  readonly children?: ReactNode;
}

/** One of a few, each a button that says whether it is chosen. */
function Choice({ label, options, mayEdit, onSave, children }: ChoiceProps) {
  return (
    <Fact label={label}>
      {options.map((option) => (
        <button
          key={option.label}
          type="button"
          className="opt"
          aria-pressed={option.isOn}
          disabled={!mayEdit}
          onClick={() => !option.isOn && onSave(option.change)}
        >
          {option.label}
        </button>
      ))}
      {children}
    </Fact>
  );
}
