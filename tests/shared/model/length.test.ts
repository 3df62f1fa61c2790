import { describe, expect, it } from 'vitest';
import { inches, millimetres, toInches } from '#shared/model/length';

describe('lengths', () => {
  // An inch is exactly 25.4 mm: the international yard and pound agreement of 1959.
  it('hold 1/32 in and 1 mm as whole numbers', () => {
    expect(inches(1 / 32)).toBe(127);
    expect(millimetres(1)).toBe(160);
    expect(inches(1)).toBe(millimetres(25.4));
    expect(toInches(inches(3, 7 / 8))).toBe(3.875);
  });
});
