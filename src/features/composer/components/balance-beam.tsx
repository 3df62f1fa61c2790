/** Degrees of tilt per point of difference, and the furthest tilt. TOKENS.md "Balance beam". */
const TILT_PER_POINT = 0.29;
const MAX_TILT = 7;

/** Side of a page's square on the beam, in px, for its share of 100. */
const squareSide = (share: number): number => 4 + share * 0.095;

/** The beam above the gutter that tilts with the two pages' visual weight. */
export function BalanceBeam({ left, right, limit }: { left: number; right: number; limit: number }) {
  const bare = left === 0 && right === 0;
  const tilt = Math.max(-MAX_TILT, Math.min(MAX_TILT, (right - left) * TILT_PER_POINT));
  const leans = left === right ? 'Level.' : `Leans ${right > left ? 'right' : 'left'}, ${Math.abs(right - left) <= limit ? 'within' : 'past'} the limit.`;
  const label = bare ? 'Visual weight: both pages bare.' : `Visual weight: left page ${left}, right page ${right}. ${leans}`;
  const leftSide = squareSide(left);
  const rightSide = squareSide(right);
  return (
    <div className="beam" role="img" aria-label={label}>
      <svg width="300" height="48" viewBox="0 0 300 48" aria-hidden="true">
        <path className="beam-limit" d="M32 30.5V9.5M268 30.5V9.5M29 9.5h6M29 30.5h6M265 9.5h6M265 30.5h6" />
        <path className="beam-post" d="M150 20v23M143 47.5 150 36l7 11.5Z" />
        <g className="beam-arm" style={{ transform: `rotate(${tilt}deg)` }}>
          <path className="beam-bar" d="M40 20H260" />
          {left > 0 && <rect x={50 - leftSide / 2} y={19.2 - leftSide} width={leftSide} height={leftSide} />}
          {right > 0 && <rect x={250 - rightSide / 2} y={19.2 - rightSide} width={rightSide} height={rightSide} />}
          <circle cx="150" cy="20" r="2.5" />
        </g>
      </svg>
      <span className="beam-left" aria-hidden="true">
        Left <b className="num">{left}</b>
      </span>
      <span className="beam-right" aria-hidden="true">
        <b className="num">{right}</b> right
      </span>
    </div>
  );
}
