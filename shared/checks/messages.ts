import type { Hex, MatId, Side } from '../model/ids';

/** A side of a piece as it lies on the page. */
export type Edge = 'left' | 'right' | 'top' | 'bottom';
export type Axis = 'wide' | 'high';

/**
 * Everything that a check can say, with the data that its sentence needs: lengths as integers in
 * 1/160 mm, titles as typed. The sentences stand in `shared/words`; one that is missing does not compile.
 */
export interface NoteMessages {
  'pane-off-paper': { title: string; missing: number };
  'bleed-off-paper': { title: string; missing: number };
  'instant-film-cut': { title: string };
  'one-of-a-kind-cut': { title: string };
  'borrowed-cut': { title: string; until: string };
  /** The keep zone itself is larger than the window. */
  'keep-zone-larger': { title: string; zone: number; window: number; axis: Axis };
  /** The window would hold the keep zone elsewhere, but cuts it here. */
  'keep-zone-missed': { title: string; lost: number; edge: Edge };
  /** The keep zone is whole, but nearer to the cut than the tolerance. */
  'keep-zone-tight': { title: string; spare: number; tolerance: number; edge: Edge };
  'seam-behind': { title: string };
  'seam-apart': { title: string };
  'panes-inseparable': { title: string };
  'more-placements': { title: string; needed: number; copies: number; elsewhere: number };
  'print-smaller': { title: string; print: number; photo: number; axis: Axis };
  'whole-overhangs': { title: string; over: number };
  /** `share`: how much of the rim is too close, 0–100. */
  'photo-sinks': { title: string; share: number; matColor: Hex };
  'bare-mat': { fitting: number };
  'pages-unequal': { left: number; right: number; heavy: Side };
  /** Towards which edge of the spread, and how far off its middle. */
  'centre-off': { edge: Edge; off: number };
  'no-focal': Record<never, never>;
  'focals-same-place': Record<never, never>;
  'focals-same-size': { width: number; height: number };
  'focal-not-dominant': { width: number; height: number };
  'nothing-shared': Record<never, never>;
  'motif-copied': { motif: MotifKind };
  'whole-lopsided': { title: string; beside: number; above: number };
  'shaving': { title: string; width: number; edge: Edge };
  'mat-like-page': { color: Hex };
  'under-binding': { hidden: number };
  'low-resolution': { title: string; ppi: number };
  'no-title': Record<never, never>;
  'no-journaling': Record<never, never>;
  'face-too-large': { title: string; face: number; photo: number; axis: Axis };
  /** `others`: how many more keep zones lie under the same thing. */
  'keep-zone-covered': { title: string; others: number };
  'title-overflows': { needs: number; has: number; axis: Axis };
  'journaling-overflows': { words: number; capacity: number };
  'focals-compete': Record<never, never>;
  'undeclared-focal': Record<never, never>;
  'against-print': { title: string; isUpright: boolean };
  'orientations-alike': { areUpright: boolean; others: number };
  'looks-off-page': { title: string };
  'horizons-apart': { title: string; other: string; apart: number };
  'color-in-no-photo': { color: Hex };
  'too-many-colors': { count: number; most: number; color: Hex };
  'accent-few': { color: Hex; places: number };
  'accent-one-page': { color: Hex; places: number };
  'all-neutrals': Record<never, never>;
}
export type NoteMessageId = keyof NoteMessages;

export type MotifKind = 'split-print' | 'strip' | 'pinwheel' | 'arrangement';

/** Every remedy that a note can offer, with the data that its label needs. */
export interface RemedyMessages {
  'slide-window': Record<never, never>;
  'mount-whole': Record<never, never>;
  'larger-mat': Record<never, never>;
  'smaller-mat': Record<never, never>;
  'no-reveal': Record<never, never>;
  'thinner-reveal': { reveal: number };
  'back-to-table': Record<never, never>;
  'spread-apart': Record<never, never>;
  'run-behind': Record<never, never>;
  'trim-to-mat': Record<never, never>;
  'light-inner-mat': { color: Hex };
  'other-color': { color: Hex };
  'place-best-fit': { count: number };
  'make-focal': { matId: MatId };
  'move-off': Record<never, never>;
  'smaller-letters': { height: number };
  'smaller-hand': { line: number };
  'turn-mat': Record<never, never>;
  'turn-picture': Record<never, never>;
  'swap-places': Record<never, never>;
  'line-up': Record<never, never>;
  'repeat-accent': { color: Hex };
}
export type RemedyMessageId = keyof RemedyMessages;
