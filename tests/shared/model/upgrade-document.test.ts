import { describe, expect, it } from 'vitest';
import { upgradeDocument } from '#shared/model/upgrade-document';
import { buildSpread } from '../../support/builders';

describe('a stored document', () => {
  it('of today’s version is taken as it is', () => {
    const doc = buildSpread();
    expect(upgradeDocument(doc)).toBe(doc);
  });

  it('of an older version is upgraded step by step and held against the schema', () => {
    const { table: _table, ...old } = buildSpread();
    const upgrades = { [-1]: (doc: object) => ({ ...doc, table: 'none' }), 0: (doc: object) => ({ ...doc, table: [] }) };
    expect(upgradeDocument({ ...old, schemaVersion: -1 }, upgrades)).toEqual(buildSpread());
    expect(() => upgradeDocument({ ...old, schemaVersion: 0 }, { 0: (doc) => ({ ...doc }) })).toThrow(/table/);
  });

  it.each([{ schemaVersion: 2 }, { schemaVersion: '1' }, {}, null])('of no known version is refused: %j', (stored) => {
    expect(() => upgradeDocument(stored)).toThrow(RangeError);
  });
});
