import type { MatId } from '../model/ids';
import type { Mass, Point } from './balance/centre-of-mass';
import { centreOfMass } from './balance/centre-of-mass';
import type { SpreadView } from './check';
import { declaredFocals } from './focals';
import { weighSpread } from './weight';

/** A place where the eye is taken to rest, in the scene's space. */
export interface EyeStop extends Point {
  /** The mats that are one thing to the eye: one mat, or all panes of a split print. */
  readonly matIds: readonly MatId[];
}

const MAX_STOPS = 7;
/** A mat that weighs less than this share of the heaviest is passed over. */
const LEAST_SHARE = 0.1;
/** Added to every distance, as a share of a page's width: how far the eye sees without moving. */
const NEAR = 1 / 4;

/**
 * The way that the eye likely takes over a spread, our own rule: it starts at the declared focal (the left one first),
 * or at the heaviest mat where none is declared, and goes each time to what it has not seen yet and what pulls most, weight over distance,
 * with a quarter of a page added to every distance. It makes at most seven stops; what weighs less than a tenth of the
 * heaviest is passed over; among equals the earlier in drawing order is next. A split print is one stop.
 *
 * The heaviest wins and is then left out, as in L. Itti, C. Koch, E. Niebur (1998), "A model of saliency-based visual
 * attention for rapid scene analysis" (from memory); the rest is not measured on people.
 */
export function eyePath(view: SpreadView): EyeStop[] {
  const things = thingsOf(view);
  const heaviest = Math.max(0, ...things.map(({ mass }) => mass));
  if (heaviest === 0) return [];
  const [focal] = declaredFocals(view);
  const start = things.find(({ matIds }) => focal && matIds.includes(focal.mat.id)) ?? things.find(({ mass }) => mass === heaviest)!;
  const path = [start];
  const left = new Set(things.filter((thing) => thing !== start && thing.mass >= LEAST_SHARE * heaviest));
  while (path.length < MAX_STOPS && left.size > 0) {
    const here = path.at(-1)!;
    const pull = (thing: Thing): number => thing.mass / (Math.hypot(thing.x - here.x, thing.y - here.y) + NEAR * view.doc.format.width);
    const next = [...left].reduce((best, thing) => (pull(thing) > pull(best) ? thing : best));
    left.delete(next);
    path.push(next);
  }
  return path.map(({ x, y, matIds }) => ({ x, y, matIds }));
}

type Thing = Mass & { readonly matIds: readonly MatId[] };

/** What the eye can land on, in drawing order of its first mat. */
function thingsOf(view: SpreadView): Thing[] {
  const { masses } = weighSpread(view);
  const members = new Map<string, MatId[]>();
  for (const mat of view.doc.mats) {
    if (!masses.has(mat.id)) continue;
    const key = mat.content.kind === 'pane' ? mat.content.groupId : mat.id;
    const others = members.get(key);
    if (others) others.push(mat.id);
    else members.set(key, [mat.id]);
  }
  return [...members.values()].flatMap((matIds): Thing[] => {
    const own = matIds.flatMap((id) => masses.get(id) ?? []);
    const centre = centreOfMass(own);
    return centre ? [{ ...centre, mass: own.reduce((sum, { mass }) => sum + mass, 0), matIds }] : [];
  });
}
