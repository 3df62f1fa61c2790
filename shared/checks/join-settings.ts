import type { CheckId } from './check-ids';
import { CHECKS } from './registry';
import type { CheckSettings } from './run-checks';

/** What a studio or a spread says about one check; null for `muted` leaves it open. */
export interface Setting {
  readonly checkId: CheckId;
  readonly muted: boolean | null;
  readonly thresholds: Readonly<Record<string, number>>;
}

/** What `runChecks` goes by: where spread and studio both say something, the spread is right, threshold by threshold. */
export function joinSettings(studio: readonly Setting[], spread: readonly Setting[]): CheckSettings {
  const muted = new Set<CheckId>();
  const thresholds: Partial<Record<CheckId, Readonly<Record<string, number>>>> = {};
  for (const { checkId, muted: isMuted, thresholds: set } of [...studio, ...spread]) {
    if (isMuted === true) muted.add(checkId);
    if (isMuted === false) muted.delete(checkId);
    if (Object.keys(set).length > 0) thresholds[checkId] = { ...thresholds[checkId], ...set };
  }
  return { muted, thresholds };
}

/** A threshold that cannot be set so: its name, and the range that it has, or null where the check has no such threshold. */
export interface ThresholdFault {
  readonly name: string;
  readonly range: { readonly min: number; readonly max: number } | null;
}

/** The first threshold that the check does not have, or whose value is out of its range; null where all can be set. */
export function findThresholdFault(checkId: CheckId, set: Readonly<Record<string, number>>): ThresholdFault | null {
  const { thresholds } = CHECKS[checkId];
  for (const [name, value] of Object.entries(set)) {
    const threshold = Object.hasOwn(thresholds, name) ? thresholds[name] : undefined;
    if (!threshold) return { name, range: null };
    const isWhole = threshold.unit !== 'count' && threshold.unit !== 'length' ? true : Number.isInteger(value);
    if (!isWhole || !(value >= threshold.min && value <= threshold.max)) return { name, range: { min: threshold.min, max: threshold.max } };
  }
  return null;
}
