import { measurePatch, readSheetColor, type Patch, type ReadColor, type Reference } from '../../shared/colour/white-balance';
import { PICTURE_SIZES } from '../../shared/contracts/prints';
import { MARK_SIDE, type Mark } from '../../shared/contracts/stash';
import { identifyPicture } from './identify-picture';
import { decodePicture, type RawPicture } from './raw-picture';
import { Refusal } from './worker-messages';

export interface ReadingTask {
  readonly sourcePath: string;
  /** Where the sheet and the white or grey patch are on the upright photo. */
  readonly sheet: Mark;
  readonly patch: Mark;
  readonly reference: Reference;
}

/** The colour of a photographed sheet. @throws Refusal with a `PictureRefusal` or a `ReadingRefusal` code. */
export async function readSheet({ sourcePath, sheet, patch, reference }: ReadingTask): Promise<ReadColor> {
  await identifyPicture(sourcePath);
  const picture = await decodePicture(sourcePath, PICTURE_SIZES.large);
  const answer = readSheetColor(patchAt(picture, sheet), patchAt(picture, patch), reference);
  if (typeof answer === 'string') throw new Refusal(answer);
  return answer;
}

/** What lies under a mark; near an edge the mark is moved inwards, so that it is always whole. */
function patchAt({ data, width, height }: RawPicture, { x, y }: Mark): Patch {
  const side = Math.max(1, Math.round(MARK_SIDE * Math.min(width, height)));
  const left = Math.min(width - side, Math.max(0, Math.round(x * width - side / 2)));
  const top = Math.min(height - side, Math.max(0, Math.round(y * height - side / 2)));
  const pixels = new Uint8Array(side * side * 3);
  for (let row = 0; row < side; row += 1) {
    const from = ((top + row) * width + left) * 3;
    pixels.set(data.subarray(from, from + side * 3), row * side * 3);
  }
  return measurePatch(pixels);
}
