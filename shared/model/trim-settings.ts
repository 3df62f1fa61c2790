import { inches, millimetres } from './length';
import type { TrimSettings } from './spread';

/** PRODUCT.md section 3; common practice for hand trimmers. */
export const TRIM_SETTINGS_INCH: TrimSettings = { tolerance: inches(1 / 16), finestMark: inches(1 / 16) };
export const TRIM_SETTINGS_METRIC: TrimSettings = { tolerance: millimetres(1.5), finestMark: millimetres(1) };

export const DEFAULT_REVEAL = inches(1 / 8);
/** A reveal thinner than this cannot be glued straight; 0 means none at all. */
export const MIN_REVEAL = inches(1 / 16);
