/** Even a mat of the page's own colour is a shape with edges and pulls a little. */
export const SHAPE_PULL = 0.25;
/** What the busiest part of a picture adds … */
export const DETAIL_PULL = 0.25;
/** … which is where OKLab lightness changes by this much from one raster pixel to the next, across and down together. */
export const DETAIL_FULL = 0.4;
/** What every part of a face adds: about as much as the step from mid grey to white. */
export const FACE_PULL = 0.4;
/** Share of its place that written or cut letters cover. Common practice. */
export const INK_SHARE = 0.15;
/** Share that the printed colour of a patterned paper covers. Common practice. */
export const PATTERN_SHARE = 0.5;
