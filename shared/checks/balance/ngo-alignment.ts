import type { Rect } from '../../model/rect';

/*
 * The measures that count lines that objects start on, of D. C. L. Ngo, L. S. Teo, J. G. Byrne (2003), "Modelling
 * interface aesthetics", Information Sciences 152:25–46. Variant: an alignment point is a different left edge or a
 * different top edge, so that a single object is wholly simple; counting both edges of each gives it 3/5.
 */

interface Alignment {
  readonly columns: readonly number[];
  readonly rows: readonly number[];
}

function alignmentOf(rects: readonly Rect[]): Alignment {
  const distinct = (values: readonly number[]): number[] => [...new Set(values)].sort((a, b) => a - b);
  return { columns: distinct(rects.map(({ x }) => x)), rows: distinct(rects.map(({ y }) => y)) };
}

/** Simplicity (SMM): few objects that start on few lines. Above 0 … 1, 1 best; 1 where there are no objects. */
export function ngoSimplicity(rects: readonly Rect[]): number {
  if (rects.length === 0) return 1;
  const { columns, rows } = alignmentOf(rects);
  return 3 / (columns.length + rows.length + rects.length);
}

/** Regularity (RM): objects start on common lines, at few different distances. 0 … 1, 1 best; 1 for one object or none. */
export function ngoRegularity(rects: readonly Rect[]): number {
  const n = rects.length;
  if (n <= 1) return 1;
  const { columns, rows } = alignmentOf(rects);
  const steps = (starts: readonly number[]): number[] => starts.slice(1).map((start, i) => start - starts[i]!);
  // Objects on one spot have no distance between them: as regular as one distance.
  const spacings = Math.max(1, new Set([...steps(columns), ...steps(rows)]).size);
  const alignment = 1 - (columns.length + rows.length) / (2 * n);
  const spacing = 1 - (spacings - 1) / (2 * (n - 1));
  return (alignment + spacing) / 2;
}
