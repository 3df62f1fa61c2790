import { existsSync } from 'node:fs';
import { describe, expect, it } from 'vitest';
import { CHECK_IDS } from '#shared/checks/check-ids';
import { CHECKS } from '#shared/checks/registry';

describe('the registry of checks', () => {
  it.each(CHECK_IDS)('%s stands under its own id, in a file of its own, with a test of its own', (id) => {
    expect(CHECKS[id].id).toBe(id);
    expect(existsSync(new URL(`../../../shared/checks/${id}.ts`, import.meta.url))).toBe(true);
    expect(existsSync(new URL(`./${id}.test.ts`, import.meta.url))).toBe(true);
  });

  it.each(CHECK_IDS)('%s has defaults within their ranges', (id) => {
    for (const [name, { default: value, min, max }] of Object.entries(CHECKS[id].thresholds)) {
      expect([name, min <= value && value <= max && min < max]).toEqual([name, true]);
    }
  });

  it('lets no two checks yield to each other', () => {
    const reaches = (from: (typeof CHECK_IDS)[number], seen: readonly string[] = []): readonly string[] =>
      (CHECKS[from].yieldsTo ?? []).flatMap((to) => (seen.includes(to) ? [to] : [to, ...reaches(to, [...seen, from])]));
    for (const id of CHECK_IDS) expect(reaches(id)).not.toContain(id);
  });

  it('lets taste never exceed "consider": what judges the filled spread is taste, a bare mat apart', () => {
    const graver = CHECK_IDS.filter((id) => CHECKS[id].needsFilledPages && CHECKS[id].severity !== 'consider');
    expect(graver).toEqual(['bare-mat']);
  });
});
