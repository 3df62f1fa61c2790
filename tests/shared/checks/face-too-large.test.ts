import { describe, expect, it } from 'vitest';
import { faceTooLarge } from '#shared/checks/face-too-large';
import { runChecks } from '#shared/checks/run-checks';
import { inches } from '#shared/model/length';
import { buildMat, buildPrint, buildSpread, buildView, matIdOf, printContent } from '../../support/builders';

/** A face of so many hundredths of an inch, its corner 1 in from the paper's; the mat is w × h steps of 1/2 in. */
const viewOf = (face: { width: number; height: number }, w: number, h: number, x = 0) => {
  const print = buildPrint({ faces: [{ rect: { x: 100, y: 100, ...face } }] });
  return buildView({ doc: buildSpread({ mats: [buildMat({ id: matIdOf(1), w, h, content: printContent(print, { x, y: inches(1) }) })] }), prints: [print] });
};

describe('face-too-large', () => {
  it('notes a photo narrower than the face it shows', () => {
    // Four steps less gap and two reveals leave 1 5/8 in; a face is rounded outward.
    expect(faceTooLarge.run(viewOf({ width: 180, height: 100 }, 4, 6, inches(1)))).toMatchObject([
      { messageId: 'face-too-large', data: { axis: 'wide', face: inches(1.8) + 1, photo: inches(1 + 5 / 8) }, matIds: [matIdOf(1)] },
    ]);
  });

  it('wants a fifth more than the face', () => {
    expect(faceTooLarge.run(viewOf({ width: 135, height: 50 }, 4, 6, inches(1)))).toEqual([]);
    expect(faceTooLarge.run(viewOf({ width: 136, height: 50 }, 4, 6, inches(1)))).toHaveLength(1);
    expect(faceTooLarge.run(viewOf({ width: 136, height: 50 }, 4, 6, inches(1)), { room: 1 })).toEqual([]);
  });

  it('leaves a face alone that is not what the photo shows', () => {
    expect(faceTooLarge.run(viewOf({ width: 180, height: 100 }, 4, 6, inches(3)))).toEqual([]);
  });

  it('offers a larger mat', () => {
    expect(runChecks(viewOf({ width: 180, height: 100 }, 4, 6, inches(1)))[0]).toMatchObject({
      checkId: 'face-too-large',
      remedy: { messageId: 'larger-mat', call: { args: { w: 6 } } },
    });
  });
});
