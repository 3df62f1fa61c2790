import { intersection } from '../geometry/rects';
import type { MatId } from '../model/ids';
import { inches } from '../model/length';
import type { Rect } from '../model/rect';
import type { Content } from '../model/spread';
import type { SceneItem } from './scene';

/** The patterns' true sizes; a paper never scales with its mat. */
const STRIPE = { pitch: inches(3 / 8), bars: [{ at: inches(1 / 8), width: inches(5 / 64) }, { at: inches(1 / 4), width: inches(1 / 64) }] };
const DOT = { pitch: inches(3 / 8), radius: inches(1 / 16) };
const CHECK = { pitch: inches(1 / 2), width: inches(1 / 4) };
/** Woven both ways, a check's crossings are darker than its bars. */
const CHECK_OPACITY = 0.55;

/** A piece of patterned paper that fills `rect`: its ground, then its stripes, dots or checks. */
export function patternedPaper(matId: MatId, paper: Extract<Content, { kind: 'paper' }>, rect: Rect): SceneItem[] {
  const ground: SceneItem = { kind: 'rect', key: `${matId}/paper`, matId, rect, fill: paper.ground };
  const bar = (piece: Rect, i: number, opacity?: number): SceneItem => ({
    kind: 'rect',
    key: `${matId}/paper/${i}`,
    matId,
    rect: piece,
    fill: paper.color,
    opacity,
  });
  switch (paper.pattern) {
    case 'plain':
      return [ground];
    case 'stripe':
      return [ground, ...stripes(rect).map((piece, i) => bar(piece, i))];
    case 'check':
      return [ground, ...checks(rect).map((piece, i) => bar(piece, i, CHECK_OPACITY))];
    case 'dot':
      return [
        ground,
        ...dots(rect).map(({ x, y }, i): SceneItem => ({
          kind: 'circle',
          key: `${matId}/paper/${i}`,
          matId,
          cx: x,
          cy: y,
          r: DOT.radius,
          fill: paper.color,
        })),
      ];
  }
}

function stripes(rect: Rect): Rect[] {
  return starts(rect.width, STRIPE.pitch).flatMap((from) =>
    STRIPE.bars.flatMap(({ at, width }) => intersection({ x: rect.x + from + at, y: rect.y, width, height: rect.height }, rect) ?? []),
  );
}

function checks(rect: Rect): Rect[] {
  const down = starts(rect.width, CHECK.pitch).flatMap(
    (from) => intersection({ x: rect.x + from, y: rect.y, width: CHECK.width, height: rect.height }, rect) ?? [],
  );
  const across = starts(rect.height, CHECK.pitch).flatMap(
    (from) => intersection({ x: rect.x, y: rect.y + from, width: rect.width, height: CHECK.width }, rect) ?? [],
  );
  return [...down, ...across];
}

/** Every second row is shifted by half a pitch. Only whole dots, so that none needs to be cut at the edge. */
function dots(rect: Rect): { x: number; y: number }[] {
  const { pitch, radius } = DOT;
  const half = pitch / 2;
  const rows = Math.floor((rect.height - 2 * radius) / half) + 1;
  const columns = Math.floor((rect.width - 2 * radius) / half) + 1;
  if (rows < 1 || columns < 1) return [];
  const left = rect.x + (rect.width - (columns - 1) * half) / 2;
  const top = rect.y + (rect.height - (rows - 1) * half) / 2;
  const centres: { x: number; y: number }[] = [];
  for (let row = 0; row < rows; row += 1) {
    for (let column = row % 2; column < columns; column += 2) centres.push({ x: left + column * half, y: top + row * half });
  }
  return centres;
}

const starts = (length: number, pitch: number): number[] =>
  Array.from({ length: Math.ceil(length / pitch) }, (_, i) => i * pitch);
