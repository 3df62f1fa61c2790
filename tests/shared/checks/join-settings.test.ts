import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { CHECK_IDS } from '#shared/checks/check-ids';
import { findThresholdFault, joinSettings, type Setting } from '#shared/checks/join-settings';
import { CHECKS } from '#shared/checks/registry';

const says = (checkId: Setting['checkId'], muted: boolean | null, thresholds: Record<string, number> = {}): Setting => ({ checkId, muted, thresholds });

describe('what a studio and a spread say about checks', () => {
  it('the spread is right where both say something', () => {
    const muted = (studio: boolean | null, spread: boolean | null) => joinSettings([says('no-title', studio)], [says('no-title', spread)]).muted?.has('no-title');
    expect([muted(true, null), muted(true, false), muted(null, true), muted(false, true), muted(null, null)]).toEqual([true, false, true, true, false]);
  });

  it('thresholds join one by one', () => {
    const { thresholds } = joinSettings([says('shaving', null, { a: 1, b: 2 })], [says('shaving', null, { b: 3 })]);
    expect(thresholds).toEqual({ shaving: { a: 1, b: 3 } });
  });

  it('a threshold that a check does not have, or out of its range, is named with the range', () => {
    expect(findThresholdFault('pages-unequal', { difference: 30 })).toBeNull();
    expect(findThresholdFault('pages-unequal', { difference: 3 })).toEqual({ name: 'difference', range: { min: 4, max: 80 } });
    expect(findThresholdFault('pages-unequal', { difference: Number.NaN })).toEqual({ name: 'difference', range: { min: 4, max: 80 } });
    expect(findThresholdFault('pages-unequal', { toString: 1 })).toEqual({ name: 'toString', range: null });
    expect(findThresholdFault('too-many-colors', { colors: 2.5 })).toEqual({ name: 'colors', range: { min: 1, max: 12 } });
  });

  it('every default can be set, and nothing outside the range', () => {
    fc.assert(
      fc.property(fc.constantFrom(...CHECK_IDS), fc.double(), (id, value) => {
        for (const [name, threshold] of Object.entries(CHECKS[id].thresholds)) {
          expect(findThresholdFault(id, { [name]: threshold.default })).toBeNull();
          if (!(value >= threshold.min && value <= threshold.max)) expect(findThresholdFault(id, { [name]: value })).not.toBeNull();
        }
      }),
    );
  });
});
