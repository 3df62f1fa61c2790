import { SIDES } from '../model/ids';
import type { SchemeRole } from '../model/spread';
import type { CardUnit, Suitability } from './card-units';
import { hullArea, type Point } from './hull';

/** Which of the scheme's colours a unit's card takes; a role is its place in this list. */
export const CARD_ROLES: readonly SchemeRole[] = ['main', 'second', 'accent', 'base'];
export const MAIN = 0;
export const SECOND = 1;
export const ACCENT = 2;
export const BASE = 3;
const ROLE_COUNT = CARD_ROLES.length;

/**
 * The share rule: of the mats' card that shows, about six tenths main, three second, one accent. The page
 * itself is left out, since the arrangement alone decides how much of it shows. Common practice.
 */
export const SHARE_RULE: readonly number[] = [0.6, 0.3, 0.1];
/** The trade's visual triangle: so many accents at least, once there are mats enough. Common practice. */
export const LEAST_ACCENTS = 3;
const MATS_FOR_TRIANGLE = 6;
const MATS_PER_ACCENT = 6;
const MOST_ACCENTS = 9;

// What each thing costs, in one currency: a pair of neighbours in one colour is 1. Our own judgement.
const SAME_AS_NEIGHBOUR = 1;
const ACCENTS_TOUCH = 3;
const FOCAL_NOT_MAIN = 2;
/** A rim all too close would cost 2; by the rule it is under a third. Tone counts three times as much as colour difference. */
const RIM_TOO_CLOSE = 2;
const RIM_TONE = 0.6;
const RIM_COLOR = 0.2;
/** A difference beyond this (L* or CIEDE2000) is no better. */
const FAR_ENOUGH = 40;
/** For each median mat's area by which an accent is larger than half the median mat. */
const LARGE_ACCENT = 3;
const ACCENT_MISSING = 4;
const ACCENT_TOO_MANY = 1;
const PAGE_WITHOUT_ACCENT = 4;
const FLAT_TRIANGLE = 3;
const ACCENTS_NEAR = 1.5;
/** For each unit, times the sum of the shares' distances (0–2) from the rule … */
const OFF_SHARE = 0.6;
/** … and from the facing page's. */
const PAGES_DIFFER = 0.15;

/**
 * Which colour each unit may take and what every choice costs. Costs are finite and never negative; less is
 * better. The whole is the units' own costs, the pairs of neighbours', and the spread's: shares, both pages
 * alike, number of accents, their triangle.
 */
export interface PlacementProblem {
  readonly count: number;
  /** Roles open to each unit, cheapest first; never empty. */
  readonly domains: readonly (readonly number[])[];
  /** Own cost of unit i in role r at 4 i + r. */
  readonly own: Float64Array;
  readonly neighbours: readonly (readonly number[])[];
  /** Card that shows of each unit, square Lengths. */
  readonly shown: Float64Array;
  /** 0 left, 1 right. */
  readonly page: Uint8Array;
  /** Centres on the spread, in Lengths. */
  readonly centres: readonly Point[];
  readonly accents: { readonly least: number; readonly most: number; readonly pages: readonly boolean[] };
  /** The largest area that accents can span, and the distance of the farthest two centres. */
  readonly span: { readonly area: number; readonly across: number };
}

export function placementProblem(units: readonly CardUnit[]): PlacementProblem {
  const areas = units.map((unit) => unit.area).sort((a, b) => a - b);
  const median = areas[Math.floor((areas.length - 1) / 2)] ?? 0;
  const perPage = SIDES.map((side) => units.filter((unit) => unit.page === side).length);
  const own = new Float64Array(units.length * ROLE_COUNT);
  units.forEach((unit, i) => CARD_ROLES.forEach((_, role) => (own[i * ROLE_COUNT + role] = ownCost(unit, role, median))));
  const domains = units.map((unit, i) => {
    const roles = openRoles(unit, (perPage[SIDES.indexOf(unit.page)] ?? 0) > 1);
    return [...roles].sort((a, b) => own[i * ROLE_COUNT + a]! - own[i * ROLE_COUNT + b]! || a - b);
  });
  const centres = units.map((unit) => unit.centre);
  const mayAccent = units.filter((_, i) => domains[i]!.includes(ACCENT)).length;
  const wanted = units.length >= MATS_FOR_TRIANGLE ? LEAST_ACCENTS : Math.floor(units.length / 2);
  const least = Math.min(wanted, mayAccent);
  return {
    count: units.length,
    domains,
    own,
    neighbours: units.map((unit) => unit.neighbours),
    shown: Float64Array.from(units, (unit) => unit.shown),
    page: Uint8Array.from(units, (unit) => SIDES.indexOf(unit.page)),
    centres,
    accents: {
      least,
      most: Math.max(least, Math.min(MOST_ACCENTS, Math.round(units.length / MATS_PER_ACCENT))),
      pages: SIDES.map((side) => least >= 2 && units.some((unit, i) => unit.page === side && domains[i]!.includes(ACCENT))),
    },
    span: { area: hullArea(centres), across: farthest(centres) },
  };
}

/**
 * A card colour that keeps its distance wherever there is one. Where none does, a thin inner mat parts photo and
 * card, and main or second may lie under it; failing that the base, failing that whatever lies farthest.
 */
