import { describe, expect, it } from 'vitest';
import { CHECK_IDS } from '#shared/checks/check-ids';
import { CHECKS } from '#shared/checks/registry';
import { CHECK_HELP } from '#shared/words/en/check-help';

describe('the help of every check', () => {
  it('is there for every check of the registry, and for no other', () => {
    expect(Object.keys(CHECK_HELP).sort()).toEqual([...CHECK_IDS].sort());
  });

  it.each(CHECK_IDS)('%s has a short name, whole sentences, and words for every threshold and for no other', (id) => {
    const { name, why, rule, right, thresholds = {} } = CHECK_HELP[id];
    expect(name).toMatch(/^[A-Z].*[^.]$/);
    expect(name.length).toBeLessThanOrEqual(48);
    for (const text of [why, rule, right]) expect(text).toMatch(/^[A-Z].*\.$/);
    expect(Object.keys(thresholds).sort()).toEqual(Object.keys(CHECKS[id].thresholds).sort());
  });

  it('gives no two checks one name', () => {
    expect(new Set(CHECK_IDS.map((id) => CHECK_HELP[id].name)).size).toBe(CHECK_IDS.length);
  });
});
