import { describe, expect, it } from 'vitest';
import { lowResolution } from '#shared/checks/low-resolution';
import { inches } from '#shared/model/length';
import { buildMat, buildPrint, buildSpread, buildView, printContent } from '../../support/builders';

function run(imageWidth: number, digital = true) {
  const print = buildPrint({ imageWidth, imageHeight: 2000, marks: { digital } });
  const mat = buildMat({ w: 9, h: 7, content: printContent(print, { scaledWidth: digital ? inches(5) : null }) });
  return lowResolution.run(buildView({ doc: buildSpread({ mats: [mat] }), prints: [print] }));
}

describe('low-resolution', () => {
  it('notes a digital photo under 300 pixels to the inch at its placed size', () => {
    expect(run(1500)).toEqual([]);
    expect(run(1499)).toMatchObject([{ messageId: 'low-resolution', data: { ppi: 299 } }]);
  });

  it('does not ask it of a photo that is printed', () => {
    expect(run(300, false)).toEqual([]);
  });
});
