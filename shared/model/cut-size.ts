import type { CutSizeId } from './ids';
import type { Length } from './length';

export const CUT_SIZE_KINDS = ['die', 'punch', 'hand'] as const;
export type CutSizeKind = (typeof CUT_SIZE_KINDS)[number];
export const CUT_SIZE_STOCKS = ['card', 'photo', 'both'] as const;

/** The true size of a piece that the maker can cut. */
export interface CutSize {
  readonly id: CutSizeId;
  readonly name: string;
  readonly width: Length;
  readonly height: Length;
  readonly stock: (typeof CUT_SIZE_STOCKS)[number];
  readonly kind: CutSizeKind;
  /** Names of the sets it belongs to, such as "what I have at the table". */
  readonly sets: readonly string[];
}
