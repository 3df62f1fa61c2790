import { describe, expect, it } from 'vitest';
import { inches } from '#shared/model/length';
import { DEFAULT_BINDING } from '#shared/model/page-format';
import type { Print } from '#shared/model/print';
import type { Mat, SpreadDocument } from '#shared/model/spread';
import { buildScene } from '#shared/scene/build-scene';
import { pictureCover } from '#shared/scene/picture-cover';
import type { PhotoItem, SceneItem } from '#shared/scene/scene';
import { buildMat, buildPanes, buildPrint, buildSpread, printContent, printsById } from '../../support/builders';

const itemsOf = (doc: SpreadDocument, prints: readonly Print[] = []): readonly SceneItem[] => buildScene(doc, printsById(prints)).items;
const photosOf = (doc: SpreadDocument, prints: readonly Print[]): PhotoItem[] =>
  itemsOf(doc, prints).filter((item) => item.kind === 'photo');

/** An 8 × 6 step mat: 3 7/8 × 2 7/8 in, its photo 3 5/8 × 2 5/8 in, its corner 1/2 + 1/16 in from the page's. */
const FLAT = { w: 8, h: 6 } as const;
const PHOTO_AT = inches(11 / 16);
const PHOTO = { width: inches(3, 5 / 8), height: inches(2, 5 / 8) };

describe('pages of a scene', () => {
  it('touch, with the fold over both, where the binding has no gap', () => {
    const scene = buildScene(buildSpread(), new Map());
    expect(scene.pages.map(({ side, rect }) => [side, rect.x])).toEqual([['left', 0], ['right', inches(12)]]);
    expect([scene.width, scene.height]).toEqual([inches(24), inches(12)]);
    expect(scene.fold!.rect.x).toBeLessThan(inches(12));
    expect(scene.fold!.rect.x + scene.fold!.rect.width).toBeGreaterThan(inches(12));
  });

  it('stand apart by the binding’s gap, without a fold', () => {
    const scene = buildScene(buildSpread({ binding: { ...DEFAULT_BINDING, gap: inches(1 / 2) } }), new Map());
    expect(scene.pages[1]!.rect.x).toBe(inches(12, 1 / 2));
    expect([scene.width, scene.fold]).toEqual([inches(24, 1 / 2), null]);
  });

  it('lie at 0 when single, and mats of the missing page are not drawn', () => {
    const mats = [buildMat({ page: 'left' }), buildMat({ page: 'right' })];
    const scene = buildScene(buildSpread({ pages: { left: null, right: { color: '#eeeeee' } }, mats }), new Map());
    expect([scene.width, scene.pages.map(({ rect }) => rect.x), scene.fold]).toEqual([inches(12), [0], null]);
    expect(new Set(scene.items.map((item) => item.matId))).toEqual(new Set([mats[1]!.id]));
  });
});

describe('a mat in a scene', () => {
  it('is drawn card, inner mat, photo, in that order, moved by its page', () => {
    const print = buildPrint();
    const mat = buildMat({ page: 'right', ...FLAT, inner: { color: '#fdfcf8', reveal: inches(1 / 16) }, content: printContent(print) });
    const rects = itemsOf(buildSpread({ mats: [mat] }), [print]).filter((item) => item.kind !== 'frame');
    expect(rects.map((item) => item.key)).toEqual([`${mat.id}/card`, `${mat.id}/inner`, `${mat.id}/photo`]);
    expect(rects.map((item) => item.kind === 'rect' || item.kind === 'photo' ? item.rect.x - inches(12) : null)).toEqual([inches(9 / 16), inches(11 / 16), inches(3 / 4)]);
  });

  it('that is bare shows its card alone', () => {
    expect(itemsOf(buildSpread({ mats: [buildMat()] })).map((item) => item.kind)).toEqual(['rect', 'frame']);
  });

  it('of an unknown print stays bare', () => {
    const mat = buildMat({ content: printContent('no-such-print') });
    expect(itemsOf(buildSpread({ mats: [mat] })).map((item) => item.kind)).toEqual(['rect', 'frame']);
  });

  it('comes after what it is laid over', () => {
    const under = buildMat({ z: 0 });
    const over = buildMat({ z: 1, laidOver: true });
    const order = itemsOf(buildSpread({ mats: [over, under] })).map((item) => item.matId);
    expect(order).toEqual([under.id, under.id, over.id, over.id]);
  });
});

