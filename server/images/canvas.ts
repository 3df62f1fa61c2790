import type { Hex } from '../../shared/model/ids';
import type { Rect } from '../../shared/model/rect';
import { intersection } from '../../shared/geometry/rects';

/**
 * Opaque 8-bit sRGB pixels, three bytes each, painted in place. A spread's layers are opaque and lie on
 * whole pixels, so that copying rows does what a compositor does, in a fraction of its time and memory.
 */
export interface Canvas {
  readonly width: number;
  readonly height: number;
  readonly data: Buffer;
}

/** Pixels to be painted: three bytes each, or four with straight (not premultiplied) alpha. */
export interface Layer {
  readonly width: number;
  readonly height: number;
  readonly channels: 3 | 4;
  readonly data: Buffer;
}

export function createCanvas(width: number, height: number, background: Hex): Canvas {
  const canvas = { width, height, data: Buffer.allocUnsafe(width * height * 3) };
  fillRect(canvas, { x: 0, y: 0, width, height }, background);
  return canvas;
}

const rgbOf = (hex: Hex): [number, number, number] => [
  Number.parseInt(hex.slice(1, 3), 16),
  Number.parseInt(hex.slice(3, 5), 16),
  Number.parseInt(hex.slice(5, 7), 16),
];

/** Fills a rectangle of whole pixels; what lies off the canvas is left out. */
export function fillRect(canvas: Canvas, rect: Rect, fill: Hex, opacity = 1): void {
  const area = intersection(rect, { x: 0, y: 0, width: canvas.width, height: canvas.height });
  if (!area || opacity <= 0) return;
  const rgb = rgbOf(fill);
  const { data } = canvas;
  const stride = canvas.width * 3;
  const first = area.y * stride + area.x * 3;
  const rowBytes = area.width * 3;
  if (opacity >= 1) {
    data.fill(Buffer.from(rgb), first, first + rowBytes);
    for (let row = 1; row < area.height; row += 1) data.copyWithin(first + row * stride, first, first + rowBytes);
    return;
  }
  for (let row = 0; row < area.height; row += 1) {
    const start = first + row * stride;
    for (let at = 0; at < rowBytes; at += 1) {
      const under = data[start + at]!;
      data[start + at] = Math.round(under + (rgb[at % 3]! - under) * opacity);
    }
  }
}

/** Paints a layer with its top-left corner at (x, y); what lies off the canvas is left out. */
export function paintLayer(canvas: Canvas, layer: Layer, x: number, y: number): void {
  const area = intersection({ x, y, width: layer.width, height: layer.height }, { x: 0, y: 0, width: canvas.width, height: canvas.height });
  if (!area) return;
  for (let row = area.y; row < area.y + area.height; row += 1) {
    const from = ((row - y) * layer.width + (area.x - x)) * layer.channels;
    const to = (row * canvas.width + area.x) * 3;
    if (layer.channels === 3) layer.data.copy(canvas.data, to, from, from + area.width * 3);
    else blendRow(canvas.data, to, layer.data, from, area.width);
  }
}

function blendRow(target: Buffer, to: number, source: Buffer, from: number, count: number): void {
  for (let i = 0; i < count; i += 1) {
    const s = from + i * 4;
    const t = to + i * 3;
    const alpha = source[s + 3]!;
    if (alpha === 0) continue;
    for (let c = 0; c < 3; c += 1) {
      const under = target[t + c]!;
      target[t + c] = Math.round(under + ((source[s + c]! - under) * alpha) / 255);
    }
  }
}
