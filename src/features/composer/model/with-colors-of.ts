import type { SpreadDocument } from '#shared/model/spread';

/**
 * The spread as it stands, in the colours that it had earlier: pages, mats and inner mats. What has been added since
 * keeps its own.
 */
export function withColorsOf(doc: SpreadDocument, earlier: SpreadDocument): SpreadDocument {
  const before = new Map(earlier.mats.map((mat) => [mat.id, mat]));
  const page = (side: 'left' | 'right') => doc.pages[side] && { ...doc.pages[side], color: (earlier.pages[side] ?? doc.pages[side]).color };
  return {
    ...doc,
    scheme: earlier.scheme,
    pages: { left: page('left'), right: page('right') },
    mats: doc.mats.map((mat) => {
      const old = before.get(mat.id);
      return old ? { ...mat, color: old.color, inner: old.inner } : mat;
    }),
  };
}