describe('a photo in a scene', () => {
  const print = buildPrint({ paperWidth: inches(6), paperHeight: inches(4), imageWidth: 600, imageHeight: 400 });
  const photoOf = (mat: Partial<Mat>, of: Print = print): PhotoItem | undefined => photosOf(buildSpread({ mats: [buildMat({ ...FLAT, ...mat })] }), [of])[0];

  it('shows the window at the print’s own scale', () => {
    const photo = photoOf({ content: printContent(print, { x: inches(1), y: inches(1 / 2) }) })!;
    expect(photo.rect).toEqual({ x: PHOTO_AT, y: PHOTO_AT, ...PHOTO });
    expect(photo.source).toEqual({ x: 100, y: 50, width: 362.5, height: 262.5 });
  });

  it('ends where the paper ends', () => {
    const photo = photoOf({ content: printContent(print, { x: inches(3), y: -inches(1 / 4) }) })!;
    expect(photo.rect).toEqual({ x: PHOTO_AT, y: PHOTO_AT + inches(1 / 4), width: inches(3), height: PHOTO.height - inches(1 / 4) });
    expect(photo.source).toEqual({ x: 300, y: 0, width: 300, height: 237.5 });
  });

  it('is not there where the window has left the paper', () => {
    expect(photoOf({ content: printContent(print, { x: inches(6), y: 0 }) })).toBeUndefined();
  });

  it.each([
    [1, { x: PHOTO_AT, y: PHOTO_AT, width: PHOTO.width, height: inches(2) }],
    [3, { x: PHOTO_AT, y: PHOTO_AT + PHOTO.height - inches(2), width: PHOTO.width, height: inches(2) }],
  ] as const)('turned %d times loses the side that leaves the paper', (turn, rect) => {
    // The window is 2 5/8 in wide on the upright paper and starts 2 in before the paper's right edge.
    const photo = photoOf({ content: printContent(print, { x: inches(4), y: 0, turn }) })!;
    expect(photo.rect).toEqual(rect);
    expect(photo.source).toEqual({ x: 400, y: 0, width: 200, height: 362.5 });
    expect(photo.turns).toBe(turn);
  });

  it('adds the print’s own turns to those on the page', () => {
    const turned = buildPrint({ paperWidth: inches(4), paperHeight: inches(6), imageWidth: 600, imageHeight: 400, turns: 1 });
    const photo = photoOf({ content: printContent(turned, { x: 0, y: 0, turn: 2 }) }, turned)!;
    expect(photo.turns).toBe(3);
    // The upright paper's top-left inch is the original's bottom-left, one quarter-turn back.
    expect(photo.source).toEqual({ x: 0, y: 400 - 362.5, width: 262.5, height: 362.5 });
  });

  it('whole keeps its size and lies over the mat’s edges where it is larger', () => {
    const photo = photoOf({ content: printContent(print, { mode: 'whole', x: 7, y: 9 }) })!;
    expect([photo.rect.width, photo.rect.height]).toEqual([inches(6), inches(4)]);
    expect(photo.rect.x).toBe(PHOTO_AT + (PHOTO.width - inches(6)) / 2);
    expect(photo.source).toEqual({ x: 0, y: 0, width: 600, height: 400 });
  });

  it('of a digital photo follows its scaled width', () => {
    const digital = buildPrint({ imageWidth: 600, imageHeight: 400, marks: { digital: true } });
    const photo = photoOf({ content: printContent(digital, { scaledWidth: inches(12) }) }, digital)!;
    expect(photo.source).toEqual({ x: 0, y: 0, width: 181.25, height: 131.25 });
  });
});

describe('a split print in a scene', () => {
  const print = buildPrint({ imageWidth: 600, imageHeight: 400 });
  const mats = [buildMat({ x: 0, w: 4, h: 6 }), buildMat({ x: 4, w: 4, h: 6 })];
  const sourcesOf = (run: 'behind' | 'apart'): PhotoItem['source'][] => {
    const panes = buildPanes(print, mats, { run });
    return photosOf(buildSpread({ mats: panes.mats, panes: [panes.group] }), [print]).map((photo) => photo.source);
  };

  it('runs on behind gap and reveals, which swallow 3/8 in', () => {
    const [first, second] = sourcesOf('behind');
    expect(second!.x - (first!.x + first!.width)).toBeCloseTo(37.5);
  });

  it('spread apart loses nothing', () => {
    const [first, second] = sourcesOf('apart');
    expect(second!.x).toBeCloseTo(first!.x + first!.width);
  });
});

describe('pictureCover', () => {
  const base = { rect: { x: 1000, y: 2000, width: 400, height: 300 }, imageWidth: 80, imageHeight: 100, turns: 0 } as const;

  it('covers all where the source lies on the image', () => {
    expect(pictureCover({ ...base, source: { x: 0, y: 0, width: 80, height: 60 } })).toEqual({
      rect: base.rect,
      source: { x: 0, y: 0, width: 80, height: 60 },
      isWhole: true,
    });
  });

  it('leaves white paper where the source reaches past the image', () => {
    const cover = pictureCover({ ...base, source: { x: -20, y: 0, width: 80, height: 60 } })!;
    expect(cover).toEqual({ rect: { x: 1100, y: 2000, width: 300, height: 300 }, source: { x: 0, y: 0, width: 60, height: 60 }, isWhole: false });
  });

  it.each([
    [1, { x: 1000, y: 2075, width: 400, height: 225 }],
    [2, { x: 1000, y: 2000, width: 300, height: 300 }],
    [3, { x: 1000, y: 2000, width: 400, height: 225 }],
  ] as const)('turns the border with the picture (%d quarter-turns)', (turns, rect) => {
    // A quarter of the source's left side lies off the image.
    expect(pictureCover({ ...base, turns, source: { x: -20, y: 0, width: 80, height: 60 } })!.rect).toEqual(rect);
  });

  it('is nothing where only white paper is in view', () => {
    expect(pictureCover({ ...base, source: { x: 80, y: 0, width: 10, height: 10 } })).toBeNull();
  });
});
