import { describe, expect, it } from 'vitest';
import { assignCards } from '#shared/colour/assign-cards';
import { cardUnits } from '#shared/colour/card-units';
import { hullArea } from '#shared/colour/hull';
import { improvePlacement } from '#shared/colour/improve-placement';
import { ACCENT, CARD_ROLES, MAIN, placementCost, placementProblem, SECOND, type PlacementProblem } from '#shared/colour/placement-cost';
import { provePlacement } from '#shared/colour/prove-placement';
import { placeScheme, suggestSchemes } from '#shared/colour/schemes';
import type { MatId } from '#shared/model/ids';
import type { Scheme, SpreadDocument } from '#shared/model/spread';
import { TRIM_SETTINGS_INCH } from '#shared/model/trim-settings';
import { printsById } from '../../support/builders';
import { mirrorSpread, randomOf, randomSpread, type RandomSpread } from '../../support/random-spread';

/** Without split prints: mirrored, their panes show other parts of the picture. */
const spreadWith = (seed: number, mats: number, prints = 6): RandomSpread => randomSpread(randomOf(seed), { mats, prints, rasterSize: 24, withPanes: false });
const echoOf = ({ doc, prints }: RandomSpread): Scheme => suggestSchemes({ doc, prints: printsById(prints) })[0]!;
const unitsOf = (spread: RandomSpread) => cardUnits(spread.doc, printsById(spread.prints), TRIM_SETTINGS_INCH, echoOf(spread));
const problemOf = (spread: RandomSpread): PlacementProblem => placementProblem(unitsOf(spread));

/** The least cost of all placements, by trying each. */
function cheapestOfAll(problem: PlacementProblem): number {
  const roles = new Uint8Array(problem.count);
  let least = Infinity;
  const fill = (i: number): void => {
    if (i === problem.count) {
      least = Math.min(least, placementCost(problem, roles));
      return;
    }
    for (const role of problem.domains[i]!) {
      roles[i] = role;
      fill(i + 1);
    }
  };
  fill(0);
  return least;
}

const SMALL = Array.from({ length: 24 }, (_, i) => [i + 1, 2 + (i % 8)] as const);

describe('a placement of card colours', () => {
  it.each(SMALL)('is the cheapest of all placements: spread %i of %i mats', (seed, mats) => {
    const spread = spreadWith(seed, mats);
    const problem = problemOf(spread);
    const { roles, isOptimal } = assignCards(unitsOf(spread));
    expect(isOptimal).toBe(true);
    const cost = placementCost(problem, roles.map((role) => CARD_ROLES.indexOf(role)));
    expect(cost).toBeCloseTo(cheapestOfAll(problem), 9);
  });

  it.each(SMALL)('is proven from the worst start as well: spread %i of %i mats', (seed, mats) => {
    const problem = problemOf(spreadWith(seed, mats));
    const worst = Uint8Array.from(problem.domains, (domain) => domain[domain.length - 1]!);
    const { roles, isOptimal } = provePlacement(problem, worst);
    expect(isOptimal).toBe(true);
    expect(placementCost(problem, roles)).toBeCloseTo(cheapestOfAll(problem), 9);
  });

  it('is left by the local search where neither one change nor one swap makes it cheaper', () => {
    for (const seed of [1, 2, 3]) {
      const problem = problemOf(spreadWith(seed, 30, 24));
      const roles = improvePlacement(problem);
      const cost = placementCost(problem, roles);
      problem.domains.forEach((domain, i) => {
        for (const role of domain) expect(placementCost(problem, roles.with(i, role))).toBeGreaterThanOrEqual(cost - 1e-6);
        for (let k = 0; k < i; k++) {
          if (!domain.includes(roles[k]!) || !problem.domains[k]!.includes(roles[i]!)) continue;
          expect(placementCost(problem, roles.with(i, roles[k]!).with(k, roles[i]!))).toBeGreaterThanOrEqual(cost - 1e-6);
        }
      });
    }
  });

  it('is mostly found before any proof', () => {
    const ratios = SMALL.map(([seed, mats]) => {
      const problem = problemOf(spreadWith(seed, mats));
      const least = cheapestOfAll(problem);
      return least > 0 ? placementCost(problem, improvePlacement(problem)) / least : 1;
    });
    // Of two mats neither a change nor a swap leads away from the wrong one: there the proof decides.
    expect(ratios.filter((ratio) => ratio < 1 + 1e-9).length).toBeGreaterThanOrEqual(ratios.length - 1);
  });

  it.each([1, 14, 40, 160])('of %i mats costs a finite amount and is the same every time', (mats) => {
    const spread = spreadWith(7, mats, 24);
    const problem = problemOf(spread);
    expect([...problem.own, ...problem.shown].every(Number.isFinite)).toBe(true);
    const once = assignCards(unitsOf(spread));
    expect(placementCost(problem, once.roles.map((role) => CARD_ROLES.indexOf(role)))).toBeLessThan(Infinity);
    expect(assignCards(unitsOf(spreadWith(7, mats, 24)))).toEqual(once);
  });

  it('of the mirrored spread is the mirrored placement', () => {
    for (let seed = 1; seed <= 24; seed++) {
      const spread = spreadWith(seed, 4 + seed, 12);
      const mirrored = { ...spread, doc: mirrorSpread(spread.doc) };
      const [scheme, turned] = [echoOf(spread), echoOf(mirrored)];
      expect(turned).toEqual(scheme);
      expect(colorsOf(mirrored.doc, spread, scheme)).toEqual(colorsOf(spread.doc, spread, scheme));
    }
  });
});

