import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { canHold, centreWindow, placedPaper, slideWindow, spareShavings, windowOnPaper } from '#shared/geometry/window';
import { inches } from '#shared/model/length';

const paper = { width: inches(6), height: inches(4) };
const window = { width: inches(3, 5 / 8), height: inches(2, 5 / 8) };
const mark = inches(1 / 16);

describe('a window', () => {
  it('never zooms: it has the photo’s size, exchanged for an odd turn', () => {
    expect(windowOnPaper({ x: 5, y: 7, turn: 0 }, window)).toEqual({ x: 5, y: 7, ...window });
    expect(windowOnPaper({ x: 5, y: 7, turn: 3 }, window)).toEqual({ x: 5, y: 7, width: window.height, height: window.width });
  });

  it('sits on the trimmer’s finest mark and stays on the paper', () => {
    fc.assert(
      fc.property(fc.integer({ min: -50_000, max: 50_000 }), fc.integer({ min: -50_000, max: 50_000 }), (x, y) => {
        const at = slideWindow(x, y, window, paper, mark);
        expect(at.x % mark).toBe(0);
        expect(at.y % mark).toBe(0);
        expect(at.x).toBeGreaterThanOrEqual(0);
        expect(at.x + window.width).toBeLessThanOrEqual(paper.width);
        expect(at.y + window.height).toBeLessThanOrEqual(paper.height);
      }),
    );
  });

  it('is centred where the paper is too small, so that what is missing shows on both sides', () => {
    const at = slideWindow(0, 0, { width: inches(7), height: inches(3) }, paper, mark);
    expect(at).toEqual({ x: -inches(1 / 2), y: 0 });
  });

  it('can hold a part of the paper just where one of its places on the mark does', () => {
    const length = fc.integer({ min: 1, max: 9000 });
    fc.assert(
      fc.property(length, length, length, fc.nat(), fc.integer({ min: 1, max: 400 }), (paperSide, side, zoneSide, at, step) => {
        const size = { width: paperSide, height: 100 };
        const zone = { x: at % paperSide, y: 0, width: Math.min(zoneSide, paperSide - (at % paperSide)), height: 100 };
        const holds = (x: number): boolean => x <= zone.x && x + side >= zone.x + zone.width;
        const places = Array.from({ length: Math.ceil(paperSide / step) + 1 }, (_, i) => slideWindow(i * step, 0, { width: side, height: 100 }, size, step).x);
        expect(canHold(zone, { width: side, height: 100 }, size, step)).toBe(places.some(holds));
      }),
      { numRuns: 300 },
    );
  });

  it('centres on a keep zone, as far as the paper goes', () => {
    const zone = { x: inches(5), y: inches(1), width: inches(1), height: inches(1) };
    expect(centreWindow(window, paper, mark, zone)).toEqual({ x: inches(2, 3 / 8), y: inches(3 / 16) });
  });
});

describe('a digital photo', () => {
  it('is scaled in proportion', () => {
    expect(placedPaper({ paperWidth: inches(6), paperHeight: inches(4) }, { scaledWidth: inches(3) })).toEqual({ width: inches(3), height: inches(2) });
  });
});

describe('a window that would leave a shaving', () => {
  const keep = { x: inches(1), y: inches(1, 1 / 2), width: inches(2), height: inches(2) };

  it('slides to the edge and spares the cut', () => {
    expect(spareShavings({ x: inches(3 / 16), y: inches(1, 3 / 16) }, window, paper, keep, mark)).toEqual({ x: 0, y: inches(1, 3 / 8) });
  });

  it('stays where sliding would lose what it keeps', () => {
    const edge = { ...keep, x: inches(1 / 8), width: inches(3, 5 / 8) };
    expect(spareShavings({ x: inches(1 / 8), y: 0 }, window, paper, edge, mark).x).toBe(inches(1 / 8));
  });

  it('stays where a strip of a quarter inch or more comes off anyway', () => {
    expect(spareShavings({ x: inches(1 / 4), y: inches(1 / 2) }, window, paper, keep, mark)).toEqual({ x: inches(1 / 4), y: inches(1 / 2) });
  });

  it('stays where the whole rest is a shaving', () => {
    const tight = { width: inches(5, 7 / 8), height: inches(3) };
    expect(spareShavings({ x: inches(1 / 16), y: inches(1 / 2) }, tight, paper, null, mark).x).toBe(inches(1 / 16));
  });
});
