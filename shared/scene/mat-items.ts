import { inkOn } from '../colour/contrast';
import { contentRect, innerMatRect, matRect } from '../geometry/grid';
import { inset, movedBy } from '../geometry/rects';
import type { Hex } from '../model/ids';
import { inches } from '../model/length';
import type { Rect } from '../model/rect';
import type { Content, Mat, SpreadDocument } from '../model/spread';
import { layoutJournaling } from './journaling';
import { layoutLabel } from './label';
import { layoutLettering, type PlacedLine } from './lettering';
import { patternedPaper } from './patterned-paper';
import type { FontId, PhotoItem, SceneItem } from './scene';
import { capHeightOf, missingBoxWidth } from './text';

/** A card's cut edge catches a little shade, without which a mat of the page's colour could not be seen. */
const EDGE = { thickness: inches(1 / 96), fill: '#1b1d22', opacity: 0.2 } as const;
/** Ruled lines are the writing's own colour, faint. */
const RULE_OPACITY = 0.2;
const KEEPSAKE = { fill: '#f4f2ea', ink: '#4a4d57', edge: inches(1 / 32) } as const;
const MISSING_STROKE_EM = 1 / 24;

/** Everything that one mat shows, from its card upwards, in drawing order. */
export function matItems(doc: SpreadDocument, mat: Mat, photo: PhotoItem | null, at: Rect): SceneItem[] {
  const place = (rect: Rect): Rect => movedBy(rect, at);
  const inner = innerMatRect(doc.format, doc.reveal, mat);
  return [
    ...card(mat, 'card', place(matRect(doc.format, mat)), mat.color),
    ...(inner && mat.inner ? card(mat, 'inner', place(inner), mat.inner.color) : []),
    ...carried(mat, photo, place(contentRect(doc.format, doc.reveal, mat))),
  ];
}

function card(mat: Mat, name: string, rect: Rect, fill: Hex): SceneItem[] {
  if (rect.width <= 0 || rect.height <= 0) return [];
  return [
    { kind: 'rect', key: `${mat.id}/${name}`, matId: mat.id, rect, fill },
    { kind: 'frame', key: `${mat.id}/${name}/edge`, matId: mat.id, rect, ...EDGE },
  ];
}

function carried(mat: Mat, photo: PhotoItem | null, rect: Rect): SceneItem[] {
  const { content } = mat;
  switch (content.kind) {
    case 'bare':
      return [];
    case 'print':
    case 'pane':
      return photo ? [photo] : [];
    case 'paper':
      return rect.width > 0 && rect.height > 0 ? patternedPaper(mat.id, content, rect) : [];
    case 'lettering': {
      const { size, lines } = layoutLettering(content, rect);
      return textItems(mat, 'young-serif', size, content.color, lines);
    }
    case 'journaling': {
      const { size, lines, rules } = layoutJournaling(content, rect);
      const ruled = rules.map((rule, i): SceneItem => ({
        kind: 'rect',
        key: `${mat.id}/rule/${i}`,
        matId: mat.id,
        rect: rule,
        fill: content.color,
        opacity: RULE_OPACITY,
        isLine: true,
      }));
      return [...ruled, ...textItems(mat, 'atkinson-italic', size, content.color, lines)];
    }
    case 'embellishment':
      return embellishment(mat, content, rect);
    case 'keepsake':
      return keepsake(mat, content, rect);
  }
}

/** A disc of the embellishment's colour as large as its place, its name upon it. */
function embellishment(mat: Mat, content: Extract<Content, { kind: 'embellishment' }>, rect: Rect): SceneItem[] {
  const r = Math.min(rect.width, rect.height) / 2;
  if (r <= 0) return [];
  const cx = rect.x + rect.width / 2;
  const cy = rect.y + rect.height / 2;
  // The largest square in a circle of radius r has sides of r√2.
  const half = r * Math.SQRT1_2;
  const label = layoutLabel(content.name, { x: cx - half, y: cy - half, width: 2 * half, height: 2 * half });
  return [
    { kind: 'circle', key: `${mat.id}/shape`, matId: mat.id, cx, cy, r, fill: content.color },
    ...(label ? textItems(mat, 'atkinson', label.size, inkOn(content.color), label.lines) : []),
  ];
}

/** A paper of the keepsake's true size, centred, with its name; it lies over its mat where it is larger. */
function keepsake(mat: Mat, content: Extract<Content, { kind: 'keepsake' }>, place: Rect): SceneItem[] {
  const { width, height } = content;
  const rect = {
    x: place.x + Math.floor((place.width - width) / 2),
    y: place.y + Math.floor((place.height - height) / 2),
    width,
    height,
  };
  const label = layoutLabel(content.name, inset(rect, 3 * KEEPSAKE.edge));
  return [
    { kind: 'rect', key: `${mat.id}/shape`, matId: mat.id, rect, fill: KEEPSAKE.fill },
    { kind: 'frame', key: `${mat.id}/shape/edge`, matId: mat.id, rect, thickness: KEEPSAKE.edge, fill: KEEPSAKE.ink, opacity: 0.5 },
    ...(label ? textItems(mat, 'atkinson', label.size, KEEPSAKE.ink, label.lines) : []),
  ];
}

function textItems(mat: Mat, font: FontId, size: number, fill: Hex, lines: readonly PlacedLine[]): SceneItem[] {
  const capHeight = capHeightOf(font, size);
  return lines.flatMap(({ line, x, baseline }, i): SceneItem[] => {
    const boxes = line.missing.map((left, j): SceneItem => ({
      kind: 'frame',
      key: `${mat.id}/text/${i}/missing/${j}`,
      matId: mat.id,
      rect: { x: x + left, y: baseline - capHeight, width: missingBoxWidth(size) * 0.85, height: capHeight },
      thickness: size * MISSING_STROKE_EM,
      fill,
    }));
    if (line.text === '') return boxes;
    const xs = line.xs.map((left) => x + left);
    return [{ kind: 'text', key: `${mat.id}/text/${i}`, matId: mat.id, font, size, fill, text: line.text, xs, baseline }, ...boxes];
  });
}
