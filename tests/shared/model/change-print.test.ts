import { describe, expect, it } from 'vitest';
import { changePrint, printFaults } from '#shared/model/change-print';
import { inches } from '#shared/model/length';
import { buildPrint } from '../../support/builders';

/** 6 × 4 in, 600 × 400 px, all of it on the paper. */
const print = buildPrint({ keepZone: { x: 100, y: 100, width: 50, height: 50 } });

describe('a changed print', () => {
  it('keeps what is not named', () => {
    expect(changePrint(print, { title: 'Pier' })).toEqual({ ...print, title: 'Pier' });
    expect(changePrint(print, { keepZone: null }).keepZone).toBeNull();
    expect(changePrint(print, { marks: { noUp: true } }).marks).toEqual({ ...print.marks, noUp: true });
  });

  it('centres an automatic paper rectangle anew for another size, and leaves the zones on the picture', () => {
    const square = changePrint(print, { paperWidth: inches(4), paperHeight: inches(4) });
    expect(square.paperRect).toEqual({ x: 100, y: 0, width: 400, height: 400 });
    expect(square.keepZone).toBe(print.keepZone);
  });

  it('leaves a paper rectangle that was nudged by hand while the paper keeps its shape', () => {
    const nudged = { ...print, paperRect: { x: 10, y: 0, width: 590, height: 393 } };
    expect(changePrint(nudged, { paperWidth: inches(9), paperHeight: inches(6) }).paperRect).toEqual(nudged.paperRect);
    expect(changePrint(nudged, { turns: 1 }).paperRect).toEqual(nudged.paperRect);
    // A square paper over that rectangle would stretch the picture.
    expect(changePrint(nudged, { paperWidth: inches(4), paperHeight: inches(4) }).paperRect).toEqual({ x: 100, y: 0, width: 400, height: 400 });
    const given = { x: 0, y: 0, width: 300, height: 300 };
    expect(changePrint(print, { paperWidth: inches(4), paperHeight: inches(4), paperRect: given }).paperRect).toEqual(given);
  });

  it('turns the paper over with the picture, unless a size is given', () => {
    const upright = changePrint(print, { turns: 1 });
    expect(upright).toMatchObject({ turns: 1, paperWidth: inches(4), paperHeight: inches(6), paperRect: print.paperRect });
    expect(changePrint(print, { turns: 2 })).toMatchObject({ paperWidth: inches(6), paperHeight: inches(4) });
    expect(changePrint(print, { turns: 3, paperWidth: inches(5) })).toMatchObject({ paperWidth: inches(5), paperHeight: inches(4) });
  });
});

describe('faults of a changed print', () => {
  const faults = (changes: Parameters<typeof changePrint>[1]) => printFaults(changePrint(print, changes), changes).map(({ path }) => path);

  it.each([
    [{ x: 0, y: 0, width: 600, height: 400 }, []],
    [{ x: 0, y: 0, width: 601, height: 400 }, ['keepZone']],
    [{ x: -1, y: 0, width: 10, height: 10 }, ['keepZone']],
  ])('holds the keep zone %j in the part that the paper shows', (keepZone, expected) => {
    expect(faults({ keepZone })).toEqual(expected);
  });

  it('judges the keep zone by the paper that is set with it', () => {
    const keepZone = { x: 0, y: 0, width: 10, height: 10 };
    expect(faults({ keepZone, paperRect: { x: 5, y: 0, width: 300, height: 200 } })).toEqual(['keepZone']);
    expect(faults({ paperRect: { x: 200, y: 200, width: 300, height: 200 } })).toEqual([]);
  });

  it.each([
    [{ x: -65, y: -43, width: 730, height: 487 }, []],
    [{ x: -65, y: -65, width: 730, height: 530 }, ['paperRect']],
    [{ x: -600, y: -400, width: 1800, height: 1200 }, []],
    [{ x: -601, y: -400, width: 1800, height: 1200 }, ['paperRect']],
    [{ x: 600, y: 0, width: 150, height: 100 }, ['paperRect']],
  ])('lets the paper %j reach past the picture within reason', (paperRect, expected) => {
    expect(faults({ paperRect })).toEqual(expected);
  });

  it('wants a horizon with two ends on the picture', () => {
    expect(faults({ horizon: { x1: 0, y1: 200, x2: 600, y2: 210 } })).toEqual([]);
    expect(faults({ horizon: { x1: 0, y1: 200, x2: 601, y2: 210 } })).toEqual(['horizon']);
    expect(faults({ horizon: { x1: 5, y1: 5, x2: 5, y2: 5 } })).toEqual(['horizon']);
  });
});
