import { describe, expect, it } from 'vitest';
import { applyPatch, composePatches, diffDocuments, invertPatch, readKey, touchedByBoth } from '#shared/model/patch';
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

  it('names the keys that edits on both sides touch', () => {
    const change = { before: null, after: null };
    const touching = (...keys: string[]) => ({ patch: Object.fromEntries(keys.map((key) => [key, change])) });
    const mine = [touching('page/left', 'table'), touching('reveal')];
    const theirs = [touching('table', 'scheme'), touching('reveal')];
    expect(touchedByBoth(mine, theirs)).toEqual(['reveal', 'table']);
    expect(touchedByBoth(mine, [])).toEqual([]);
  });

  it('refuses a key that no document has', () => {
    expect(() => readKey(doc, 'page/middle')).toThrow(RangeError);
    expect(() => applyPatch(doc, { format: { before: null, after: null } })).toThrow(RangeError);
  });
});
