import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { area, contains, overlaps } from '#shared/geometry/rects';
import { uncovered } from '#shared/geometry/uncovered';
import type { Rect } from '#shared/model/rect';

const rect = (x: number, y: number, width: number, height: number): Rect => ({ x, y, width, height });

describe('what is not covered of a rectangle', () => {
  it.each([
    ['beside it', [rect(10, 0, 5, 5)], 100],
    ['all of it', [rect(-1, -1, 12, 12)], 0],
    ['its middle', [rect(3, 3, 4, 4)], 84],
    ['the same part twice', [rect(0, 0, 5, 10), rect(0, 0, 5, 10)], 50],
    ['two corners that share a part', [rect(0, 0, 6, 6), rect(4, 4, 6, 6)], 32],
  ])('covered %s', (_, covers, left) => {
    expect(uncovered(rect(0, 0, 10, 10), covers).reduce((sum, part) => sum + area(part), 0)).toBe(left);
  });

  it('is made of parts that lie in it, under none of the covers, and not over each other', () => {
    const rects = fc.record({ x: fc.nat(20), y: fc.nat(20), width: fc.integer({ min: 1, max: 12 }), height: fc.integer({ min: 1, max: 12 }) });
    fc.assert(
      fc.property(rects, fc.array(rects, { maxLength: 5 }), (whole, covers) => {
        const parts = uncovered(whole, covers);
        for (const part of parts) {
          expect(contains(whole, part)).toBe(true);
          expect(covers.some((cover) => overlaps(cover, part))).toBe(false);
        }
        parts.forEach((part, i) => expect(parts.slice(i + 1).some((other) => overlaps(other, part))).toBe(false));
      }),
    );
  });
});
