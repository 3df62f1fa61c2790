import { describe, expect, it } from 'vitest';
import { benchRowSchema, meetsGoal, tableOf } from '../bench/bench';

const row = { id: 'checks.edit.median', value: 1.23456, floor: null, ratio: null, unit: 'ms', goal: 2, better: 'lower' } as const;
const against = { ...row, id: 'intake.jpeg', value: 900, floor: 500, ratio: 1.8, goal: 1.5 };

describe('the bench table', () => {
  it('holds a ratio against the goal where there is a floor, and the value where there is none', () => {
    expect([row, against, { ...row, better: 'higher' as const }].map(meetsGoal)).toEqual([true, false, false]);
  });

  it('marks each figure and lines the columns up', () => {
    expect(tableOf([row, against]).split('\n')).toEqual([
      '      figure                 value   floor  ratio     goal',
      'ok    checks.edit.median  1.235 ms                  ≤ 2 ms',
      'MISS  intake.jpeg           900 ms  500 ms  1.8 ×  ≤ 1.5 ×',
    ]);
  });

  it('refuses a figure that is not a number', () => {
    expect(benchRowSchema.safeParse({ ...row, value: Number.NaN }).success).toBe(false);
  });
});
