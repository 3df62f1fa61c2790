import sharp from 'sharp';
import { boundingBox, intersection } from '../../shared/geometry/rects';
import type { Rect } from '../../shared/model/rect';
import { baselineOnPixels } from '../../shared/scene/pixels';
import type { CircleItem, TextItem } from '../../shared/scene/scene';
import { FACES } from '../../shared/scene/text';
import type { Layer } from './canvas';
import { glyphPath } from './glyph-paths';

export type VectorItem = CircleItem | TextItem;

/**
 * Circles and lines of text drawn with smooth edges on a transparent layer.
 *
 * @param scale - pixels per unit.
 * @param canvas - the whole drawing in pixels; nothing outside it is drawn.
 * @returns the layer and its place in pixels, or null where nothing falls on the canvas.
 */
export async function drawVectors(
  items: readonly VectorItem[],
  scale: number,
  canvas: Rect,
): Promise<{ readonly layer: Layer; readonly x: number; readonly y: number } | null> {
  const box = boundingBox(items.map(boundsOf));
  const x = Math.floor(box.x * scale);
  const y = Math.floor(box.y * scale);
  const area = intersection(
    { x, y, width: Math.ceil((box.x + box.width) * scale) - x, height: Math.ceil((box.y + box.height) * scale) - y },
    canvas,
  );
  if (!area) return null;
  const viewBox = [area.x, area.y, area.width, area.height].map((px) => px / scale).join(' ');
  const svg = `<svg xmlns="http://www.w3.org/2000/svg" width="${area.width}" height="${area.height}" viewBox="${viewBox}">${items.map((item) => markup(item, scale)).join('')}</svg>`;
  const { data, info } = await sharp(Buffer.from(svg)).ensureAlpha().raw().toBuffer({ resolveWithObject: true });
  return { layer: { data, width: info.width, height: info.height, channels: 4 }, x: area.x, y: area.y };
}

/** Generous: glyphs may reach a little past their advance and above the ascender. */
function boundsOf(item: VectorItem): Rect {
  if (item.kind === 'circle') return { x: item.cx - item.r, y: item.cy - item.r, width: 2 * item.r, height: 2 * item.r };
  const left = item.xs[0] ?? 0;
  const right = item.xs.at(-1) ?? left;
  return { x: left - item.size, y: item.baseline - 1.4 * item.size, width: right - left + 3 * item.size, height: 2.2 * item.size };
}

function markup(item: VectorItem, scale: number): string {
  if (item.kind === 'circle') return `<circle cx="${item.cx}" cy="${item.cy}" r="${item.r}" fill="${item.fill}"/>`;
  const em = item.size / FACES[item.font].metrics.unitsPerEm;
  const y = baselineOnPixels(item.baseline, scale);
  const glyphs = [...item.text].map((character, i) => {
    const path = glyphPath(item.font, character);
    return path && `<path transform="matrix(${em} 0 0 ${-em} ${item.xs[i]} ${y})" d="${path}"/>`;
  });
  return `<g fill="${item.fill}">${glyphs.join('')}</g>`;
}
