import { UNITS_PER_INCH, millimetres } from '#shared/model/length';
import type { PageFormat } from '#shared/model/page-format';

/** The ruler over one page: a tick every step, a number every inch or every two centimetres. */
export function PageRuler({ format, left, perInch }: { format: PageFormat; left: number; perInch: number }) {
  const scale = perInch / UNITS_PER_INCH;
  const [unit, tick, label] =
    format.unit === 'in' ? [UNITS_PER_INCH, UNITS_PER_INCH / 2, 1] : [millimetres(10), millimetres(10), 2];
  const ticks = Math.floor(format.width / tick);
  const numbers = Math.floor((format.width - 1) / (unit * label));
  return (
    <svg className="page-ruler" style={{ left }} width={format.width * scale} height="12" aria-hidden="true">
      {Array.from({ length: ticks + 1 }, (_, i) => {
        const x = Math.min(i * tick * scale, format.width * scale - 0.5);
        const isUnit = (i * tick) % (unit * label) === 0;
        return <path key={i} d={`M${x + 0.5} ${isUnit ? 4 : 8}V12`} />;
      })}
      {Array.from({ length: numbers }, (_, i) => (
        <text key={i} x={(i + 1) * unit * label * scale + 3} y="7">
          {(i + 1) * label}
        </text>
      ))}
    </svg>
  );
}
