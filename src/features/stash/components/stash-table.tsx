import type { StashSheet } from '#shared/model/stash';
import type { Unit } from '#shared/words/measure';
import type { Sort } from '../model/arrange-sheets';
import { StashRow } from './stash-row';

interface StashTableProps {
  readonly studioId: string;
  readonly sheets: readonly StashSheet[];
  readonly unit: Unit;
  readonly mayEdit: boolean;
  readonly sort: Sort;
  readonly isDescending: boolean;
  readonly selected: ReadonlySet<string>;
  readonly onSort: (sort: Sort) => void;
  readonly onSelect: (selected: ReadonlySet<string>) => void;
  readonly onFail: (error: unknown) => void;
}

const COLUMNS: readonly { readonly sort: Sort; readonly label: string; readonly isNumber?: true }[] = [
  { sort: 'name', label: 'Sheet' },
  { sort: 'colour', label: 'Colour' },
  { sort: 'size', label: 'Size', isNumber: true },
  { sort: 'free', label: 'On hand', isNumber: true },
  { sort: 'price', label: 'Price', isNumber: true },
  { sort: 'place', label: 'Place' },
];

/** The sheets as a table; on a phone every row is a small block of its own. */
export function StashTable({ sheets, sort, isDescending, selected, mayEdit, onSort, onSelect, ...row }: StashTableProps) {
  const isAll = sheets.length > 0 && sheets.every(({ id }) => selected.has(id));
  const toggle = (id: string): void => {
    const next = new Set(selected);
    if (!next.delete(id)) next.add(id);
    onSelect(next);
  };
  return (
    <table className="stash-table">
      <thead>
        <tr>
          {mayEdit && (
            <th scope="col" className="is-check">
              <input type="checkbox" aria-label="Choose all that are shown" checked={isAll} onChange={() => onSelect(isAll ? new Set() : new Set(sheets.map(({ id }) => id)))} />
            </th>
          )}
          {COLUMNS.map(({ sort: key, label, isNumber }) => (
            <th key={key} scope="col" aria-sort={sort === key ? (isDescending ? 'descending' : 'ascending') : undefined} className={isNumber ? 'is-number' : undefined}>
              <button type="button" onClick={() => onSort(key)}>
                {label}
                <span aria-hidden="true">{sort === key ? (isDescending ? ' ↓' : ' ↑') : ''}</span>
              </button>
            </th>
          ))}
          {mayEdit && (
            <th scope="col">
              <span className="sr-only">More</span>
            </th>
          )}
        </tr>
      </thead>
      <tbody>
        {sheets.map((sheet) => (
          <StashRow key={sheet.id} {...row} sheet={sheet} mayEdit={mayEdit} isSelected={selected.has(sheet.id)} onToggle={() => toggle(sheet.id)} />
        ))}
      </tbody>
    </table>
  );
}
