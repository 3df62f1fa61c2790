import type { Hex, MatId, PrintId, Side, Turns } from '../model/ids';
import type { Rect } from '../model/rect';

/**
 * One drawn spread: the only thing that the screen, the PNG and the PDF draw from. All lengths are in
 * 1/160 mm from the left page's top-left corner (from the only page's, where there is one); items are
 * in drawing order.
 */
export interface Scene {
  readonly width: number;
  readonly height: number;
  readonly pages: readonly ScenePage[];
  /** The fold between two pages that touch, drawn over the pages and under all items; null where there is none. */
  readonly fold: Shade | null;
  readonly items: readonly SceneItem[];
}

export interface ScenePage {
  readonly side: Side;
  readonly rect: Rect;
  readonly color: Hex;
}

/** A colour laid over what is under it. */
export interface Shade {
  readonly rect: Rect;
  readonly fill: Hex;
  readonly opacity: number;
}

interface ItemBase {
  /** Stable for the same thing from one scene to the next. */
  readonly key: string;
  readonly matId: MatId;
}

/** A filled rectangle: mats, inner mats, patterned papers' stripes, keepsakes, ruled lines. */
export interface RectItem extends ItemBase {
  readonly kind: 'rect';
  readonly rect: Rect;
  readonly fill: Hex;
  /** 1 unless said. */
  readonly opacity?: number;
  /** A thin line: never thinner than one pixel, and as thick as its like. */
  readonly isLine?: boolean;
}

/** A line along the inside of a rectangle's four edges; never thinner than one pixel. */
export interface FrameItem extends ItemBase {
  readonly kind: 'frame';
  readonly rect: Rect;
  readonly thickness: number;
  readonly fill: Hex;
  /** 1 unless said. */
  readonly opacity?: number;
}

export interface CircleItem extends ItemBase {
  readonly kind: 'circle';
  readonly cx: number;
  readonly cy: number;
  readonly r: number;
  readonly fill: Hex;
}

/** A piece of a print: `rect` is all paper; the picture covers it where `source` lies on the image, white paper shows elsewhere. */
export interface PhotoItem extends ItemBase {
  readonly kind: 'photo';
  readonly printId: PrintId;
  readonly rect: Rect;
  /** What of the oriented original `rect` shows, in fractional pixels; may reach past the image. */
  readonly source: Rect;
  /** Quarter-turns clockwise from the oriented original to the page. */
  readonly turns: Turns;
  readonly imageWidth: number;
  readonly imageHeight: number;
}

export type FontId = 'young-serif' | 'atkinson-italic' | 'atkinson';

/** One line of text whose every glyph has its place, so that no renderer wraps or spaces text by itself. */
export interface TextItem extends ItemBase {
  readonly kind: 'text';
  readonly font: FontId;
  /** Em size. */
  readonly size: number;
  readonly fill: Hex;
  /** Only characters that the font has a glyph for; spaces are single and never first or last. */
  readonly text: string;
  /** Left edge of each code point of `text`, and the common baseline. */
  readonly xs: readonly number[];
  readonly baseline: number;
}

export type SceneItem = RectItem | FrameItem | CircleItem | PhotoItem | TextItem;
