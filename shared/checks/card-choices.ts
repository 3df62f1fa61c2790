import { rimContrast, SINKING_SHARE } from '../colour/rim';
import { windowAtOwnSize, type PlacedPhoto } from '../geometry/placed-photos';
import type { Hex } from '../model/ids';
import type { Mat } from '../model/spread';
import type { Remedy, SpreadView } from './check';

/** The scheme's colours in the order in which they are offered for a mat. */
export const schemeColors = ({ doc }: SpreadView): readonly Hex[] => {
  if (!doc.scheme) return [];
  const { main, second, accent, base } = doc.scheme.colors;
  return [main.hex, second.hex, base.hex, accent.hex];
};

/** True where no photo's rim sinks into card of this colour. */
export const standOutFrom = (view: SpreadView, photos: readonly PlacedPhoto[], hex: Hex, share: number = SINKING_SHARE): boolean =>
  photos.every((photo) => {
    const print = view.prints.get(photo.printId);
    return print !== undefined && rimContrast(print, windowAtOwnSize(print, photo), hex).closeShare < share;
  });

/** The first of these colours from which all that the mats carry stands out, as their card. */
export function recolor(view: SpreadView, mats: readonly Mat[], colors: readonly Hex[]): Remedy[] {
  const photos = mats.flatMap((mat) => view.photosByMat.get(mat.id) ?? []);
  const color = colors.find((hex) => mats.some((mat) => mat.color !== hex) && standOutFrom(view, photos, hex));
  if (!color) return [];
  return [{ messageId: 'other-color', data: { color }, call: { id: 'mats.setColor', args: { matIds: mats.map((mat) => mat.id), color } } }];
}
