import { facesOf } from '../geometry/faces';
import { onPiece, paperOf } from '../geometry/keep-zone';
import { turnedSize } from '../geometry/paper';
import { centre, contains } from '../geometry/rects';
import { defineCheck, type Finding, type Remedy } from './check';
import { slide } from './keep-zone-remedies';
import { piecesOf } from './pieces';
import { growMat } from './resize-mat';

/**
 * A person in a mat too small for their face: the photo, or the pane, shows the middle of a marked face and is
 * narrower or lower than the face with some room round it. A face that only lies at the edge of the picture is
 * none that the photo is of, and one that would fit elsewhere in the window is the keep zone's matter.
 */
export const faceTooLarge = defineCheck({
  id: 'face-too-large',
  severity: 'fix',
  basis: { kind: 'common-practice' },
  needsFilledPages: false,
  yieldsTo: ['never-cut', 'keep-zone-cut', 'window-off-paper', 'seam-through-keep-zone'],
  thresholds: { room: { default: 1.2, min: 1, max: 3, unit: 'ratio' } },
  find: (view, { room }) =>
    piecesOf(view).flatMap((piece): Finding[] => {
      const { print, placement } = piece;
      if (placement.mode === 'whole' || print.faces.length === 0) return [];
      const faces = facesOf(print, placement);
      return piece.photos.flatMap((photo): Finding[] => {
        const mat = view.matById.get(photo.matId);
        const size = turnedSize(photo.window, placement.turn);
        const face = faces
          .filter(({ rect }) => contains(photo.window, { ...centre(rect), width: 0, height: 0 }))
          .map(({ rect }) => ({ rect, box: onPiece(rect, photo.window, placement.turn) }))
          .find(({ box }) => box.width * room > size.width || box.height * room > size.height);
        if (!mat || !face) return [];
        const missing = {
          width: Math.max(0, Math.ceil(face.box.width * room) - size.width),
          height: Math.max(0, Math.ceil(face.box.height * room) - size.height),
        };
        const isWide = missing.width > missing.height;
        const toFace = (): Remedy[] => (contains(photo.window, face.rect) ? [] : slide(piece, face.rect, view.trim.finestMark));
        const isPaperLarger = paperOf(print, placement).width > photo.window.width || paperOf(print, placement).height > photo.window.height;
        return [
          {
            messageId: 'face-too-large',
            data: { title: print.title, face: isWide ? face.box.width : face.box.height, photo: isWide ? size.width : size.height, axis: isWide ? 'wide' : 'high' },
            matIds: [photo.matId],
            remedies: () => (piece.groupId === null ? [...(isPaperLarger ? growMat(view, mat, missing) : []), ...toFace()] : []),
          },
        ];
      });
    }),
});
