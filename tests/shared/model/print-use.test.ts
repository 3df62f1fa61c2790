import { describe, expect, it } from 'vitest';
import { inches } from '#shared/model/length';
import { copiesUsed, namedPrints, printUses } from '#shared/model/print-use';
import { buildMat, buildPanes, buildSpread, printContent, printIdOf } from '../../support/builders';

const [a, b, c, d] = [1, 2, 3, 4].map(printIdOf) as [string, string, string, string];

describe('the copies that a spread uses', () => {
  const panes = buildPanes(b, [buildMat({ y: 8 }), buildMat({ x: 4, y: 8 }), buildMat({ x: 8, y: 8 })]);
  const color = (printIds: string[]) => ({ hex: '#112233', printIds });
  const doc = buildSpread({
    mats: [buildMat({ content: printContent(a) }), buildMat({ x: 8, content: printContent(a) }), ...panes.mats],
    panes: [panes.group],
    table: [a, c],
    scheme: { character: 'echo', colors: { base: color([d]), main: color([a]), second: color([]), accent: color([]) } },
  });

  it('are one for a mat, one for a split print and none for one that lies ready', () => {
    expect(Object.fromEntries(copiesUsed(doc, 0))).toEqual({ [a]: 2, [b]: 1, [c]: 0 });
  });

  it('are one for pieces that come out of the same paper, and one each for pieces that overlap', () => {
    const beside = (x: number) => buildSpread({ mats: [buildMat({ content: printContent(a) }), buildMat({ x: 4, content: printContent(a, { x }) })] });
    expect(copiesUsed(beside(inches(3)), inches(1 / 16)).get(a)).toBe(1);
    expect(copiesUsed(beside(inches(1)), inches(1 / 16)).get(a)).toBe(2);
  });

  it('name the mats of each use, all panes of a split print together', () => {
    expect(printUses(doc).get(b)!.map(({ matIds }) => matIds)).toEqual([panes.group.matIds]);
    expect(printUses(doc).get(a)!.map(({ matIds }) => matIds.length)).toEqual([1, 1]);
  });

  it('leave out prints that only gave a colour, which are named all the same', () => {
    expect([...namedPrints(doc)].sort()).toEqual([a, b, c, d].sort());
  });
});
