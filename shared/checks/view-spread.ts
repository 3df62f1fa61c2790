import type { CommandContext } from '../commands/command';
import { placedPhotos } from '../geometry/placed-photos';
import type { PrintId } from '../model/ids';
import type { SpreadDocument } from '../model/spread';
import type { SpreadView } from './check';

export interface ViewInput extends Pick<CommandContext, 'prints' | 'trim'> {
  readonly doc: SpreadDocument;
  /** Copies that the studio's other live spreads use. */
  readonly usedElsewhere: Readonly<Record<PrintId, number>>;
}

/** A spread with all that checks look up in it; made once per document. Unknown prints show no photo. */
export function viewSpread({ doc, prints, trim, usedElsewhere }: ViewInput): SpreadView {
  const photos = placedPhotos(doc, (id) => prints.get(id));
  return {
    doc,
    prints,
    trim,
    usedElsewhere,
    matById: new Map(doc.mats.map((mat) => [mat.id, mat])),
    photos,
    photosByMat: new Map(photos.map((photo) => [photo.matId, photo])),
  };
}
