import { centre } from '../geometry/rects';
import { SIDES, type Side } from '../model/ids';
import type { SchemeRole } from '../model/spread';
import type { CardUnit } from './card-units';

/** Which of the scheme's colours a mat's card takes. */
export type CardRole = SchemeRole;

/** Of the mats without accent, this share of the area is meant to be the main colour: about 60 to 30. */
const MAIN_SHARE = 2 / 3;
/** The accent stays within this share of all mats' area, but one mat a page may always have it. */
const ACCENT_SHARE = 0.15;
/** One accent for about so many mats, and three in all where they fit: the trade's visual triangle. */
const MATS_PER_ACCENT = 6;
const LEAST_ACCENTS = 3;

// The weights of one unit's choice against the others'; a misfit outweighs all the rest.
const MISFIT = 1000;
const SAME_AS_NEIGHBOUR = 1;
const FOCAL_NOT_MAIN = 2;
const SHARE_WEIGHT = 0.5;
/** Worth of each CIEDE2000 of distance from what is carried, up to 40. */
const DISTANCE_WORTH = 0.015;
const LEAST_GAIN = 1e-9;
const MOST_FLIPS = 400;

/**
 * The role of every unit, in order. First the accents, on small mats spread over both pages; then main
 * and second, by single changes from all-main, the best first, until none improves the whole. A unit that fits
 * neither takes the accent where that fits, text also the base; one that fits none, and for which no inner
 * mat helps, takes whatever lies farthest from it.
 */
export function assignCards(units: readonly CardUnit[]): CardRole[] {
  const roles: (CardRole | null)[] = units.map((unit) => forcedRole(unit));
  for (const i of accentPlaces(units, roles)) roles[i] = 'accent';
  const open = units.flatMap((_, i) => (roles[i] === null ? [i] : []));
  const chosen = roles.map((role) => role ?? 'main');
  settle(units, chosen, open);
  return chosen;
}

/** The role that leaves no choice between main and second, or null where one of them fits. */
function forcedRole(unit: CardUnit): CardRole | null {
  const { card } = unit;
  if (card.main.fits || card.second.fits) return null;
  if (card.accent.fits) return 'accent';
  // A thin inner mat in the base colour will part the photo from main or second.
  if (card.base.fits) return unit.mayTakeInner ? null : 'base';
  return (['main', 'second', 'accent', 'base'] as const).reduce((a, b) => (card[b].distance > card[a].distance ? b : a));
}

function accentPlaces(units: readonly CardUnit[], roles: readonly (CardRole | null)[]): number[] {
  const areas = units.map((unit) => unit.area).sort((a, b) => a - b);
  const median = areas[Math.floor((areas.length - 1) / 2)] ?? 0;
  const total = areas.reduce((sum, area) => sum + area, 0);
  const onPage = (side: Side): number => units.filter((unit) => unit.page === side).length;
  const candidates = units
    .map((unit, i) => ({ unit, i }))
    .filter(({ unit, i }) => roles[i] === null && !unit.isFocal && unit.card.accent.fits && unit.area <= median && onPage(unit.page) > 1)
    .sort((a, b) => a.unit.area - b.unit.area || Number(isPhoto(a.unit)) - Number(isPhoto(b.unit)) || a.i - b.i);
  const taken = units.flatMap((unit, i) => (roles[i] === 'accent' ? [{ unit, i }] : []));
  const wanted = Math.max(LEAST_ACCENTS, Math.round(units.length / MATS_PER_ACCENT));
  let left = total * ACCENT_SHARE;
  const take = (next: (typeof candidates)[number] | undefined): void => {
    if (!next) return;
    taken.push(next);
    candidates.splice(candidates.indexOf(next), 1);
    left -= next.unit.area;
  };
  for (const side of SIDES) {
    if (!taken.some(({ unit }) => unit.page === side)) take(candidates.find(({ unit }) => unit.page === side));
  }
  while (taken.length < wanted) {
    const farthest = candidates
      .filter(({ unit }) => unit.area <= left)
      .map((candidate) => ({ candidate, distance: Math.min(...taken.map(({ unit }) => distanceBetween(unit, candidate.unit))) }))
      .reduce<{ candidate: (typeof candidates)[number]; distance: number } | null>((a, b) => (a && a.distance >= b.distance ? a : b), null);
    if (!farthest) break;
    take(farthest.candidate);
  }
  return taken.map(({ i }) => i);
}

const isPhoto = (unit: CardUnit): boolean => unit.kind === 'print' || unit.kind === 'pane';

/** Between centres, in Lengths; the facing page counts as a whole page away. */
function distanceBetween(a: CardUnit, b: CardUnit): number {
  const p = centre(a.box);
  const q = centre(b.box);
  return Math.hypot(p.x - q.x, p.y - q.y) + (a.page === b.page ? 0 : ACROSS_THE_GUTTER);
}
const ACROSS_THE_GUTTER = 40_000;

/** Flips the open unit that gains most between main and second, until none gains. Changes `roles`. */
function settle(units: readonly CardUnit[], roles: CardRole[], open: readonly number[]): void {
  const total = units.reduce((sum, unit, i) => (roles[i] === 'accent' ? sum : sum + unit.area), 0);
  let main = units.reduce((sum, unit, i) => (roles[i] === 'main' ? sum + unit.area : sum), 0);
  const offShare = (area: number): number => SHARE_WEIGHT * units.length * Math.abs(area / Math.max(1, total) - MAIN_SHARE);
  const flipped = (i: number): CardRole => (roles[i] === 'main' ? 'second' : 'main');
  const mainAfter = (i: number): number => main + (roles[i] === 'main' ? -1 : 1) * units[i]!.area;
  const gainOf = (i: number): number =>
    ownCost(units, roles, i, roles[i]!) + offShare(main) - ownCost(units, roles, i, flipped(i)) - offShare(mainAfter(i));
  for (let round = 0; round < MOST_FLIPS; round++) {
    let best = -1;
    let most = LEAST_GAIN;
    for (const i of open) {
      const gain = gainOf(i);
      if (gain > most) {
        most = gain;
        best = i;
      }
    }
    if (best < 0) return;
    main = mainAfter(best);
    roles[best] = flipped(best);
  }
}

function ownCost(units: readonly CardUnit[], roles: readonly CardRole[], i: number, role: CardRole): number {
  const unit = units[i]!;
  const alike = unit.neighbours.filter((k) => roles[k] === role).length;
  const { fits, distance } = unit.card[role];
  return (
    (fits ? 0 : MISFIT) +
    alike * SAME_AS_NEIGHBOUR +
    (unit.isFocal && role !== 'main' ? FOCAL_NOT_MAIN : 0) -
    Math.min(distance, 40) * DISTANCE_WORTH
  );
}
