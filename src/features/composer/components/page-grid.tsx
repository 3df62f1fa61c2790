import { memo } from 'react';
import { gridOf } from '#shared/geometry/grid';
import { UNITS_PER_INCH, millimetres } from '#shared/model/length';
import type { PageFormat } from '#shared/model/page-format';

/** The page's grid in non-photo blue: whole-inch (or five-centimetre) lines full, step lines lighter. In page space. */
export const PageGrid = memo(function PageGrid({ format, x }: { format: PageFormat; x: number }) {
  const grid = gridOf(format);
  const width = grid.columns * format.step;
  const height = grid.rows * format.step;
  const strong = format.unit === 'in' ? UNITS_PER_INCH : millimetres(50);
  const every = Math.max(1, Math.round(strong / format.step));
  const lines = (count: number, vertical: boolean, isStrong: boolean): string =>
    Array.from({ length: count + 1 }, (_, i) => i)
      .filter((i) => (i % every === 0 || i === count) === isStrong)
      .map((i) => (vertical ? `M${i * format.step} 0V${height}` : `M0 ${i * format.step}H${width}`))
      .join('');
  return (
    <g transform={`translate(${x + grid.marginX} ${grid.marginY})`} className="grid-lines" aria-hidden="true">
      <path className="grid-step" d={lines(grid.columns, true, false) + lines(grid.rows, false, false)} />
      <path className="grid-inch" d={lines(grid.columns, true, true) + lines(grid.rows, false, true)} />
    </g>
  );
});
