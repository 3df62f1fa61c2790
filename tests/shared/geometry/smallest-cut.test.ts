import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { keepZoneCut } from '#shared/checks/keep-zone-cut';
import { smallestCuts } from '#shared/geometry/smallest-cut';
import { inches } from '#shared/model/length';
import { DEFAULT_REVEAL, TRIM_SETTINGS_INCH } from '#shared/model/trim-settings';
import { buildMat, buildPrint, buildSpread, buildView, formatOf, matIdOf } from '../../support/builders';
import { commandsWith, placeCall } from '../../support/command-driver';

const FORMAT = formatOf('12x12in');
const cutsOf = (print: ReturnType<typeof buildPrint>) => smallestCuts(print, FORMAT, DEFAULT_REVEAL, TRIM_SETTINGS_INCH);
/** True size of a mat of so many steps of 1/2 in. */
const mat = (w: number, h: number) => ({ width: inches(w / 2 - 1 / 8), height: inches(h / 2 - 1 / 8) });

describe('the smallest cut', () => {
  it('is the smallest mat whose photo holds the keep zone with the tolerance to spare', () => {
    // 1 in and twice 1/16 in to spare need a photo of 1 1/8 in; three steps leave 1 1/8 in less than a hair: exactly that.
    expect(cutsOf(buildPrint({ keepZone: { x: 100, y: 100, width: 100, height: 100 } }))).toEqual([mat(3, 3)]);
    expect(cutsOf(buildPrint({ keepZone: { x: 100, y: 100, width: 101, height: 100 } }))).toEqual([mat(4, 3)]);
  });

  it('leaves room for a window that has to sit on the trimmer’s mark', () => {
    // The same keep zone, 1/100 in further right: no mark lies where the window would have to begin.
    expect(cutsOf(buildPrint({ keepZone: { x: 101, y: 100, width: 100, height: 100 } }))).toEqual([mat(4, 3)]);
  });

  it('holds all of a print without a keep zone, and of one that must stay whole', () => {
    expect(cutsOf(buildPrint())).toEqual([mat(13, 9)]);
    expect(cutsOf(buildPrint({ keepZone: { x: 100, y: 100, width: 100, height: 100 }, marks: { instantFilm: true } }))).toEqual([mat(13, 9)]);
  });

  it('comes twice, flat and upright, for a print with no up', () => {
    expect(cutsOf(buildPrint({ keepZone: { x: 100, y: 100, width: 100, height: 200 }, marks: { noUp: true } }))).toEqual([mat(5, 3), mat(3, 5)]);
    expect(cutsOf(buildPrint({ keepZone: { x: 100, y: 100, width: 100, height: 100 }, marks: { noUp: true } }))).toEqual([mat(3, 3)]);
  });

  it('is large enough for the print placed on it, and a step less is not', () => {
    const side = fc.integer({ min: 20, max: 250 });
    fc.assert(
      fc.property(side, side, fc.nat(340), fc.nat(140), (width, height, x, y) => {
        const print = buildPrint({ keepZone: { x, y, width, height } });
        const [cut] = cutsOf(print);
        const steps = (length: number): number => (length + FORMAT.gap) / FORMAT.step;
        const isCut = (w: number, h: number): boolean => {
          const doc = commandsWith([print]).after(buildSpread({ mats: [buildMat({ id: matIdOf(1), w, h })] }), placeCall(print.id, matIdOf(1)));
          const view = buildView({ doc, prints: [print] });
          return keepZoneCut.run(view).length > 0;
        };
        const [w, h] = [steps(cut!.width), steps(cut!.height)];
        expect(isCut(w, h)).toBe(false);
        if (w > 2) expect(isCut(w - 1, h)).toBe(true);
        if (h > 2) expect(isCut(w, h - 1)).toBe(true);
      }),
      { numRuns: 60 },
    );
  });
});
