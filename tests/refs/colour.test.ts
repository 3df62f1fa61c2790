import { describe, expect, it } from 'vitest';
import { ciede2000 } from '#shared/colour/ciede2000';
import { contrastRatio } from '#shared/colour/contrast';
import { hexToLab, hexToOklab, hexToRgb, rgbToHex, rgbToXyz, xyzToOklab } from '#shared/colour/convert';
import { measureSwatches } from '#shared/colour/swatches';
import { readReference } from '../support/refs';

type Row = Readonly<Record<string, string>>;

/** Rows of a reference table, by column name. */
function table(name: string): Row[] {
  const [head, ...lines] = readReference(`colour/${name}`).trim().split(/\r?\n/);
  const columns = head!.split(',');
  return lines.map((line) => {
    const cells = line.split(',');
    return Object.fromEntries(columns.map((column, i) => [column, cells[i] ?? '']));
  });
}

const numbers = (row: Row, ...columns: string[]): number[] => columns.map((column) => Number(row[column]));
const near = (actual: readonly number[], expected: readonly number[], tolerance: number): void =>
  actual.forEach((value, i) => expect(Math.abs(value - expected[i]!)).toBeLessThanOrEqual(tolerance));

describe('published colour tables', () => {
  it.each(table('ciede2000_sharma_odd_pairs.csv'))('CIEDE2000 of pair $pair is $dE00 (Sharma, Wu, Dalal 2005)', (row) => {
    const [l1, a1, b1, l2, a2, b2, published] = numbers(row, 'L1', 'a1', 'b1', 'L2', 'a2', 'b2', 'dE00') as [
      number, number, number, number, number, number, number,
    ];
    near([ciede2000([l1, a1, b1], [l2, a2, b2])], [published], 6e-5);
  });

  it.each(table('oklab_ottosson_xyz.csv'))('OKLab of XYZ $X $Y $Z (Ottosson 2020)', (row) => {
    const [x, y, z] = numbers(row, 'X', 'Y', 'Z') as [number, number, number];
    near(xyzToOklab(x, y, z), numbers(row, 'L', 'a', 'b'), 1e-3);
  });

  const named = new Map(table('css_named_colors.csv').map((row) => [row['name']!, row['hex']!]));

  it.each(table('oklab_srgb_primaries.csv'))('OKLab of $colour', (row) => {
    near(hexToOklab(named.get(row['colour']!) ?? '#ffffff'), numbers(row, 'L', 'a', 'b'), 1e-5);
  });

  it.each(table('srgb_conversions_odd.csv'))('XYZ, Lab and OKLab of $input (CSS Color 4)', (row) => {
    const hex = rgbToHex(...(numbers(row, 'r', 'g', 'b') as [number, number, number]));
    near(rgbToXyz(...hexToRgb(hex)), numbers(row, 'X_d65', 'Y_d65', 'Z_d65'), 1e-6);
    near(hexToLab(hex), numbers(row, 'L_d65', 'a_d65', 'b_d65'), 1e-4);
    near(hexToOklab(hex), numbers(row, 'ok_L', 'ok_a', 'ok_b'), 1e-6);
  });

  it('reads every CSS named colour’s hex as its channels', () => {
    for (const row of table('css_named_colors.csv')) expect(hexToRgb(row['hex']!)).toEqual(numbers(row, 'r', 'g', 'b'));
  });

  it.each(table('delta_e_misc.csv').filter((row) => row['formula'] === '2000'))('CIEDE2000 of $c1 and $c2', (row) => {
    const labOf = (text: string) => {
      const lab = /^lab\((\S+) (\S+) (\S+)\)$/.exec(text);
      return lab ? ([Number(lab[1]), Number(lab[2]), Number(lab[3])] as const) : hexToLab(named.get(text) ?? text);
    };
    // color.js measures sRGB colours in Lab D50, we in D65: the same to 0.03 here.
    near([ciede2000(labOf(row['c1']!), labOf(row['c2']!))], [Number(row['deltaE'])], row['c1']!.startsWith('lab') ? 1e-4 : 0.03);
  });

  it.each(table('wcag_contrast_open.csv'))('contrast of $fg on $bg is $ratio (WCAG 2.2)', (row) => {
    // The table's luminance factors have four digits, ours are CSS Color 4's.
    near([contrastRatio(row['fg']!, row['bg']!)], [Number(row['ratio'])], 2e-3);
  });

  it('finds the flat fields of the 24-patch target in the palette, and no colour besides', () => {
    const patches = table('colorchecker24_all.csv').map((row) => numbers(row, 'R_published', 'G_published', 'B_published'));
    const hexes = patches.map(([r, g, b]) => rgbToHex(r!, g!, b!));
    const swatches = measureSwatches(Uint8Array.from(patches.flatMap((patch) => Array.from({ length: 50 }, () => patch).flat())), []);
    expect(swatches.length).toBeGreaterThanOrEqual(10);
    for (const { hex } of swatches) expect(hexes).toContain(hex);
  });
});
