import type { Turns } from '../model/ids';
import type { Print, PxRect } from '../model/print';
import type { Rect, Size } from '../model/rect';

/** What a conversion between picture and paper needs to know of a print. */
export type PaperFrame = Pick<Print, 'paperRect' | 'paperWidth' | 'paperHeight' | 'turns'>;

/** A rectangle of a box `width` × `height`, after the box was turned clockwise by quarter-turns. */
export function turnInBox(r: Rect, box: Size, turns: Turns): Rect {
  switch (turns) {
    case 0:
      return r;
    case 1:
      return { x: box.height - r.y - r.height, y: r.x, width: r.height, height: r.width };
    case 2:
      return { x: box.width - r.x - r.width, y: box.height - r.y - r.height, width: r.width, height: r.height };
    case 3:
      return { x: r.y, y: box.width - r.x - r.width, width: r.height, height: r.width };
  }
}

/** Size after quarter-turns. */
export const turnedSize = (size: Size, turns: Turns): Size =>
  turns % 2 === 0 ? size : { width: size.height, height: size.width };

export const inverseTurn = (turns: Turns): Turns => ((4 - turns) % 4) as Turns;

/**
 * A rectangle of the picture (pixels of the oriented original) as a rectangle on the upright paper, in
 * Lengths from its left and top edges, rounded outward. The one conversion for keep zones, details and
 * faces: a corrected paper size or rectangle never moves them on the picture. MODEL.md 2.
 */
export function toPaper(frame: PaperFrame, rect: PxRect): Rect {
  const { paperRect } = frame;
  const local = { ...rect, x: rect.x - paperRect.x, y: rect.y - paperRect.y };
  const upright = turnInBox(local, paperRect, frame.turns);
  const pixels = turnedSize(paperRect, frame.turns);
  const scaleX = frame.paperWidth / pixels.width;
  const scaleY = frame.paperHeight / pixels.height;
  // Products of integers that should be whole can miss by one part in 2^53: absorb that before rounding outward.
  const down = (v: number): number => Math.floor(v + 1e-6);
  const up = (v: number): number => Math.ceil(v - 1e-6);
  const x = down(upright.x * scaleX);
  const y = down(upright.y * scaleY);
  return {
    x,
    y,
    width: up((upright.x + upright.width) * scaleX) - x,
    height: up((upright.y + upright.height) * scaleY) - y,
  };
}

/**
 * The inverse of `toPaper`, unrounded: a rectangle on the upright paper as a rectangle of the oriented
 * original, in fractional pixels. It may reach past the image (white border).
 */
export function toPicture(frame: PaperFrame, rect: Rect): Rect {
  const { paperRect } = frame;
  const pixels = turnedSize(paperRect, frame.turns);
  const scaleX = pixels.width / frame.paperWidth;
  const scaleY = pixels.height / frame.paperHeight;
  const upright = { x: rect.x * scaleX, y: rect.y * scaleY, width: rect.width * scaleX, height: rect.height * scaleY };
  const local = turnInBox(upright, pixels, inverseTurn(frame.turns));
  return { ...local, x: local.x + paperRect.x, y: local.y + paperRect.y };
}

/**
 * The centre crop of the file in the paper's proportions: where a print's paper rectangle starts.
 *
 * @param image - size of the oriented original in pixels.
 * @param paper - size of the upright paper, in any unit.
 */
export function centreCrop(image: Size, paper: Size, turns: Turns): PxRect {
  const shape = turnedSize(paper, turns);
  const width = Math.min(image.width, Math.round((image.height * shape.width) / shape.height));
  const height = Math.min(image.height, Math.round((image.width * shape.height) / shape.width));
  return {
    x: Math.floor((image.width - width) / 2),
    y: Math.floor((image.height - height) / 2),
    width,
    height,
  };
}

/** What decides where a print's paper rectangle starts. */
type Sized = Pick<Print, 'imageWidth' | 'imageHeight' | 'paperWidth' | 'paperHeight' | 'turns'>;

/** Where the paper rectangle stands as long as nobody nudges it: the centre crop. */
export const automaticPaperRect = (print: Sized): PxRect =>
  centreCrop({ width: print.imageWidth, height: print.imageHeight }, { width: print.paperWidth, height: print.paperHeight }, print.turns);

/** True where nobody has nudged the paper rectangle. */
export function hasAutomaticPaperRect(print: Sized & Pick<Print, 'paperRect'>): boolean {
  const automatic = automaticPaperRect(print);
  const { x, y, width, height } = print.paperRect;
  return x === automatic.x && y === automatic.y && width === automatic.width && height === automatic.height;
}

/** Natural logarithm of the ratio of two sizes' proportions; 0 where they have one shape. */
const shapeDifference = (a: Size, b: Size): number => Math.log((a.width * b.height) / (a.height * b.width));

/** Widest difference of proportions that is taken for the same shape: lab crops and borderless printers bleed about this much. */
const FILE_TOLERANCE = 0.02;

/** True where the oriented, turned file and the paper differ in shape, so that the person should look. */
export function differsInShape(print: Sized): boolean {
  const image = turnedSize({ width: print.imageWidth, height: print.imageHeight }, print.turns);
  return Math.abs(shapeDifference(image, { width: print.paperWidth, height: print.paperHeight })) > FILE_TOLERANCE;
}

/** True where the paper rectangle has the paper's own proportions, as near as lab crops keep them. */
export const hasPaperShape = (print: Sized & Pick<Print, 'paperRect'>): boolean =>
  Math.abs(shapeDifference(turnedSize(print.paperRect, print.turns), { width: print.paperWidth, height: print.paperHeight })) <= FILE_TOLERANCE;

/** Papers that differ by less have one shape; a nudged paper rectangle fits both without stretching the picture to be seen. */
const PAPER_TOLERANCE = 0.005;

/** True where two papers show the same shape of the file. */
export function sameShape(a: Sized, b: Sized): boolean {
  const onFile = ({ paperWidth, paperHeight, turns }: Sized): Size => turnedSize({ width: paperWidth, height: paperHeight }, turns);
  return Math.abs(shapeDifference(onFile(a), onFile(b))) < PAPER_TOLERANCE;
}
