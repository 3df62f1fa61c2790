import type { Length } from '#shared/model/length';
import { formatLength, formatSize, type Unit } from '#shared/words/measure';

interface MeasureProps {
  readonly unit: Unit;
  /** One length, or a size: width × height. */
  readonly of: Length | { readonly width: Length; readonly height: Length };
  /** Leave the unit out, as on a tag or a ruler. */
  readonly bare?: boolean;
}

/** A length or a size as people read it, in the mono face. */
export function Measure({ unit, of, bare = false }: MeasureProps) {
  const words = typeof of === 'number' ? `${formatLength(of, unit)} ${unit}` : formatSize(of, unit);
  return <span className="num">{bare ? words.slice(0, -unit.length - 1) : words}</span>;
}
