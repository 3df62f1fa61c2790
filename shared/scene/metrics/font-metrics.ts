/**
 * What line breaking needs to know of one shipped font. Values are in font units; the tables beside
 * this file are made from `fonts/` by `server/setup/make-font-metrics.ts` and are never edited by hand.
 */
export interface FontMetrics {
  readonly unitsPerEm: number;
  readonly ascent: number;
  /** Below the baseline, negative. */
  readonly descent: number;
  readonly capHeight: number;
  /** First code point of a run of neighbours → the advance width of each. */
  readonly advances: Readonly<Record<number, readonly number[]>>;
  /** Left character → adjustment → the right characters that it holds for. */
  readonly kerning: Readonly<Record<string, Readonly<Record<string, string>>>>;
}

/** A font ready to be measured: tables opened for look-up. */
export interface Face {
  readonly metrics: FontMetrics;
  /** In font units; undefined for a character that the font has no glyph for. */
  advance(character: string): number | undefined;
  /** In font units, 0 for a pair that is not kerned. */
  kern(left: string, right: string): number;
}

export function openFace(metrics: FontMetrics): Face {
  const advances = new Map<string, number>();
  for (const [first, run] of Object.entries(metrics.advances)) {
    run.forEach((advance, i) => advances.set(String.fromCodePoint(Number(first) + i), advance));
  }
  const pairs = new Map<string, number>();
  for (const [left, byValue] of Object.entries(metrics.kerning)) {
    for (const [value, rights] of Object.entries(byValue)) {
      for (const right of rights) pairs.set(left + right, Number(value));
    }
  }
  return {
    metrics,
    advance: (character) => advances.get(character),
    kern: (left, right) => pairs.get(left + right) ?? 0,
  };
}
