import type { Print } from '../model/print';
import { toPaper, turnInBox } from './paper';
import type { PlacedPhoto } from './placed-photos';

export interface Line {
  readonly x1: number;
  readonly y1: number;
  readonly x2: number;
  readonly y2: number;
}

/**
 * The horizon marked on a print, as it lies on the page where the photo shows it: page space, in Lengths, to
 * within one unit; it may reach past the photo. Null where none is marked.
 */
export function horizonOnPage(print: Pick<Print, 'horizon' | 'paperRect' | 'paperWidth' | 'paperHeight' | 'turns'>, photo: Pick<PlacedPhoto, 'rect' | 'window' | 'placement'>): Line | null {
  if (!print.horizon) return null;
  const { x1, y1, x2, y2 } = print.horizon;
  const { scaledWidth, turn } = photo.placement;
  const factor = scaledWidth === null ? 1 : scaledWidth / print.paperWidth;
  const place = (x: number, y: number): { x: number; y: number } => {
    const onPaper = toPaper(print, { x, y, width: 0, height: 0 });
    const inWindow = { x: onPaper.x * factor - photo.window.x, y: onPaper.y * factor - photo.window.y, width: 0, height: 0 };
    const turned = turnInBox(inWindow, photo.window, turn);
    return { x: photo.rect.x + turned.x, y: photo.rect.y + turned.y };
  };
  const a = place(x1, y1);
  const b = place(x2, y2);
  const [from, to] = a.x <= b.x ? [a, b] : [b, a];
  return { x1: from.x, y1: from.y, x2: to.x, y2: to.y };
}

/** The line's height at `x`; null for one that rises more than it runs, which is no horizon as it lies. */
export function heightAt({ x1, y1, x2, y2 }: Line, x: number): number | null {
  if (x2 - x1 < 1 || Math.abs(y2 - y1) > x2 - x1) return null;
  return y1 + ((x - x1) / (x2 - x1)) * (y2 - y1);
}