function openRoles(unit: CardUnit, mayAccent: boolean): readonly number[] {
  const { card, inner } = unit;
  const fitting = [MAIN, SECOND].filter((role) => card[CARD_ROLES[role]!].fits);
  if (card.accent.fits && (fitting.length === 0 || (mayAccent && !unit.isFocal))) return [...fitting, ACCENT];
  if (fitting.length > 0) return fitting;
  const helps = CARD_ROLES.some((role) => inner[role].fits);
  if (unit.mayTakeInner && helps) return [MAIN, SECOND];
  if (card.base.fits) return [BASE];
  return [CARD_ROLES.reduce((best, role, i) => (card[role].distance > card[CARD_ROLES[best]!].distance ? i : best), MAIN)];
}

function ownCost(unit: CardUnit, role: number, medianArea: number): number {
  const focal = unit.isFocal && role !== MAIN ? FOCAL_NOT_MAIN : 0;
  const size = role === ACCENT && medianArea > 0 ? LARGE_ACCENT * Math.max(0, unit.area / medianArea - 0.5) : 0;
  return rimCost(unit.card[CARD_ROLES[role]!]) + focal + size;
}

/** Share of the rim that is too close first, then tone, then colour. */
const rimCost = ({ closeShare, tone, distance }: Suitability): number =>
  RIM_TOO_CLOSE * closeShare + RIM_TONE * shortOf(tone) + RIM_COLOR * shortOf(distance);
const shortOf = (difference: number): number => 1 - Math.min(difference, FAR_ENOUGH) / FAR_ENOUGH;

/** What it costs that two neighbours have these roles. */
export const pairCost = (one: number, other: number): number => (one !== other ? 0 : one === ACCENT ? ACCENTS_TOUCH : SAME_AS_NEIGHBOUR);

/** Cost of the shares of shown card: `sums` holds the area of page p in role r at 4 p + r. Asked thousands of times. */
export function shareCost(problem: PlacementProblem, sums: Float64Array): number {
  const left = sums[MAIN]! + sums[SECOND]! + sums[ACCENT]!;
  const right = sums[4 + MAIN]! + sums[4 + SECOND]! + sums[4 + ACCENT]!;
  const total = left + right;
  if (total <= 0) return 0;
  let off = 0;
  let apart = 0;
  for (let role = MAIN; role <= ACCENT; role++) {
    off += Math.abs((sums[role]! + sums[4 + role]!) / total - SHARE_RULE[role]!);
    if (left > 0 && right > 0) apart += Math.abs(sums[role]! / left - sums[4 + role]! / right);
  }
  return problem.count * (OFF_SHARE * off + PAGES_DIFFER * apart);
}

/**
 * What the shares will cost at least, once all units are placed: each role's share ends somewhere between what
 * is placed of it and that with all open units that may take it.
 *
 * @param total - card shown of all units that take one of the three roles.
 */
export function leastShareCost(problem: PlacementProblem, placed: readonly number[], open: readonly number[], total: number): number {
  if (total <= 0) return 0;
  const off = SHARE_RULE.map((wanted, role) => Math.max(0, placed[role]! / total - wanted, wanted - (placed[role]! + open[role]!) / total));
  return problem.count * OFF_SHARE * off.reduce((sum, distance) => sum + distance, 0);
}

/** What the number of accents will cost at least, with so many placed and so many units that may still take it. */
export const leastAccentCost = ({ accents }: PlacementProblem, placed: number, open: number): number =>
  ACCENT_MISSING * Math.max(0, accents.least - placed - open) + ACCENT_TOO_MANY * Math.max(0, placed - accents.most);

/** Cost of the accents' number, pages and places, by the units that have them. */
export function accentCost(problem: PlacementProblem, accented: readonly number[]): number {
  const { accents, span } = problem;
  let cost = ACCENT_MISSING * Math.max(0, accents.least - accented.length) + ACCENT_TOO_MANY * Math.max(0, accented.length - accents.most);
  accents.pages.forEach((wants, page) => {
    if (wants && !accented.some((i) => problem.page[i] === page)) cost += PAGE_WITHOUT_ACCENT;
  });
  const points = accented.map((i) => problem.centres[i]!);
  if (accents.least >= LEAST_ACCENTS && span.area > 0) cost += FLAT_TRIANGLE * (1 - hullArea(points) / span.area);
  if (points.length > 1 && span.across > 0) cost += ACCENTS_NEAR * (1 - nearest(points) / span.across);
  return cost;
}

/** What a complete placement costs: the objective, in one place. */
export function placementCost(problem: PlacementProblem, roles: ArrayLike<number>): number {
  const sums = new Float64Array(2 * ROLE_COUNT);
  const accented: number[] = [];
  let cost = 0;
  for (let i = 0; i < problem.count; i++) {
    const role = roles[i]!;
    cost += problem.own[i * ROLE_COUNT + role]!;
    for (const k of problem.neighbours[i]!) if (k > i) cost += pairCost(role, roles[k]!);
    sums[problem.page[i]! * ROLE_COUNT + role]! += problem.shown[i]!;
    if (role === ACCENT) accented.push(i);
  }
  return cost + shareCost(problem, sums) + accentCost(problem, accented);
}

function nearest(points: readonly Point[]): number {
  let least = Infinity;
  for (let i = 1; i < points.length; i++) for (let k = 0; k < i; k++) least = Math.min(least, between(points[i]!, points[k]!));
  return least;
}

const between = (p: Point, q: Point): number => Math.sqrt((p.x - q.x) ** 2 + (p.y - q.y) ** 2);

function farthest(points: readonly Point[]): number {
  let most = 0;
  for (let i = 1; i < points.length; i++) for (let k = 0; k < i; k++) most = Math.max(most, between(points[i]!, points[k]!));
  return most;
}
