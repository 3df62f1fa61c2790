import { describe, expect, it } from 'vitest';
import { namedPrints, printUse } from '#shared/model/print-use';
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
    expect(Object.fromEntries(printUse(doc))).toEqual({ [a]: 2, [b]: 1, [c]: 0 });
  });

  it('leave out prints that only gave a colour, which are named all the same', () => {
    expect([...namedPrints(doc)].sort()).toEqual([a, b, c, d].sort());
  });
});
