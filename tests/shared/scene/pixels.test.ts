import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { baselineOnPixels, frameEdges, lineToPixels, thicknessToPixels, toPixels } from '#shared/scene/pixels';

describe('toPixels', () => {
  it('moves each edge to its nearest pixel line', () => {
    expect(toPixels({ x: 14, y: 16, width: 20, height: 30 }, 0.1)).toEqual({ x: 1, y: 2, width: 2, height: 3 });
  });

  it('leaves no gap and no overlap between neighbours', () => {
    const length = fc.integer({ min: 0, max: 50_000 });
    fc.assert(
      fc.property(length, length, length, fc.double({ min: 0.001, max: 0.3, noNaN: true }), (x, first, second, scale) => {
        const a = toPixels({ x, y: 0, width: first, height: 1 }, scale);
        const b = toPixels({ x: x + first, y: 0, width: second, height: 1 }, scale);
        expect(a.x + a.width).toBe(b.x);
      }),
    );
  });
});

describe('lines', () => {
  it('are never thinner than one pixel', () => {
    expect(lineToPixels({ x: 0, y: 0, width: 1000, height: 2 }, 0.01)).toEqual({ x: 0, y: 0, width: 10, height: 1 });
    expect([thicknessToPixels(2, 0.01), thicknessToPixels(260, 0.01)]).toEqual([1, 3]);
  });

  it('of one thickness come out alike wherever they lie', () => {
    const heights = [0, 7, 33, 58, 91].map((y) => lineToPixels({ x: 0, y, width: 1000, height: 29 }, 0.05).height);
    expect(heights).toEqual([1, 1, 1, 1, 1]);
    expect(lineToPixels({ x: 130, y: 0, width: 29, height: 1000 }, 0.05)).toEqual({ x: 7, y: 0, width: 1, height: 50 });
  });

  it('of text stand on a pixel line', () => {
    expect(baselineOnPixels(1234, 0.05)).toBeCloseTo(1240);
  });
});

describe('frameEdges', () => {
  it('cover the rim once and leave the inside free', () => {
    const edges = frameEdges({ x: 10, y: 20, width: 8, height: 6 }, 1);
    const covered = new Map<string, number>();
    for (const edge of edges) {
      for (let x = edge.x; x < edge.x + edge.width; x += 1) {
        for (let y = edge.y; y < edge.y + edge.height; y += 1) covered.set(`${x},${y}`, (covered.get(`${x},${y}`) ?? 0) + 1);
      }
    }
    expect(covered.size).toBe(8 * 6 - 6 * 4);
    expect([...covered.values()].every((times) => times === 1)).toBe(true);
    expect(covered.has('11,21')).toBe(false);
  });

  it('fill a rectangle that is too small to have an inside', () => {
    expect(frameEdges({ x: 0, y: 0, width: 2, height: 9 }, 1)).toEqual([{ x: 0, y: 0, width: 2, height: 9 }]);
  });
});