function colorsOf(doc: SpreadDocument, { prints }: RandomSpread, scheme: Scheme): { mats: [MatId, string][]; inners: unknown } {
  const { matColors, inners = {} } = placeScheme({ doc, prints: printsById(prints), trim: TRIM_SETTINGS_INCH }, scheme);
  return { mats: Object.entries(matColors).sort(), inners };
}

describe('the objective', () => {
  // Eight bare mats in two columns of each page: nothing but places and areas decides.
  const bare = placementProblem([]);
  const grid = (): PlacementProblem => {
    const centres = [0, 1, 2, 3].flatMap((column) => [0, 1].map((row) => ({ x: column * 1000, y: row * 1000 })));
    return {
      count: 8,
      domains: centres.map(() => [MAIN, SECOND, ACCENT]),
      own: new Float64Array(32),
      neighbours: centres.map((p, i) => centres.flatMap((q, k) => (k !== i && i >> 2 === k >> 2 && Math.hypot(p.x - q.x, p.y - q.y) <= 1000 ? [k] : []))),
      shown: new Float64Array(8).fill(1),
      page: Uint8Array.from([0, 0, 0, 0, 1, 1, 1, 1]),
      centres,
      accents: { least: 3, most: 3, pages: [true, true] },
      span: { area: hullArea(centres), across: Math.hypot(3000, 1000) },
    };
  };

  it('is 0 for no mats', () => {
    expect(placementCost(bare, [])).toBe(0);
  });

  it('prefers accents in a triangle over both pages to a row, a heap, one page or one place', () => {
    const cost = (accents: readonly number[]): number => placementCost(grid(), grid().centres.map((_, i) => (accents.includes(i) ? ACCENT : i % 3 === 0 ? SECOND : MAIN)));
    const triangle = cost([0, 5, 6]);
    for (const worse of [[0, 2, 6], [0, 1, 2], [4, 5, 6], [0], []]) expect(cost(worse)).toBeGreaterThan(triangle);
  });

  it('counts one for neighbours in one colour', () => {
    const problem = { ...grid(), accents: { least: 0, most: 9, pages: [false, false] }, shown: new Float64Array(8) };
    expect(placementCost(problem, new Uint8Array(8).fill(MAIN))).toBe(8);
    expect(placementCost(problem, [MAIN, SECOND, SECOND, MAIN, MAIN, SECOND, SECOND, MAIN])).toBe(0);
  });

  it('wants six tenths main, three second, one accent, alike on both pages', () => {
    const problem = { ...grid(), neighbours: grid().centres.map(() => []), accents: { least: 0, most: 9, pages: [false, false] }, span: { area: 0, across: 0 } };
    const shown = (...areas: number[]): PlacementProblem => ({ ...problem, shown: Float64Array.from(areas) });
    const roles = [MAIN, SECOND, ACCENT, MAIN, MAIN, SECOND, ACCENT, MAIN];
    expect(placementCost(shown(3, 3, 1, 3, 3, 3, 1, 3), roles)).toBeCloseTo(0, 12);
    expect(placementCost(shown(3, 3, 1, 3, 1, 6, 1, 2), roles)).toBeGreaterThan(0.5);
    expect(placementCost(shown(3, 3, 3, 3, 3, 3, 3, 3), roles)).toBeGreaterThan(0.5);
  });
});

describe('hullArea', () => {
  it.each([
    [[[0, 0], [4, 0], [4, 3], [0, 3], [1, 1], [2, 2]], 12],
    [[[0, 0], [2, 0], [1, 5]], 5],
    [[[0, 0], [1, 1], [2, 2], [3, 3]], 0],
    [[[0, 0], [1, 1]], 0],
  ] as const)('of %j is %d', (points, area) => {
    expect(hullArea(points.map(([x, y]) => ({ x, y })))).toBe(area);
  });
});
