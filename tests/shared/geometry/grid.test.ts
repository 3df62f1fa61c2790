import { describe, expect, it } from 'vitest';
import { cellRect, contentRect, gridOf, matRect } from '#shared/geometry/grid';
import { inches, millimetres, UNITS_PER_MM } from '#shared/model/length';
import { PAGE_FORMATS, type PageFormat } from '#shared/model/page-format';
import { buildMat } from '../../support/builders';

const format = (id: string): PageFormat => PAGE_FORMATS.find((f) => f.id === id)!;

describe('the page grid', () => {
  it('of 12 × 12 in has 22 × 22 half-inch steps and half-inch margins', () => {
    expect(gridOf(format('12x12in'))).toEqual({ columns: 22, rows: 22, marginX: inches(1 / 2), marginY: inches(1 / 2) });
  });

  it('edge to edge has 24 × 24 steps and no margin', () => {
    expect(gridOf(format('12x12in-bleed'))).toEqual({ columns: 24, rows: 24, marginX: 0, marginY: 0 });
  });

  it.each(PAGE_FORMATS.filter((f) => f.unit === 'mm'))('of $name keeps margins of at least 5 mm and no whole step is wasted', (f) => {
    const { marginX, marginY } = gridOf(f);
    for (const margin of [marginX, marginY]) {
      expect(margin / UNITS_PER_MM).toBeGreaterThanOrEqual(5);
      expect(margin - f.minMargin).toBeLessThan(f.step / 2);
    }
  });

  // A4 is 210 × 297 mm: ISO 216.
  it('of A4 shares the odd half-centimetre on both sides', () => {
    expect(gridOf(format('a4'))).toEqual({ columns: 20, rows: 28, marginX: millimetres(5), marginY: millimetres(8.5) });
  });

  it('is whole for every shipped format, margins shared equally', () => {
    for (const f of PAGE_FORMATS) {
      const grid = gridOf(f);
      expect(2 * grid.marginX + grid.columns * f.step).toBe(f.width);
      expect(2 * grid.marginY + grid.rows * f.step).toBe(f.height);
      expect(Number.isInteger(grid.marginX + grid.marginY)).toBe(true);
    }
  });
});

describe('a mat', () => {
  it('is inset by half a gap, so that neighbours stand exactly one gap apart', () => {
    const f = format('12x12in');
    const left = matRect(f, { x: 0, y: 0, w: 8, h: 6, trueSize: null });
    const right = matRect(f, { x: 8, y: 0, w: 8, h: 6, trueSize: null });
    expect(left).toEqual({ x: inches(9 / 16), y: inches(9 / 16), width: inches(3, 7 / 8), height: inches(2, 7 / 8) });
    expect(right.x - (left.x + left.width)).toBe(f.gap);
  });

  it('bleeds on the rim of an edge-to-edge page, and only there', () => {
    const f = format('12x12in-bleed');
    const whole = matRect(f, { x: 0, y: 0, w: 24, h: 24, trueSize: null });
    expect(whole).toEqual({ x: 0, y: 0, width: inches(12), height: inches(12) });
    const quarter = matRect(f, { x: 12, y: 0, w: 12, h: 12, trueSize: null });
    expect(quarter).toEqual({ x: inches(6, 1 / 16), y: 0, width: inches(5, 15 / 16), height: inches(5, 15 / 16) });
  });

  it('with a true size of its own is centred in its grid rectangle', () => {
    const f = format('12x12in');
    const trueSize = { width: inches(3), height: inches(2) };
    const rect = matRect(f, { x: 2, y: 2, w: 8, h: 6, trueSize });
    const cells = cellRect(f, { x: 2, y: 2, w: 8, h: 6 });
    expect(rect.x - cells.x).toBe(cells.x + cells.width - rect.x - rect.width);
    expect(rect).toMatchObject(trueSize);
  });

  it('carries what its reveals leave, the inner mat’s included, and never less than nothing', () => {
    const f = format('12x12in');
    const mat = buildMat({ x: 0, y: 0, w: 8, h: 6, inner: { color: '#ffffff', reveal: inches(1 / 16) } });
    expect(contentRect(f, inches(1 / 8), mat)).toMatchObject({ width: inches(3, 1 / 2), height: inches(2, 1 / 2) });
    expect(contentRect(f, inches(1 / 8), { ...mat, reveal: inches(4) })).toMatchObject({ width: 0, height: 0 });
    expect(contentRect(f, inches(1 / 8), { ...mat, reveal: 0, inner: null })).toEqual(matRect(f, mat));
  });
});
