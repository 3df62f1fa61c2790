import { describe, expect, it } from 'vitest';
import { centreCrop } from '#shared/geometry/paper';
import { guessPrintSize } from '#shared/model/guess-print-size';
import { inches, millimetres } from '#shared/model/length';

/** Photo sizes in inches, and the nominal millimetres of ISO 1008: Wikipedia, "Photo print sizes". */
describe('guessPrintSize', () => {
  it.each([
    ['3 : 2', 6000, 4000, 6, 4],
    ['3 : 2 upright', 4000, 6000, 4, 6],
    ['7 : 5', 2100, 1500, 7, 5],
    ['10 : 7', 3000, 2100, 5, 3.5],
    ['5 : 4', 3000, 2400, 10, 8],
    ['square', 1500, 1500, 4, 4],
    ['nearly square', 1500, 1482, 4, 4],
    ['4 : 3, which labs crop', 4032, 3024, 6, 4],
    ['16 : 9, which labs crop', 3840, 2160, 6, 4],
    ['a panorama', 6000, 2000, 12, 4],
  ])('takes %s (%d × %d px) for %d × %d in', (_shape, width, height, paperWidth, paperHeight) => {
    expect(guessPrintSize({ width, height }, 'in')).toEqual({
      width: inches(paperWidth),
      height: inches(paperHeight),
      instantFilm: false,
    });
  });

  it.each([
    ['3 : 2', 6000, 4000, 152, 102],
    ['13 × 18 upright', 1270, 1780, 127, 178],
    ['9 × 13', 1270, 890, 127, 89],
    ['20 × 25', 2500, 2000, 254, 203],
    ['square', 900, 900, 102, 102],
    ['a panorama', 4000, 1000, 408, 102],
  ])('takes %s (%d × %d px) for %d × %d mm', (_shape, width, height, paperWidth, paperHeight) => {
    expect(guessPrintSize({ width, height }, 'mm')).toMatchObject({
      width: millimetres(paperWidth),
      height: millimetres(paperHeight),
    });
  });

  it.each([
    ['mini', 540, 860, 54, 86],
    ['small square', 720, 860, 72, 86],
    ['square', 880, 1070, 88, 107],
  ])('takes an upright scan in the proportions of a whole %s instant print for one', (_name, width, height, w, h) => {
    expect(guessPrintSize({ width, height }, 'in')).toEqual({
      width: millimetres(w),
      height: millimetres(h),
      instantFilm: true,
    });
  });

  it('never takes a flat picture for instant film, which would forbid its cutting', () => {
    expect(guessPrintSize({ width: 860, height: 540 }, 'in').instantFilm).toBe(false);
  });

  it('leads to a paper rectangle that is the centre of a 4 : 3 file', () => {
    const image = { width: 4032, height: 3024 };
    expect(centreCrop(image, guessPrintSize(image, 'in'), 0)).toEqual({ x: 0, y: 168, width: 4032, height: 2688 });
  });
});
