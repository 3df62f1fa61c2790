import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { centreCrop, differsInShape, toPaper, toPicture, turnInBox, turnedSize } from '#shared/geometry/paper';
import { inches } from '#shared/model/length';
import type { Turns } from '#shared/model/ids';

const turns = fc.constantFrom<Turns>(0, 1, 2, 3);

describe('turning in a box', () => {
  it('takes the top-left corner clockwise to the top right', () => {
    const corner = { x: 0, y: 0, width: 10, height: 5 };
    const box = { width: 60, height: 40 };
    expect(turnInBox(corner, box, 1)).toEqual({ x: 35, y: 0, width: 5, height: 10 });
    expect(turnInBox(corner, box, 2)).toEqual({ x: 50, y: 35, width: 10, height: 5 });
    expect(turnInBox(corner, box, 3)).toEqual({ x: 0, y: 50, width: 5, height: 10 });
  });

  it('four quarter-turns change nothing', () => {
    const r = { x: 3, y: 7, width: 11, height: 13 };
    let box = { width: 60, height: 40 };
    let turned = r;
    for (let i = 0; i < 4; i += 1) {
      turned = turnInBox(turned, box, 1);
      box = turnedSize(box, 1);
    }
    expect(turned).toEqual(r);
  });
});

describe('from picture to paper', () => {
  const frame = { paperRect: { x: 0, y: 0, width: 1500, height: 1000 }, paperWidth: inches(6), paperHeight: inches(4), turns: 0 as Turns };

  it('measures a keep zone on the paper from its left and top edges', () => {
    expect(toPaper(frame, { x: 375, y: 250, width: 750, height: 500 })).toEqual({
      x: inches(1, 1 / 2),
      y: inches(1),
      width: inches(3),
      height: inches(2),
    });
  });

  it('rounds outward, so that nothing kept is lost to rounding', () => {
    const rect = toPaper({ ...frame, paperWidth: inches(6) + 1 }, { x: 1, y: 1, width: 3, height: 3 });
    expect(rect.x).toBe(Math.floor((inches(6) + 1) / 1500));
    expect(rect.x + rect.width).toBe(Math.ceil((4 * (inches(6) + 1)) / 1500));
  });

  it('counts a white border: the paper rectangle may reach past the image', () => {
    const bordered = { ...frame, paperRect: { x: -50, y: -50, width: 1600, height: 1100 }, paperWidth: 16_000, paperHeight: 11_000 };
    expect(toPaper(bordered, { x: 0, y: 0, width: 1500, height: 1000 })).toEqual({ x: 500, y: 500, width: 15_000, height: 10_000 });
  });

  it('keeps zones on the same place of the picture when size, crop or turn are corrected', () => {
    fc.assert(
      fc.property(
        fc.integer({ min: 0, max: 900 }),
        fc.integer({ min: 0, max: 600 }),
        fc.integer({ min: 1, max: 500 }),
        fc.integer({ min: 8_000, max: 60_000 }),
        turns,
        (x, y, side, paperWidth, turn) => {
          const zone = { x, y, width: side, height: side };
          const moved = { ...frame, paperWidth, turns: turn };
          const back = toPicture(moved, toPaper(moved, zone));
          const px = Math.max(1500, 1000) / Math.min(paperWidth, frame.paperHeight);
          expect(back.x).toBeLessThanOrEqual(zone.x + 1e-6);
          expect(back.x).toBeGreaterThan(zone.x - 2 * px);
          expect(back.x + back.width).toBeGreaterThanOrEqual(zone.x + zone.width - 1e-6);
          expect(back.y + back.height).toBeLessThan(zone.y + zone.height + 2 * px);
        },
      ),
    );
  });
});

describe('the paper rectangle', () => {
  it('starts as the centre crop of the file in the print’s proportions', () => {
    expect(centreCrop({ width: 4000, height: 3000 }, { width: 6, height: 4 }, 0)).toEqual({ x: 0, y: 166, width: 4000, height: 2667 });
    expect(centreCrop({ width: 3000, height: 4000 }, { width: 6, height: 4 }, 1)).toEqual({ x: 166, y: 0, width: 2667, height: 4000 });
  });

  it('flags a file whose shape is not the paper’s', () => {
    const print = { imageWidth: 4000, imageHeight: 3000, paperWidth: inches(6), paperHeight: inches(4), turns: 0 as Turns };
    expect(differsInShape(print)).toBe(true);
    expect(differsInShape({ ...print, imageHeight: 2667 })).toBe(false);
    expect(differsInShape({ ...print, imageWidth: 2667, imageHeight: 4000, turns: 1 })).toBe(false);
  });
});
