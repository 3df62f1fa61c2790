import { describe, expect, it } from 'vitest';
import { CHECK_IDS } from '#shared/checks/check-ids';
import { CHECKS } from '#shared/checks/registry';
import { inches } from '#shared/model/length';
import { LIMIT_NAMES } from '#shared/words/en/checks';
import { limitText, limitWords, readLimit } from '#shared/words/limits';

describe('limits of checks', () => {
  it('are read back as they are written, in either unit, for every check', () => {
    for (const id of CHECK_IDS) {
      for (const { default: value, unit: kind } of Object.values(CHECKS[id].thresholds)) {
        for (const unit of ['in', 'mm'] as const) {
          const read = readLimit(limitText(value, kind, unit), kind, unit);
          // A length in millimetres is written to a tenth.
          expect(Math.abs((read ?? Number.NaN) - value), id).toBeLessThanOrEqual(kind === 'length' && unit === 'mm' ? 8 : 1e-6);
        }
      }
    }
  });

  it('are one to a check at most, and have a name where there is one', () => {
    for (const id of CHECK_IDS) {
      const names = Object.keys(CHECKS[id].thresholds);
      expect([id, names.length, LIMIT_NAMES[id] !== undefined]).toEqual([id, names.length === 0 ? 0 : 1, names.length > 0]);
    }
  });

  it('carry their unit once', () => {
    expect([limitWords(inches(1 / 4), 'length', 'in'), limitWords(0.5, 'share', 'in'), limitWords(30, 'degrees', 'in'), limitWords(2, 'steps', 'mm'), limitWords(4, 'count', 'in')]).toEqual([
      '1/4 in',
      '50 %',
      '30°',
      '2 steps',
      '4',
    ]);
  });

  it('take a comma, and nothing that is no number', () => {
    expect(readLimit('1,25', 'ratio', 'in')).toBe(1.25);
    expect(readLimit('3 1/2', 'length', 'in')).toBe(inches(3.5));
    expect(readLimit('2.6', 'count', 'in')).toBe(3);
    for (const text of ['', ' ', 'much', '1e999']) expect(readLimit(text, 'ratio', 'in')).toBeNull();
  });
});
