import type { DrawnPicture, PictureShape } from './drawn-picture';

/*
 * What the examples' prints show. Width and height in pixels, places as shares of them, so that one drawing serves
 * prints of every shape.
 */

const SKY = '#cfe0ea';
const SAND = '#dcc9a0';
const SEA = '#8fb4bf';
const ROCK = '#6d6a5e';
const SUN = '#f2d9a0';

const ground = (width: number, height: number, from: number, fill: string): PictureShape => ({ kind: 'rect', x: 0, y: from * height, width, height: (1 - from) * height, fill });

/** A headland over the sea, a strip of sand before it. */
export function headland(width: number, height: number): DrawnPicture {
  return {
    width,
    height,
    shapes: [
      { kind: 'rect', x: 0, y: 0, width, height, fill: SKY },
      { kind: 'ellipse', cx: 0.26 * width, cy: 0.28 * height, rx: 0.07 * Math.min(width, height), ry: 0.07 * Math.min(width, height), fill: SUN },
      ground(width, height, 0.55, SEA),
      { kind: 'polygon', points: [[0.45 * width, 0.55 * height], [0.62 * width, 0.36 * height], [0.8 * width, 0.42 * height], [0.95 * width, 0.55 * height]], fill: ROCK },
      ground(width, height, 0.8, SAND),
    ],
  };
}

/** A lighthouse on a rock. */
export function lighthouse(width: number, height: number): DrawnPicture {
  const half = 0.07 * Math.min(width, height);
  return {
    width,
    height,
    shapes: [
      { kind: 'rect', x: 0, y: 0, width, height, fill: SKY },
      ground(width, height, 0.72, SEA),
      { kind: 'polygon', points: [[0.3 * width, 0.78 * height], [0.42 * width, 0.66 * height], [0.62 * width, 0.66 * height], [0.74 * width, 0.78 * height]], fill: ROCK },
      { kind: 'polygon', points: [[0.52 * width - half, 0.24 * height], [0.52 * width + half, 0.24 * height], [0.52 * width + 1.5 * half, 0.68 * height], [0.52 * width - 1.5 * half, 0.68 * height]], fill: '#fbf7ee' },
      { kind: 'rect', x: 0.52 * width - 1.25 * half, y: 0.4 * height, width: 2.5 * half, height: 0.09 * height, fill: '#b5442f' },
      { kind: 'rect', x: 0.52 * width - 0.8 * half, y: 0.16 * height, width: 1.6 * half, height: 0.08 * height, fill: ROCK },
      ground(width, height, 0.84, SAND),
    ],
  };
}

/** Someone standing on the sand; their middle at `at` of the width. */
export function person(width: number, height: number, at: number): DrawnPicture {
  const x = at * width;
  const unit = height;
  return {
    width,
    height,
    shapes: [
      { kind: 'rect', x: 0, y: 0, width, height, fill: SKY },
      ground(width, height, 0.5, SEA),
      ground(width, height, 0.7, SAND),
      { kind: 'polygon', points: [[x - 0.16 * unit, 0.86 * unit], [x - 0.12 * unit, 0.44 * unit], [x + 0.12 * unit, 0.44 * unit], [x + 0.16 * unit, 0.86 * unit]], fill: '#b5442f' },
      { kind: 'ellipse', cx: x, cy: 0.3 * unit, rx: 0.1 * unit, ry: 0.13 * unit, fill: '#c98f6a' },
      { kind: 'ellipse', cx: x, cy: 0.21 * unit, rx: 0.105 * unit, ry: 0.07 * unit, fill: '#4a3527' },
    ],
  };
}

/** Harbour lights after dark: a picture whose rim is dark all round. */
export function night(width: number, height: number): DrawnPicture {
  const lamp = (x: number, y: number): PictureShape => ({ kind: 'ellipse', cx: x * width, cy: y * height, rx: 0.022 * width, ry: 0.022 * width, fill: '#f2c14e' });
  return {
    width,
    height,
    shapes: [
      { kind: 'rect', x: 0, y: 0, width, height, fill: '#1f3440' },
      ground(width, height, 0.62, '#16262f'),
      { kind: 'rect', x: 0.3 * width, y: 0.4 * height, width: 0.14 * width, height: 0.22 * height, fill: '#2b4350' },
      { kind: 'rect', x: 0.52 * width, y: 0.46 * height, width: 0.2 * width, height: 0.16 * height, fill: '#2b4350' },
      lamp(0.37, 0.48),
      lamp(0.58, 0.53),
      lamp(0.66, 0.53),
      lamp(0.37, 0.72),
      lamp(0.62, 0.76),
    ],
  };
}
