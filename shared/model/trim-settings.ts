import { inches, millimetres } from './length';
import type { TrimSettings } from './spread';

/** PRODUCT.md section 3; common practice for hand trimmers. */
export const TRIM_SETTINGS_INCH: TrimSettings = { tolerance: inches(1 / 16), finestMark: inches(1 / 16) };
export const TRIM_SETTINGS_METRIC: TrimSettings = { tolerance: millimetres(1.5), finestMark: millimetres(1) };
/** What a trimmer is taken for until somebody sets it, by the unit that the studio reads. */
export const TRIM_SETTINGS: Readonly<Record<'in' | 'mm', TrimSettings>> = { in: TRIM_SETTINGS_INCH, mm: TRIM_SETTINGS_METRIC };

export const DEFAULT_REVEAL = inches(1 / 8);
/** A reveal thinner than this cannot be glued straight; 0 means none at all. */
export const MIN_REVEAL = inches(1 / 16);
