import { describe, expect, it } from 'vitest';
import { applyPatch, composePatches, diffDocuments, invertPatch, readKey, sharedKeys } from '#shared/model/patch';
import { buildMat, buildSpread } from '../../support/builders';

const a = buildMat({ x: 0, y: 0, w: 4, h: 4, z: 1 });
const b = buildMat({ x: 4, y: 0, w: 4, h: 4, z: 2 });
const doc = buildSpread({ mats: [a, b] });

describe('a patch', () => {
  it('keeps mats in drawing order, also when a mat comes back', () => {
    const removal = { [`mat/${a.id}`]: { before: a, after: null } };
    const without = applyPatch(doc, removal);
    expect(without.mats.map((mat) => mat.id)).toEqual([b.id]);
    expect(applyPatch(without, invertPatch(removal))).toEqual(doc);
  });

  it('leads from one document to another', () => {
    const to = buildSpread({ ...doc, mats: [{ ...a, color: '#000000' }], pages: { ...doc.pages, left: { color: '#123456' } } });
    const patch = diffDocuments(doc, to);
    expect(Object.keys(patch).sort()).toEqual([`mat/${a.id}`, `mat/${b.id}`, 'page/left'].sort());
    expect(applyPatch(doc, patch)).toEqual(to);
  });

  it('loses a key that ends where it began', () => {
    const there = { [`mat/${a.id}`]: { before: a, after: { ...a, x: 8 } } };
    expect(composePatches(there, invertPatch(there))).toEqual({});
  });

  it('names the keys that two edits both touch', () => {
    const first = { 'page/left': { before: null, after: { color: '#111111' } }, table: { before: [], after: [] } };
    expect(sharedKeys(first, { table: { before: [], after: [] } })).toEqual(['table']);
  });

  it('refuses a key that no document has', () => {
    expect(() => readKey(doc, 'page/middle')).toThrow(RangeError);
    expect(() => applyPatch(doc, { format: { before: null, after: null } })).toThrow(RangeError);
  });
});
