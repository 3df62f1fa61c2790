import { accentAlone } from './accent-alone';
import { againstPrint } from './against-print';
import { allNeutrals } from './all-neutrals';
import { bareMat } from './bare-mat';
import { centreOff } from './centre-off';
import { colorInNoPhoto } from './color-in-no-photo';
import { faceTooLarge } from './face-too-large';
import { focalNotDominant } from './focal-not-dominant';
import { focalsCompete } from './focals-compete';
import { focalsSamePlace } from './focals-same-place';
import { focalsSameSize } from './focals-same-size';
import { horizonsApart } from './horizons-apart';
import { journalingOverflows } from './journaling-overflows';
import { keepZoneCovered } from './keep-zone-covered';
import { keepZoneCut } from './keep-zone-cut';
import { looksOffPage } from './looks-off-page';
import { lowResolution } from './low-resolution';
import { matLikePage } from './mat-like-page';
import { morePlacementsThanCopies } from './more-placements-than-copies';
import { motifCopied } from './motif-copied';
import { neverCut } from './never-cut';
import { noFocal } from './no-focal';
import { noJournaling } from './no-journaling';
import { noTitle } from './no-title';
import { nothingShared } from './nothing-shared';
import { orientationsAlike } from './orientations-alike';
import { pagesUnequal } from './pages-unequal';
import { panesInseparable } from './panes-inseparable';
import type { CheckExamples } from './parts';
import { photoSinks } from './photo-sinks';
import { printSmallerThanPhoto } from './print-smaller-than-photo';
import { seamThroughKeepZone } from './seam-through-keep-zone';
import { shaving } from './shaving';
import { titleOverflows } from './title-overflows';
import { tooManyColors } from './too-many-colors';
import { undeclaredFocal } from './undeclared-focal';
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
  'face-too-large': faceTooLarge,
  'keep-zone-covered': keepZoneCovered,
  'title-overflows': titleOverflows,
  'journaling-overflows': journalingOverflows,
  'horizons-apart': horizonsApart,
  'color-in-no-photo': colorInNoPhoto,
  'too-many-colors': tooManyColors,
  'accent-alone': accentAlone,
  'all-neutrals': allNeutrals,
  'focals-compete': focalsCompete,
  'undeclared-focal': undeclaredFocal,
  'against-print': againstPrint,
  'orientations-alike': orientationsAlike,
  'looks-off-page': looksOffPage,
};
