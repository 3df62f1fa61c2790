import { gridOf, matRect } from '../geometry/grid';
import { onPiece, zoneOf } from '../geometry/keep-zone';
import { area, intersection, movedBy, overlaps } from '../geometry/rects';
import type { Side } from '../model/ids';
import type { Rect } from '../model/rect';
import type { Mat } from '../model/spread';
import { defineCheck, type Finding, type Remedy, type SpreadView } from './check';
import { piecesOf } from './pieces';

/** A visible part of a print's keep zone, in page space. */
interface Zone {
  readonly title: string;
  readonly matId: string;
  readonly rect: Rect;
  readonly z: number;
}

/** A keep zone of which more than `share` lies under something laid over it. */
export const keepZoneCovered = defineCheck({
  id: 'keep-zone-covered',
  severity: 'fix',
  basis: { kind: 'common-practice' },
  needsFilledPages: false,
  yieldsTo: ['keep-zone-cut'],
  thresholds: { share: { default: 0, min: 0, max: 0.9, unit: 'share' } },
  find: (view, { share }) => {
    const covers = view.doc.mats.filter((mat) => mat.laidOver && view.doc.pages[mat.page]);
    if (covers.length === 0) return [];
    return covers.flatMap((cover): Finding[] => {
      const over = matRect(view.doc.format, cover);
      const zones = zonesNear(view, cover.page, over);
      const under = zones.filter((zone) => zone.matId !== cover.id && zone.z <= cover.z && coveredShare(zone, over) > share);
      const [first] = under;
      if (!first) return [];
      return [
        {
          messageId: 'keep-zone-covered',
          data: { title: first.title, others: under.length - 1 },
          matIds: [cover.id, ...under.map((zone) => zone.matId)],
          remedies: () => moveOff(view, cover, over),
        },
      ];
    });
  },
});

function coveredShare(zone: Zone, over: Rect): number {
  const common = intersection(zone.rect, over);
  return common ? area(common) / area(zone.rect) : 0;
}

/** The keep zones of the photos of one page that lie within a rectangle of it, or of all. */
function zonesNear(view: SpreadView, page: Side, near: Rect | null): Zone[] {
  return piecesOf(view).flatMap((piece) => {
    const photos = piece.photos.filter((photo) => photo.page === page && (near === null || overlaps(photo.rect, near)));
    if (photos.length === 0) return [];
    const keep = zoneOf(piece.print, piece.placement);
    if (!keep) return [];
    return photos.flatMap((photo): Zone[] => {
      const seen = intersection(keep, photo.window);
      const mat = view.matById.get(photo.matId);
      if (!seen || !mat) return [];
      const rect = movedBy(onPiece(seen, photo.window, photo.placement.turn), photo.rect);
      return [{ title: piece.print.title, matId: photo.matId, rect, z: mat.z }];
    });
  });
}

/** The shortest straight moves, in whole steps, after which what is laid over covers no keep zone of its page. */
function moveOff(view: SpreadView, cover: Mat, over: Rect): Remedy[] {
  const { doc } = view;
  const { columns, rows } = gridOf(doc.format);
  const others = zonesNear(view, cover.page, null).filter((zone) => zone.matId !== cover.id);
  for (let steps = 1; steps < Math.max(columns, rows); steps += 1) {
    for (const [dx, dy] of [[0, steps], [0, -steps], [steps, 0], [-steps, 0]] as const) {
      const isOnPage = cover.x + dx >= 0 && cover.y + dy >= 0 && cover.x + dx + cover.w <= columns && cover.y + dy + cover.h <= rows;
      const moved = movedBy(over, { x: dx * doc.format.step, y: dy * doc.format.step });
      if (!isOnPage || others.some((zone) => overlaps(zone.rect, moved))) continue;
      return [{ messageId: 'move-off', data: {}, call: { id: 'mats.move', args: { matIds: [cover.id], dx, dy } } }];
    }
  }
  return [];
}
