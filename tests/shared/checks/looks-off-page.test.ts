import { describe, expect, it } from 'vitest';
import { looksOffPage } from '#shared/checks/looks-off-page';
import type { Face } from '#shared/model/print';
import { runChecks } from '#shared/checks/run-checks';
import { inches } from '#shared/model/length';
import { buildMat, buildPrint, buildSpread, buildView, matIdOf, printContent } from '../../support/builders';

const BIG = { paperWidth: inches(12), paperHeight: inches(12), imageWidth: 120, imageHeight: 120 } as const;

/** Two halves on each page; the picture in question lies on the left page's left half or, if said, its right one. */
const viewOf = (facings: readonly Face['facing'][], { half = 0, pages = 'both' as 'both' | 'left' } = {}) => {
  const faces = facings.map((facing) => ({ rect: { x: 5, y: 5, width: 20, height: 20 }, facing }));
  const looking = buildPrint({ ...BIG, title: 'Nora', faces });
  const plain = buildPrint({ ...BIG, copies: 3 });
  const mats = [0, 1, 2, 3].map((i) =>
    buildMat({ id: matIdOf(i + 1), page: i < 2 ? 'left' : 'right', x: 11 * (i % 2), w: 11, h: 22, content: printContent(i === half ? looking : plain) }),
  );
  const doc = buildSpread({ mats: pages === 'left' ? mats.slice(0, 2) : mats, ...(pages === 'left' && { pages: { left: { color: '#ffffff' }, right: null } }) });
  return buildView({ doc, prints: [looking, plain] });
};

describe('looks-off-page', () => {
  it('notes a subject near the outer edge that looks outward', () => {
    expect(looksOffPage.run(viewOf(['left']))).toMatchObject([{ messageId: 'looks-off-page', data: { title: 'Nora' }, matIds: [matIdOf(1)] }]);
    expect(looksOffPage.run(viewOf(['left', 'ahead', undefined]))).toHaveLength(1);
  });

  it('is content with one that looks in, ahead, or both ways', () => {
    for (const facings of [['right'], ['ahead'], [undefined], ['left', 'right'], []] as const) expect(looksOffPage.run(viewOf(facings))).toEqual([]);
  });

  it('does not mind it by the gutter, nor on a page alone', () => {
    expect(looksOffPage.run(viewOf(['left'], { half: 1 }))).toEqual([]);
    expect(looksOffPage.run(viewOf(['left'], { half: 1 }), { share: 1 })).toHaveLength(1);
    expect(looksOffPage.run(viewOf(['left'], { pages: 'left' }))).toEqual([]);
  });

  it('offers a place of the same size on the other page, and never a mirrored picture', () => {
    const note = runChecks(viewOf(['left'])).find(({ checkId }) => checkId === 'looks-off-page');
    expect(note?.remedy).toMatchObject({ messageId: 'swap-places', call: { id: 'prints.move', args: { fromMatId: matIdOf(1), toMatId: matIdOf(3) } } });
  });
});
