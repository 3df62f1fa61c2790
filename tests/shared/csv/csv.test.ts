import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { formatCsv, parseCsv, readCell } from '#shared/csv/csv';

const cellsOf = (text: string) => parseCsv(text).map(({ cells }) => cells);

describe('reading CSV', () => {
  it('knows quotes, doubled quotes, and commas and lines inside them', () => {
    const records = parseCsv('a,"b, ""c"""\r\n"two\nlines",d\r\n');
    expect(records.map(({ cells, line }) => [line, ...cells])).toEqual([
      [1, 'a', 'b, "c"'],
      [2, 'two\nlines', 'd'],
    ]);
  });

  it('counts lines past blank ones and past quoted line ends', () => {
    expect(parseCsv('a\n\n"b\nc"\nd').map(({ line }) => line)).toEqual([1, 3, 5]);
  });

  it('takes semicolons and tabs, and a byte order mark', () => {
    expect(cellsOf('\uFEFFname;colour\nOat;"rgb(1, 2, 3)"')).toEqual([
      ['name', 'colour'],
      ['Oat', 'rgb(1, 2, 3)'],
    ]);
    expect(cellsOf('a\tb')).toEqual([['a', 'b']]);
  });

  it('says which record is broken, and keeps its text', () => {
    expect(parseCsv('a,b\n"c,d')).toMatchObject([{ isBroken: false }, { isBroken: true, text: '"c,d' }]);
    expect(parseCsv('"a"b,c')).toMatchObject([{ isBroken: true }]);
  });
});

describe('writing CSV', () => {
  it.each(['=1+1', '+1', '-2', '@SUM(A1)', '\tx', "'=1"])('makes %j harmless', (cell) => {
    const [written] = cellsOf(formatCsv([[cell]]))[0]!;
    expect(written).toMatch(/^'/);
    expect(readCell(written!)).toBe(cell);
  });

  it('is read back as it was, whatever stands in it', () => {
    const cell = fc.string({ unit: 'grapheme' });
    fc.assert(
      fc.property(fc.array(fc.tuple(fc.constant('x'), cell, cell), { minLength: 1 }), (rows) => {
        expect(cellsOf(formatCsv([['a', 'b', 'c'], ...rows])).slice(1).map((cells) => cells.map(readCell))).toEqual(rows);
      }),
    );
  });
});
