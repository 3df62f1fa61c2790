import { describe, expect, it } from 'vitest';
import { wholeLopsided } from '#shared/checks/whole-lopsided';
import { inches } from '#shared/model/length';
import { buildMat, buildPrint, buildSpread, buildView, printContent } from '../../support/builders';

/** A 10 × 8 step mat of 4 7/8 × 3 7/8 in. */
function run(paperWidth: number, paperHeight: number, mode: 'whole' | 'window' = 'whole') {
  const print = buildPrint({ paperWidth, paperHeight });
  return wholeLopsided.run(buildView({ doc: buildSpread({ mats: [buildMat({ w: 10, h: 8, content: printContent(print, { mode }) })] }), prints: [print] }));
}

describe('whole-lopsided', () => {
  it('accepts borders alike, and up to half an inch apart', () => {
    expect(run(inches(4), inches(3))).toEqual([]);
    expect(run(inches(4), inches(2))).toEqual([]);
  });

  it('notes a border that is wider by more', () => {
    expect(run(inches(4), inches(1, 15 / 16))).toMatchObject([{ data: { beside: inches(7 / 16), above: inches(31 / 32) } }]);
    expect(run(inches(2), inches(3))).toHaveLength(1);
  });

  it('does not look at trimmed prints', () => {
    expect(run(inches(2), inches(3), 'window')).toEqual([]);
  });
});
