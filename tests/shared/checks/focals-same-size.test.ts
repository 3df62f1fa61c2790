import { describe, expect, it } from 'vitest';
import { focalsSameSize } from '#shared/checks/focals-same-size';
import { inches } from '#shared/model/length';
import { viewFilled, type MatSketch } from '../../support/filled-spread';

const focal = { focal: true };
const run = (right: MatSketch) => focalsSameSize.run(viewFilled([[0, 0, 10, 8, focal]], [right]));

describe('focals-same-size', () => {
  it('notes two focals of the same shape and size, wherever they stand', () => {
    expect(run([12, 10, 10, 8, focal])).toMatchObject([{ messageId: 'focals-same-size', data: { width: inches(4, 7 / 8), height: inches(3, 7 / 8) } }]);
  });

  it('takes sizes up to 1/4 in apart for the same', () => {
    const ofWidth = (width: number): MatSketch => [0, 0, 12, 8, { focal: true, trueSize: { width, height: inches(3, 7 / 8) } }];
    expect(run(ofWidth(inches(4, 7 / 8) + inches(1 / 4)))).toHaveLength(1);
    expect(run(ofWidth(inches(4, 7 / 8) + inches(1 / 4) + 1))).toEqual([]);
  });

  it('takes a turned focal for another shape', () => {
    expect(run([0, 0, 8, 10, focal])).toEqual([]);
  });
});
