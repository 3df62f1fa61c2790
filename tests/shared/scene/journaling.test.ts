import { describe, expect, it } from 'vitest';
import { millimetres } from '#shared/model/length';
import { layoutJournaling } from '#shared/scene/journaling';

describe('ruled lines', () => {
  const rect = { x: 0, y: 0, width: millimetres(50), height: millimetres(40) };
  const rulesOf = (lineHeight: number): number => layoutJournaling({ text: 'Low tide', lineHeight }, rect).rules.length;

  it('lie as far apart as asked, as many as the mat holds', () => {
    expect([millimetres(8), millimetres(9), millimetres(41)].map(rulesOf)).toEqual([5, 4, 0]);
  });

  it('lie 1 mm apart where less is asked, so that no mat takes more than can be drawn', () => {
    expect([millimetres(1), 80, 1].map(rulesOf)).toEqual([40, 40, 40]);
  });
});
