import { describe, expect, it } from 'vitest';
import { keepZoneCovered } from '#shared/checks/keep-zone-covered';
import { runChecks } from '#shared/checks/run-checks';
import { buildMat, buildPrint, buildSpread, buildView, matIdOf, printContent } from '../../support/builders';
import { TITLE } from '../../support/filled-spread';

/**
 * A 12 × 8 step mat at the page's corner; its photo begins 1/2 + 1/16 + 1/8 in from the page's edge, its keep zone
 * 1 in further. A strip is laid over from grid column `x` on.
 */
const viewOf = (x: number, laidOver = true) => {
  const print = buildPrint({ keepZone: { x: 100, y: 100, width: 100, height: 100 } });
  const mats = [
    buildMat({ id: matIdOf(1), w: 12, h: 8, content: printContent(print) }),
    buildMat({ id: matIdOf(2), x, y: 2, w: 4, h: 3, z: 5, laidOver, content: TITLE }),
  ];
  return buildView({ doc: buildSpread({ mats }), prints: [print] });
};

describe('keep-zone-covered', () => {
  it('notes a strip laid over the subject', () => {
    expect(keepZoneCovered.run(viewOf(2))).toMatchObject([
      { messageId: 'keep-zone-covered', data: { title: 'Lunch on the grass', others: 0 }, matIds: [matIdOf(2), matIdOf(1)] },
    ]);
  });

  it('is content just beside it', () => {
    // The zone ends at 2 11/16 in, and column 4 begins, less half a gap, at 2 9/16 in; column 5 at 3 1/16 in.
    expect(keepZoneCovered.run(viewOf(4))).toHaveLength(1);
    expect(keepZoneCovered.run(viewOf(5))).toEqual([]);
  });

  it('lets a set share be covered', () => {
    expect(keepZoneCovered.run(viewOf(4), { share: 0.13 })).toEqual([]);
  });

  it('offers the shortest way off', () => {
    const note = runChecks(viewOf(4)).find(({ checkId }) => checkId === 'keep-zone-covered');
    expect(note?.remedy).toMatchObject({ messageId: 'move-off', call: { args: { matIds: [matIdOf(2)], dx: 1, dy: 0 } } });
  });
});
