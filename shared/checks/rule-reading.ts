import { matRect } from '../geometry/grid';
import { area, centre } from '../geometry/rects';
import type { Side } from '../model/ids';
import type { Rect, Size } from '../model/rect';
import { pageRects, toScene } from '../scene/page-rects';
import { deviationOfCentre, type Point } from './balance/centre-of-mass';
import { ngoBalance } from './balance/ngo-balance';
import { ngoMeasures, type NgoMeasures } from './balance/ngo-measures';
import { countSizes } from './balance/ngo-sizes';
import { quadrantsOf } from './balance/quadrants';
import type { SpreadView } from './check';
import { weighSpread } from './weight';

/** What the published measures say of a whole spread or of one of its pages. */
export interface RuleReading {
  readonly measures: NgoMeasures;
  /** Per cent; null where nothing has weight. */
  readonly deviation: number | null;
  /** The centre of mass from the middle, as shares of width and height; right and down are positive. */
  readonly offset: Point | null;
  readonly facts: {
    readonly mats: number;
    readonly sizes: number;
    readonly columns: number;
    readonly rows: number;
    /** Share of the frame, 0–1. */
    readonly covered: number;
    /** −1 … 1, as `ngoBalance`. */
    readonly leftOverRight: number;
    readonly topOverFoot: number;
    /** Upper left, upper right, lower left, lower right. */
    readonly heaviestQuarter: 0 | 1 | 2 | 3;
    readonly inQuarters: readonly [number, number, number, number];
  };
}

export type RuleFrame = 'spread' | Side;

/**
 * The measures "on the rule" of a spread or of one page. Objects are the mats, without those laid over others: the
 * published measures judge boxes that do not overlap. The centre of mass is that of visual weight (`weighSpread`).
 *
 * @returns null where the spread has no such page, or no mats on it.
 */
export function readRule(view: SpreadView, frame: RuleFrame): RuleReading | null {
  const pages = pageRects(view.doc);
  const area = frame === 'spread' ? { x: 0, y: 0, width: pages.width, height: pages.height } : pages[frame];
  if (!area) return null;
  const rects = view.doc.mats.flatMap((mat): Rect[] => {
    if (mat.laidOver || (frame !== 'spread' && mat.page !== frame)) return [];
    const rect = toScene(pages, mat.page, matRect(view.doc.format, mat));
    return rect ? [{ ...rect, x: rect.x - area.x, y: rect.y - area.y }] : [];
  });
  if (rects.length === 0) return null;
  const weights = weighSpread(view);
  const mass = frame === 'spread' ? weights.centre : weights.pageCentres[frame];
  const point = mass && { x: mass.x - area.x, y: mass.y - area.y };
  return {
    measures: ngoMeasures(area, rects),
    deviation: point && deviationOfCentre(point, area),
    offset: point && { x: point.x / area.width - 0.5, y: point.y / area.height - 0.5 },
    facts: factsOf(area, rects),
  };
}

function factsOf(frame: Size, rects: readonly Rect[]): RuleReading['facts'] {
  const { vertical, horizontal } = ngoBalance(frame, rects);
  const areas = quadrantsOf(frame, rects).map((quadrant) => quadrant.area);
  const inQuarters: [number, number, number, number] = [0, 0, 0, 0];
  for (const rect of rects) {
    const { x, y } = centre(rect);
    inQuarters[(y > frame.height / 2 ? 2 : 0) + (x > frame.width / 2 ? 1 : 0)]! += 1;
  }
  return {
    mats: rects.length,
    sizes: countSizes(rects),
    columns: new Set(rects.map(({ x }) => x)).size,
    rows: new Set(rects.map(({ y }) => y)).size,
    covered: rects.reduce((sum, rect) => sum + area(rect), 0) / (frame.width * frame.height),
    leftOverRight: vertical,
    topOverFoot: horizontal,
    heaviestQuarter: areas.indexOf(Math.max(...areas)) as 0 | 1 | 2 | 3,
    inQuarters,
  };
}
