import { bareMat } from './bare-mat';
import { centreOff } from './centre-off';
import { focalNotDominant } from './focal-not-dominant';
import { focalsSamePlace } from './focals-same-place';
import { focalsSameSize } from './focals-same-size';
import { keepZoneCut } from './keep-zone-cut';
import { lowResolution } from './low-resolution';
import { matLikePage } from './mat-like-page';
import { morePlacementsThanCopies } from './more-placements-than-copies';
import { motifCopied } from './motif-copied';
import { neverCut } from './never-cut';
import { noFocal } from './no-focal';
import { noJournaling } from './no-journaling';
import { noTitle } from './no-title';
import { nothingShared } from './nothing-shared';
import { pagesUnequal } from './pages-unequal';
import type { CheckExamples } from './parts';
import { panesInseparable } from './panes-inseparable';
import { photoSinks } from './photo-sinks';
import { printSmallerThanPhoto } from './print-smaller-than-photo';
import { seamThroughKeepZone } from './seam-through-keep-zone';
import { shaving } from './shaving';
import { underBinding } from './under-binding';
import { wholeLopsided } from './whole-lopsided';
import { wholeOverhangs } from './whole-overhangs';
import { windowOffPaper } from './window-off-paper';

/** A wrong and a right spread for every check: what its help page draws. An id without its example does not compile. */
export const CHECK_EXAMPLES: CheckExamples = {
  'window-off-paper': windowOffPaper,
  'never-cut': neverCut,
  'keep-zone-cut': keepZoneCut,
  'seam-through-keep-zone': seamThroughKeepZone,
  'panes-inseparable': panesInseparable,
  'more-placements-than-copies': morePlacementsThanCopies,
  'print-smaller-than-photo': printSmallerThanPhoto,
  'whole-overhangs': wholeOverhangs,
  'photo-sinks': photoSinks,
  'bare-mat': bareMat,
  'pages-unequal': pagesUnequal,
  'centre-off': centreOff,
  'no-focal': noFocal,
  'focals-same-place': focalsSamePlace,
  'focals-same-size': focalsSameSize,
  'focal-not-dominant': focalNotDominant,
  'nothing-shared': nothingShared,
  'motif-copied': motifCopied,
  'whole-lopsided': wholeLopsided,
  'shaving': shaving,
  'mat-like-page': matLikePage,
  'under-binding': underBinding,
  'low-resolution': lowResolution,
  'no-title': noTitle,
  'no-journaling': noJournaling,
};
