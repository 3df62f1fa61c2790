import { describe, expect, it } from 'vitest';
import { readStashCsv, writeStashCsv } from '#shared/csv/stash-csv';
import { inches } from '#shared/model/length';
import { buildSheet, buildSide } from '../../support/stash';

describe('the stash as CSV', () => {
  it('is read back as the same sheets, both sides and odd sizes included', () => {
    const sheets = [
      buildSheet({ name: '=Oat, "raw"', maker: '@home', lowAt: 1, price: 125, place: 'Drawer 2' }),
      buildSheet({
        width: 48_801,
        height: inches(8, 0.5),
        sides: [buildSide({ pattern: 'stripe', palette: ['#1d4f5c', '#dc9f33'] }), buildSide({ source: 'photographed', uncertainty: 3.4, hex: '#f3f0e8' })],
      }),
    ];
    const { rows, faults } = readStashCsv(writeStashCsv(sheets));
    expect(faults).toEqual([]);
    expect(rows.map(({ id, facts }) => ({ id, ...facts }))).toEqual(sheets.map(({ studioId: _studio, reserved: _reserved, revision: _revision, ...sheet }) => sheet));
  });

  it('needs a name and a colour, and takes the rest from what is usual', () => {
    const [row] = readStashCsv('Name,Color\nKelp,olive').rows;
    expect(row).toMatchObject({ line: 2, id: null, facts: { name: 'Kelp', width: inches(12), quantity: 1, lowAt: null, sides: [{ hex: '#808000', source: 'typed', uncertainty: 2 }] } });
  });

  it('says of every bad row what is wrong, by line, and keeps its text', () => {
    const csv = ['name,colour,quantity,price,width', 'Oat,#efe6d2,4,1.25,12', 'Fog,greyish,1,,', 'Lamp,#dc9f33,-3,,', 'Slate,#515a62,1,1 dollar,', 'Chalk,#f3f0e8,1,,twelve', ',#ffffff,1,,', '"Open,#ffffff'].join('\n');
    const { rows, faults, heading } = readStashCsv(csv);
    expect(rows.map(({ facts }) => facts.name)).toEqual(['Oat']);
    expect(heading).toBe('name,colour,quantity,price,width');
    expect(faults.map(({ line, message }) => [line, message])).toEqual([
      [3, '“colour” holds “greyish”, which is no colour: write #1d4f5c, a CSS name, or rgb(29 79 92).'],
      [4, '“quantity” holds “-3”: it is a whole number, 0 or more.'],
      [5, '“price” holds “1 dollar”: write it as 1.25, without a sign of currency.'],
      [6, '“width” holds “twelve”: write 12, 8.5 or 8 1/2.'],
      [7, '“name” is missing.'],
      [8, 'A quote is opened and not closed, or text follows a closed one.'],
    ]);
    expect(faults.map(({ text }) => text)).toEqual(csv.split('\n').slice(2));
  });

  it('loses no line where the headings do not fit', () => {
    const { rows, faults } = readStashCsv('title,hex\nOat,#efe6d2');
    expect(rows).toEqual([]);
    expect(faults).toHaveLength(2);
    expect(faults[0]?.message).toContain('no heading “name” and no “colour”');
  });

  it.each([
    ['8 1/2', 'in', inches(8, 0.5)],
    ['1/2', 'in', inches(0, 0.5)],
    ['8,5', 'in', inches(8, 0.5)],
    ['30.5', 'cm', 48_800],
    ['305', 'mm', 48_800],
  ])('reads a width of %s %s', (width, unit, expected) => {
    expect(readStashCsv(`name;colour;width;unit\nOat;#efe6d2;${width};${unit}`).rows[0]?.facts.width).toBe(expected);
  });
});
