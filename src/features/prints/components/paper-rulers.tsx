import { inches, millimetres } from '#shared/model/length';
import type { Size } from '#shared/model/rect';
import type { Unit } from '#shared/words/measure';

interface PaperRulersProps {
  readonly paper: Size;
  readonly unit: Unit;
  readonly pxPerLength: number;
}

interface Tick {
  readonly at: number;
  readonly length: number;
  readonly label: string | null;
}

/** Ticks along a length: every eighth of an inch, or every 5 mm; the longer the rounder. */
function ticksAlong(length: number, unit: Unit): Tick[] {
  const step = unit === 'in' ? inches(1 / 8) : millimetres(5);
  const [half, whole] = unit === 'in' ? [4, 8] : [2, 2];
  return Array.from({ length: Math.floor(length / step) + 1 }, (_, i) => {
    const isWhole = i % whole === 0;
    return {
      at: i * step,
      length: isWhole ? 10 : i % half === 0 ? 6 : 3,
      label: isWhole && i > 0 && length - i * step > step * 2 ? String(i / whole) : null,
    };
  });
}

/** Rulers over the upper and beside the left edge of the opened print. */
export function PaperRulers({ paper, unit, pxPerLength }: PaperRulersProps) {
  const across = ticksAlong(paper.width, unit);
  const down = ticksAlong(paper.height, unit);
  const px = (length: number): number => Math.round(length * pxPerLength * 100) / 100;
  return (
    <svg className="paper-rulers" width={px(paper.width)} height={px(paper.height)} aria-hidden="true">
      <path d={across.map(({ at, length }) => `M${px(at)} ${-length}v${length}`).join('') + down.map(({ at, length }) => `M${-length} ${px(at)}h${length}`).join('')} />
      {across.map(({ at, label }) => label !== null && (
        <text key={at} x={px(at) + 3} y={-5}>
          {label}
        </text>
      ))}
      {down.map(({ at, label }) => label !== null && (
        <text key={at} x={-18} y={px(at) + 10}>
          {label}
        </text>
      ))}
    </svg>
  );
}
