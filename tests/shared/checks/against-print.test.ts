import { describe, expect, it } from 'vitest';
import { againstPrint } from '#shared/checks/against-print';
import { runChecks } from '#shared/checks/run-checks';
import { inches } from '#shared/model/length';
import type { PrintMarks } from '#shared/model/print';
import { buildMat, buildPrint, buildSpread, buildView, matIdOf, printContent } from '../../support/builders';

const viewOf = (w: number, h: number, marks: Partial<PrintMarks> = {}, more: ReturnType<typeof buildMat>[] = []) => {
  const print = buildPrint({ paperWidth: inches(6), paperHeight: inches(6.9), imageWidth: 600, imageHeight: 690, marks });
  const mat = buildMat({ id: matIdOf(1), w, h, content: printContent(print) });
  return buildView({ doc: buildSpread({ mats: [mat, ...more] }), prints: [print] });
};

describe('against-print', () => {
  it('notes an upright print trimmed to a flat photo', () => {
    expect(againstPrint.run(viewOf(12, 9))).toMatchObject([{ messageId: 'against-print', data: { isUpright: true }, matIds: [matIdOf(1)] }]);
  });

  it('is content with an upright photo, with a square one, and with a small piece', () => {
    expect(againstPrint.run(viewOf(9, 12))).toEqual([]);
    expect(againstPrint.run(viewOf(10, 10))).toEqual([]);
    expect(againstPrint.run(viewOf(8, 5))).toEqual([]);
  });

  it('goes by the part of the print that is used', () => {
    // 5 5/8 × 4 1/8 in of 6 × 6.9 in are 0.56 of it.
    expect(againstPrint.run(viewOf(12, 9), { part: 0.55 })).toHaveLength(1);
    expect(againstPrint.run(viewOf(12, 9), { part: 0.57 })).toEqual([]);
  });

  it('offers to turn the mat where there is room, and the picture where it has no up', () => {
    const remedy = (...args: Parameters<typeof viewOf>) => runChecks(viewOf(...args)).find(({ checkId }) => checkId === 'against-print')?.remedy?.messageId;
    expect(remedy(12, 9)).toBe('turn-mat');
    expect(remedy(12, 9, {}, [buildMat({ y: 9, w: 12, h: 6 })])).toBeUndefined();
    expect(remedy(12, 9, { noUp: true }, [buildMat({ y: 9, w: 12, h: 6 })])).toBe('turn-picture');
  });

  it('offers to swap two that lie against their mats both ways', () => {
    const flat = buildPrint({ paperWidth: inches(7), paperHeight: inches(6), imageWidth: 700, imageHeight: 600 });
    const upright = buildPrint({ paperWidth: inches(6), paperHeight: inches(7), imageWidth: 600, imageHeight: 700 });
    const mats = [
      buildMat({ id: matIdOf(1), w: 12, h: 10, content: printContent(upright) }),
      buildMat({ id: matIdOf(2), x: 12, w: 10, h: 12, content: printContent(flat) }),
      buildMat({ y: 10, w: 12, h: 4 }),
      buildMat({ x: 12, y: 12, w: 10, h: 4 }),
    ];
    const [note] = runChecks(buildView({ doc: buildSpread({ mats }), prints: [flat, upright] }));
    expect(note?.remedy).toMatchObject({ messageId: 'swap-places', call: { args: { fromMatId: matIdOf(1), toMatId: matIdOf(2) } } });
  });
});
