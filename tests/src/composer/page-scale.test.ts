import { describe, expect, it } from 'vitest';
import { matLabels, pageAt, pageLeft, pixelsPerInch } from '@/features/composer/canvas/page-scale';
import { inches } from '#shared/model/length';
import { buildScene } from '#shared/scene/build-scene';
import { buildMat, buildSpread, matIdOf } from '../../support/builders';

const PAGE = { color: '#ffffff' };
const NO_SURROUND = { sides: 0, vertical: 0 };

describe('where the pages stand on the screen', () => {
  const apart = buildSpread();
  const doc = { ...apart, binding: { ...apart.binding, gap: inches(1) } };

  it.each([
    ['both', doc],
    ['the left one alone', { ...doc, pages: { left: PAGE, right: null } }],
    ['the right one alone', { ...doc, pages: { left: null, right: PAGE } }],
  ])('is where the scene draws them: %s', (_name, spread) => {
    for (const { side, rect } of buildScene(spread, new Map()).pages) expect(pageLeft(spread, side)).toBe(rect.x);
  });

  it('tells which page a point belongs to, the gap being shared', () => {
    expect([inches(12), inches(12.4), inches(12.6), inches(13)].map((x) => pageAt(doc, x))).toEqual(['left', 'left', 'right', 'right']);
    const last = { ...doc, pages: { left: PAGE, right: null } };
    expect([0, inches(30)].map((x) => pageAt(last, x))).toEqual(['left', 'left']);
    expect(pageAt({ ...doc, pages: { left: null, right: PAGE } }, inches(1))).toBe('right');
  });

  it('gives a single page the whole width', () => {
    const viewport = { width: 1200, height: 5000 };
    expect(pixelsPerInch(viewport, doc, NO_SURROUND)).toBe(48);
    expect(pixelsPerInch(viewport, { ...doc, pages: { left: PAGE, right: null } }, NO_SURROUND)).toBe(100);
  });
});

describe('what a mat is called', () => {
  it('counts each page by rows, what is laid over last', () => {
    const at = (n: number, page: 'left' | 'right', x: number, y: number, z = 0) => buildMat({ id: matIdOf(n), page, x, y, z });
    const labels = matLabels([at(1, 'right', 0, 0), at(2, 'left', 8, 4), at(3, 'left', 0, 4, 1), at(4, 'left', 12, 0), at(5, 'left', 0, 4)]);
    expect([1, 2, 3, 4, 5].map((n) => labels.get(matIdOf(n)))).toEqual(['R1', 'L4', 'L3', 'L1', 'L2']);
  });
});
