import { hexToOklab } from '../colour/convert';
import { SINKING_SHARE } from '../colour/rim';
import type { PlacedPhoto } from '../geometry/placed-photos';
import type { Hex } from '../model/ids';
import type { Mat } from '../model/spread';
import { MIN_REVEAL } from '../model/trim-settings';
import { schemeColors, standOutFrom } from './card-choices';
import { defineCheck, type Finding, type Remedy, type SpreadView } from './check';
import { piecesOf } from './pieces';
import { cardUnder, rimOnCard } from './rims';

/** Card of this OKLab lightness or more is called light. */
const LIGHT = 0.85;
/** Photographers' mats are white or nearly so; offered where neither scheme nor page has light card. */
const PLAIN_LIGHT: readonly Hex[] = ['#f7f3ea', '#ffffff'];

/**
 * A photo that sinks into its card: a third or more of its rim is too close to it, in tone and in CIEDE2000
 * difference (`rimContrast`). Where an inner mat shows, that is the card; where no card shows, the check is silent.
 */
export const photoSinks = defineCheck({
  id: 'photo-sinks',
  severity: 'fix',
  basis: {
    kind: 'published',
    source: 'CIEDE2000 of CIE 142-2001 after Sharma, Wu and Dalal (2005); the limits of 12, of tone 15 and of a third of the rim are common practice',
  },
  needsFilledPages: false,
  thresholds: { share: { default: SINKING_SHARE, min: 0.1, max: 1, unit: 'share' } },
  find: (view, { share }) =>
    piecesOf(view).flatMap((piece): Finding[] => {
      const sunk = piece.photos
        .flatMap((photo) => {
          const contrast = rimOnCard(view, photo);
          return contrast && contrast.closeShare >= share ? [{ photo, closeShare: contrast.closeShare }] : [];
        })
        .sort((a, b) => b.closeShare - a.closeShare);
      const worst = sunk[0];
      const mat = worst && view.matById.get(worst.photo.matId);
      const card = mat && cardUnder(mat, view.doc.reveal);
      if (!worst || !mat || !card) return [];
      return [
        {
          messageId: 'photo-sinks',
          data: { title: piece.print.title, share: Math.round(worst.closeShare * 100), matColor: card },
          matIds: sunk.map(({ photo }) => photo.matId),
          remedies: () => [...innerMats(view, mat, sunk.map(({ photo }) => photo), share), ...otherCard(view, mat, sunk.map(({ photo }) => photo), share)],
        },
      ];
    }),
});

/** A thin light inner mat, in the scheme's or the page's light card where there is any, from which every photo stands out. */
function innerMats(view: SpreadView, mat: Mat, photos: readonly PlacedPhoto[], share: number): Remedy[] {
  const { doc } = view;
  const own = [...schemeColors(view), doc.pages[mat.page]?.color ?? '#ffffff'].filter((hex) => hexToOklab(hex)[0] >= LIGHT);
  const color = [...own, ...PLAIN_LIGHT].find((hex) => hex !== mat.color && standOutFrom(view, photos, hex, share));
  if (!color) return [];
  const args = { matIds: photos.map((photo) => photo.matId), inner: { color, reveal: mat.inner?.reveal || MIN_REVEAL } };
  return [{ messageId: 'light-inner-mat', data: { color }, call: { id: 'mats.setInner', args } }];
}

/** Another of the scheme's or the spread's own card colours from which the photos stand out. */
function otherCard(view: SpreadView, mat: Mat, photos: readonly PlacedPhoto[], share: number): Remedy[] {
  if (mat.inner) return [];
  const colors = new Set([...schemeColors(view), ...view.doc.mats.map((other) => other.color)]);
  colors.delete(mat.color);
  const color = [...colors].find((hex) => standOutFrom(view, photos, hex, share));
  if (!color) return [];
  return [{ messageId: 'other-color', data: { color }, call: { id: 'mats.setColor', args: { matIds: photos.map((photo) => photo.matId), color } } }];
}
