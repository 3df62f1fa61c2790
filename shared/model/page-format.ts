import { inches, millimetres, type Length } from './length';

/**
 * A page's size and its grid. The grid holds as many whole steps as fit between the least
 * margins; what remains is margin, shared equally on both sides, separately in x and y.
 */
export interface PageFormat {
  readonly id: string;
  readonly name: string;
  readonly width: Length;
  readonly height: Length;
  readonly step: Length;
  /** Space between neighbouring mats; even, so that half of it is whole. */
  readonly gap: Length;
  /** `margin`: every mat is inset by half a gap. `bleed`: on the page's rim there is no inset. */
  readonly edge: 'margin' | 'bleed';
  readonly minMargin: Length;
  /** The unit that people of this format read by default. */
  readonly unit: 'in' | 'mm';
}

function inchFormat(id: string, name: string, width: number, height: number): PageFormat {
  return {
    id,
    name,
    width: inches(width),
    height: inches(height),
    step: inches(1 / 2),
    gap: inches(1 / 8),
    edge: 'margin',
    minMargin: inches(1 / 2),
    unit: 'in',
  };
}

function metricFormat(id: string, name: string, widthMm: number, heightMm: number): PageFormat {
  return {
    id,
    name,
    width: millimetres(widthMm),
    height: millimetres(heightMm),
    step: millimetres(10),
    gap: millimetres(3),
    edge: 'margin',
    minMargin: millimetres(5),
    unit: 'mm',
  };
}

/** The formats that ship; a studio adds its own. PRODUCT.md section 3. */
export const PAGE_FORMATS: readonly PageFormat[] = [
  inchFormat('12x12in', '12 × 12 in', 12, 12),
  {
    ...inchFormat('12x12in-bleed', '12 × 12 in, edge to edge', 12, 12),
    edge: 'bleed',
    minMargin: 0,
  },
  inchFormat('8.5x11in', '8 1/2 × 11 in', 8.5, 11),
  inchFormat('8x8in', '8 × 8 in', 8, 8),
  inchFormat('6x8in', '6 × 8 in', 6, 8),
  metricFormat('30.5x30.5cm', '30.5 × 30.5 cm', 305, 305),
  metricFormat('30x30cm', '30 × 30 cm', 300, 300),
  metricFormat('a4', 'A4', 210, 297),
];

/** An album's binding, copied into each spread. All lengths per page. */
export interface Binding {
  readonly singleFirst: boolean;
  readonly singleLast: boolean;
  /** Width that the binding hides along each side's gutter edge. */
  readonly hiddenEdge: { readonly left: Length; readonly right: Length };
  /** Visible gap between the facing pages. */
  readonly gap: Length;
  readonly sleeves: boolean;
}

export const DEFAULT_BINDING: Binding = {
  singleFirst: true,
  singleLast: true,
  hiddenEdge: { left: 0, right: 0 },
  gap: 0,
  sleeves: true,
};
