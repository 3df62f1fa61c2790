import type { PlacedPhoto } from '../geometry/placed-photos';
import { boundingBox } from '../geometry/rects';
import type { MatId, PaneGroupId } from '../model/ids';
import type { Print } from '../model/print';
import type { Rect } from '../model/rect';
import type { Placement } from '../model/spread';
import type { SpreadView } from './check';

/** One print as it is used once: on one mat, or split over the panes of one group. */
export interface Piece {
  readonly print: Print;
  readonly placement: Placement;
  /** Null for a print on one mat. */
  readonly groupId: PaneGroupId | null;
  readonly matIds: readonly MatId[];
  /** One per mat, in the order of `matIds`. */
  readonly photos: readonly PlacedPhoto[];
  /** The part of the upright paper that it shows, over all panes; may leave the paper. */
  readonly window: Rect;
}

const known = new WeakMap<SpreadView, readonly Piece[]>();

/** Every use of a print on the spread, in drawing order of its first mat. */
export function piecesOf(view: SpreadView): readonly Piece[] {
  let pieces = known.get(view);
  if (!pieces) known.set(view, (pieces = collect(view)));
  return pieces;
}

function collect(view: SpreadView): Piece[] {
  const byUse = new Map<string, PlacedPhoto[]>();
  for (const photo of view.photos) {
    const use = photo.groupId ?? photo.matId;
    const photos = byUse.get(use);
    if (photos) photos.push(photo);
    else byUse.set(use, [photo]);
  }
  return [...byUse.values()].flatMap((photos): Piece[] => {
    const [first] = photos;
    const print = first && view.prints.get(first.printId);
    if (!first || !print) return [];
    return [
      {
        print,
        placement: first.placement,
        groupId: first.groupId,
        matIds: photos.map((photo) => photo.matId),
        photos,
        window: photos.length === 1 ? first.window : boundingBox(photos.map((photo) => photo.window)),
      },
    ];
  });
}
