import type { CSSProperties } from 'react';
import arrival from '../pictures/arrival.webp';
import headland1 from '../pictures/headland-1.webp';
import headland2 from '../pictures/headland-2.webp';
import headland3 from '../pictures/headland-3.webp';
import headland4 from '../pictures/headland-4.webp';
import lens from '../pictures/lens.webp';
import nora from '../pictures/nora.webp';
import pim from '../pictures/pim.webp';
import rope from '../pictures/rope.webp';
import thrift from '../pictures/thrift.webp';
import tower from '../pictures/tower.webp';

const HARBOUR = '#1d4f5c';
const SEAGLASS = '#b9cfc4';
const LAMP = '#dc9f33';

/** A page in half-inch steps: place, size, card, picture, reveal in inches. */
const MATS = [
  [0, 0, 13, 9, HARBOUR, arrival, 0.1875],
  [13, 0, 9, 9, SEAGLASS, tower, 0.125],
  [0, 9, 8, 8, LAMP, nora, 0.125],
  [8, 9, 6, 8, HARBOUR, thrift, 0.125],
  [14, 9, 8, 8, HARBOUR, lens, 0.125],
  [0, 17, 3, 5, HARBOUR, headland1, 0.125],
  [3, 17, 3, 5, HARBOUR, headland2, 0.125],
  [6, 17, 3, 5, HARBOUR, headland3, 0.125],
  [9, 17, 3, 5, HARBOUR, headland4, 0.125],
  [12, 17, 5, 5, SEAGLASS, pim, 0.125],
  [17, 17, 5, 5, LAMP, rope, 0.125],
] as const;

/** A finished left page, as a picture of what the product makes. Pure decoration. */
export function SamplePage() {
  return (
    <div className="sample-page sample-grid" aria-hidden="true">
      {MATS.map(([x, y, w, h, color, picture, reveal]) => (
        <div
          key={`${x}-${y}`}
          className="sample-mat"
          style={{ '--x': x, '--y': y, '--w': w, '--h': h, '--rv': reveal, backgroundColor: color } as CSSProperties}
        >
          <img src={picture} alt="" draggable={false} />
        </div>
      ))}
    </div>
  );
}
