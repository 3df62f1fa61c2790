import type { DetailId, Hex, PileId, PrintId, StudioId, Turns } from './ids';
import type { Length, Px } from './length';

/** A rectangle in integer pixels of the EXIF-oriented original. */
export interface PxRect {
  readonly x: Px;
  readonly y: Px;
  readonly width: Px;
  readonly height: Px;
}

export interface PrintMarks {
  /** The picture has no up, so it may be turned by quarter-turns on the page. */
  readonly noUp: boolean;
  readonly oneOfAKind: boolean;
  /** ISO date (`2026-12-24`) by which a borrowed print must go back; null when it is not borrowed. */
  readonly borrowedUntil: string | null;
  readonly instantFilm: boolean;
  /** A digital photo that is not printed yet. Only such a photo may be scaled. */
  readonly digital: boolean;
}

/** A further keep zone on the same print that can be used as a small piece of its own. */
export interface Detail {
  readonly id: DetailId;
  readonly name: string;
  readonly rect: PxRect;
}

export interface Face {
  readonly rect: PxRect;
  /** The way the subject looks, seen by the person who looks at the print. */
  readonly facing?: 'left' | 'right' | 'ahead';
}

/** A line along the horizon, in pixels of the oriented original. */
export interface Horizon {
  readonly x1: Px;
  readonly y1: Px;
  readonly x2: Px;
  readonly y2: Px;
}

/** One colour of a print, backed by measured pixels. */
export interface Swatch {
  readonly hex: Hex;
  /** OKLCH: lightness 0–1, chroma, hue in degrees (0 when the colour is grey). */
  readonly oklch: readonly [l: number, c: number, h: number];
  /** Measured share of the picture's area, 0–1; never 0. */
  readonly share: number;
  /** node-vibrant's role for the colour, where it has one. */
  readonly role: 'vibrant' | 'muted' | 'dark-vibrant' | 'dark-muted' | 'light-vibrant' | 'light-muted' | 'area';
}

/**
 * A small OKLab raster of the whole oriented original, 64 px on the long side. `data` is base64 of
 * Int8 triples per pixel, row by row: L as round(L × 254 − 127), a and b as round(v × 254) (|v| < 0.5).
 */
export interface OklabRaster {
  readonly width: number;
  readonly height: number;
  readonly data: string;
}

/** One physical photograph, or a digital one not printed yet. */
export interface Print {
  readonly id: PrintId;
  readonly studioId: StudioId;
  readonly pileId: PileId | null;
  /** Order inside its pile. */
  readonly position: number;
  readonly title: string;
  /** The paper as it lies with its picture upright, after `turns`. */
  readonly paperWidth: Length;
  readonly paperHeight: Length;
  /** Quarter-turns clockwise that bring the EXIF-oriented original upright. */
  readonly turns: Turns;
  readonly copies: number;
  readonly marks: PrintMarks;
  /** Size of the EXIF-oriented original. */
  readonly imageWidth: Px;
  readonly imageHeight: Px;
  /**
   * The part of the oriented original that the paper shows. It may reach past the image where the
   * paper has a white border. Before `turns`.
   */
  readonly paperRect: PxRect;
  readonly keepZone: PxRect | null;
  readonly details: readonly Detail[];
  readonly faces: readonly Face[];
  readonly horizon: Horizon | null;
  readonly palette: readonly Swatch[];
  readonly raster: OklabRaster;
  /** Rises with every change, so that a stale edit can be refused. */
  readonly revision: number;
}
