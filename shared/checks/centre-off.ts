import { pageRects } from '../scene/page-rects';
import { deviationOfCentre, type Point } from './balance/centre-of-mass';
import { defineCheck, type Finding } from './check';
import type { Edge } from './messages';
import { isUneven } from './pages-unequal';
import { weighSpread } from './weight';

/** Furthest that a spread's centre may lie off, in percent of the way from its middle to an edge. Common practice, our own figure. */
const FAR_OFF = 20;

/**
 * The spread's centre of visual mass lies far from its middle. Where the two pages' weights already differ too
 * much, `pages-unequal` says it better and this check is silent.
 */
export const centreOff = defineCheck({
  id: 'centre-off',
  severity: 'consider',
  basis: {
    kind: 'published',
    source: 'deviation of the centre of mass, R. Hübner and M. G. Fillinger (2016), Frontiers in Psychology 7:335; the limit is our own',
  },
  needsFilledPages: true,
  thresholds: { deviation: { default: FAR_OFF, min: 5, max: 100, unit: 'points' } },
  find: (view, { deviation }): Finding[] => {
    const weights = weighSpread(view);
    const { centre } = weights;
    if (!centre || isUneven(view.doc, weights)) return [];
    const frame = pageRects(view.doc);
    if (deviationOfCentre(centre, frame) <= deviation) return [];
    const off = { x: centre.x - frame.width / 2, y: centre.y - frame.height / 2 };
    return [{ messageId: 'centre-off', data: { edge: edgeOf(off), off: Math.round(Math.hypot(off.x, off.y)) }, matIds: [] }];
  },
});

const edgeOf = ({ x, y }: Point): Edge => (Math.abs(x) > Math.abs(y) ? (x < 0 ? 'left' : 'right') : y < 0 ? 'top' : 'bottom');
