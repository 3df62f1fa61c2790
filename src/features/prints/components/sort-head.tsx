import type { ReactNode } from 'react';
import type { Unit } from '#shared/words/measure';

interface SortHeadProps {
  readonly unit: Unit;
  /** Prints can be ticked for a spread. */
  readonly isForSpread: boolean;
  /** Buttons. */
  readonly children: ReactNode;
}

/** Over the table: what can be done, and the scale at which all prints lie. */
export function SortHead({ unit, isForSpread, children }: SortHeadProps) {
  return (
    <div className="mb-5 flex min-h-8 flex-wrap items-center gap-x-5 gap-y-2">
      {children}
      <span className="flex items-center gap-2 text-12 text-ink-2">
        <span className="scale-bar" data-unit={unit} aria-hidden="true" />
        {unit === 'in' ? '2 in' : '5 cm'} on this table
      </span>
      <span className="text-12 text-ink-2 max-sm:hidden">Each tag is a print’s smallest cut{isForSpread && '; a tick means it for this spread'}</span>
    </div>
  );
}
