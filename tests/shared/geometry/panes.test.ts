import { describe, expect, it } from 'vitest';
import { paneWindow } from '#shared/geometry/panes';

const four = [
  { x: 0, y: 0, width: 100, height: 80 },
  { x: 120, y: 0, width: 100, height: 80 },
  { x: 0, y: 100, width: 100, height: 80 },
  { x: 120, y: 100, width: 100, height: 80 },
];

describe('a split print', () => {
  it('that runs on behind loses what gaps and reveals swallow', () => {
    const { size, parts } = paneWindow(four, 'behind');
    expect(size).toMatchObject({ width: 220, height: 180 });
    expect(parts[3]).toEqual({ x: 120, y: 100, width: 100, height: 80 });
  });

  it('that is spread apart loses nothing: the panes lie edge to edge on the picture', () => {
    const { size, parts } = paneWindow(four, 'apart');
    expect(size).toEqual({ width: 200, height: 160 });
    expect(parts.map(({ x, y }) => [x, y])).toEqual([
      [0, 0],
      [100, 0],
      [0, 80],
      [100, 80],
    ]);
  });

  it('does not count from the page’s edge', () => {
    const moved = four.map((r) => ({ ...r, x: r.x + 999, y: r.y + 5 }));
    expect(paneWindow(moved, 'apart')).toEqual(paneWindow(four, 'apart'));
  });

  it('has at least one pane', () => {
    expect(() => paneWindow([], 'behind')).toThrow(RangeError);
  });
});
