import { useMemo } from 'react';
import { eyePath } from '#shared/checks/eye-path';
import { horizonLines } from '#shared/checks/horizon-lines';
import type { SpreadView } from '#shared/checks/check';
import { weighSpread } from '#shared/checks/weight';
import { SIDES } from '#shared/model/ids';
import { pageRects } from '#shared/scene/page-rects';

interface WeightOverlayProps {
  readonly view: SpreadView;
  /** Px per Length. */
  readonly scale: number;
}

/** Radius of a circle that stands for a weight of 1: one page of middling pull. */
const UNIT_RADIUS = 0.34;
const CROSS = 9;

/** What pulls and where it balances, over the pages: circles as large as weights, thirds, horizons, the eye's path, crosses. */
export function WeightOverlay({ view, scale }: WeightOverlayProps) {
  const { masses, centre, pageCentres, left, right } = useMemo(() => weighSpread(view), [view]);
  const path = useMemo(() => eyePath(view), [view]);
  const horizons = useMemo(() => horizonLines(view), [view]);
  const pages = pageRects(view.doc);
  const pageWidth = view.doc.format.width * scale;
  const stops = path.map(({ x, y }) => ({ x: x * scale, y: y * scale }));
  return (
    <svg
      className="weight-overlay"
      role="img"
      aria-label={`Weights drawn over the pages: left ${left}, right ${right} of 100. The eye likely rests ${path.length === 1 ? 'once' : `${path.length} times`}.`}
    >
      {SIDES.map((side) => {
        const page = pages[side];
        return page && <Thirds key={side} x={page.x * scale} width={page.width * scale} height={page.height * scale} />;
      })}
      {horizons.map(({ matId, from, to }) => (
        <Haloed key={matId} className="overlay-horizon" d={`M${from.x * scale} ${from.y * scale}L${to.x * scale} ${to.y * scale}`} />
      ))}
      {[...masses].map(([id, { x, y, mass }]) => mass > 0 && <Weight key={id} x={x * scale} y={y * scale} r={UNIT_RADIUS * pageWidth * Math.sqrt(mass)} />)}
      <Haloed className="overlay-path" d={stops.map(({ x, y }, i) => `${i === 0 ? 'M' : 'L'}${x} ${y}`).join('')} />
      {stops.map(({ x, y }, i) => (
        <g key={`${x} ${y}`} className="overlay-stop" transform={`translate(${x} ${y})`}>
          <circle r="9" />
          <text y="4">{i + 1}</text>
        </g>
      ))}
      {SIDES.map((side) => {
        const at = pageCentres[side];
        return at && pages.left && pages.right && <Cross key={side} x={at.x * scale} y={at.y * scale} size={CROSS} />;
      })}
      {centre && <Cross x={centre.x * scale} y={centre.y * scale} size={CROSS * 1.6} isWhole />}
    </svg>
  );
}

/** A circle whose area is as a mat's weight, where the mat balances. */
function Weight({ x, y, r }: { readonly x: number; readonly y: number; readonly r: number }) {
  return (
    <>
      <circle className="overlay-halo" cx={x} cy={y} r={r} />
      <circle className="overlay-weight" cx={x} cy={y} r={r} />
    </>
  );
}

function Thirds({ x, width, height }: { readonly x: number; readonly width: number; readonly height: number }) {
  const thirds = [1 / 3, 2 / 3];
  return <Haloed className="overlay-thirds" d={thirds.map((at) => `M${x + at * width} 0V${height}M${x} ${at * height}h${width}`).join('')} />;
}

/** A line that can be told from any picture under it. */
function Haloed({ d, className }: { readonly d: string; readonly className: string }) {
  return (
    <>
      <path className="overlay-halo" d={d} />
      <path className={className} d={d} />
    </>
  );
}

/** Where a page or, ringed, the whole spread balances. */
function Cross({ x, y, size, isWhole = false }: { readonly x: number; readonly y: number; readonly size: number; readonly isWhole?: boolean }) {
  const d = `M${x - size} ${y}h${2 * size}M${x} ${y - size}v${2 * size}`;
  return (
    <g className="overlay-cross">
      {isWhole && <circle className="overlay-halo" cx={x} cy={y} r={size * 0.7} />}
      <path className="overlay-halo" d={d} />
      <path d={d} />
      {isWhole && <circle cx={x} cy={y} r={size * 0.7} />}
    </g>
  );
}
