import { ACCENT, BASE, leastAccentCost, leastShareCost, pairCost, placementCost, type PlacementProblem } from './placement-cost';

/** More units than this are not tried: the proof would not end. */
const MOST_UNITS = 14;
/** Partial placements looked at before the proof is given up. */
const MOST_NODES = 25_000;
const LEAST_GAIN = 1e-9;

/**
 * Branch and bound from a placement that is already good. A branch is left where what is placed, the least that
 * each unit still open adds beside its placed neighbours, and the least that accents still missing will cost come to
 * as much as the best placement known. Every bound is of the same terms as `placementCost`, so nothing cheaper is lost.
 *
 * @returns the cheapest placement and that it is proven, or the best met and that it is not.
 */
export function provePlacement(problem: PlacementProblem, known: Uint8Array): { roles: Uint8Array; isOptimal: boolean } {
  if (problem.count > MOST_UNITS) return { roles: known, isOptimal: false };
  const search = new Search(problem, known);
  search.branch(0, 0);
  return { roles: search.best, isOptimal: search.nodes <= MOST_NODES };
}

class Search {
  nodes = 0;
  best: Uint8Array;
  private least: number;
  private readonly roles: Uint8Array;
  /** Units in the order in which they are placed: those that decide most first. */
  private readonly order: readonly number[];
  /** What unit i in role r costs by itself and beside its placed neighbours, at 4 i + r. */
  private readonly added: Float64Array;
  private readonly isPlaced: Uint8Array;

  constructor(
    private readonly problem: PlacementProblem,
    known: Uint8Array,
  ) {
    this.best = known;
    this.least = placementCost(problem, known);
    this.roles = Uint8Array.from(known);
    this.added = Float64Array.from(problem.own);
    this.isPlaced = new Uint8Array(problem.count);
    this.order = Array.from({ length: problem.count }, (_, i) => i).sort(
      (a, b) => problem.neighbours[b]!.length - problem.neighbours[a]!.length || problem.shown[b]! - problem.shown[a]! || a - b,
    );
  }

  branch(depth: number, placed: number): void {
    this.nodes++;
    if (this.nodes > MOST_NODES) return;
    if (depth === this.problem.count) {
      const cost = placementCost(this.problem, this.roles);
      if (cost < this.least - LEAST_GAIN) {
        this.least = cost;
        this.best = Uint8Array.from(this.roles);
      }
      return;
    }
    const unit = this.order[depth]!;
    for (const role of this.problem.domains[unit]!) {
      const cost = placed + this.added[unit * 4 + role]!;
      this.place(unit, role, 1);
      if (cost + this.leastOfRest(depth + 1) < this.least - LEAST_GAIN) this.branch(depth + 1, cost);
      this.place(unit, role, -1);
    }
  }

  /** Places a unit, or with `sign` −1 takes it back. */
  private place(unit: number, role: number, sign: 1 | -1): void {
    this.roles[unit] = role;
    this.isPlaced[unit] = sign === 1 ? 1 : 0;
    for (const k of this.problem.neighbours[unit]!) {
      if (!this.isPlaced[k]) this.added[k * 4 + role]! += sign * pairCost(role, role);
    }
  }

  private leastOfRest(from: number): number {
    const { problem, order, roles } = this;
    const placed = [0, 0, 0];
    const open = [0, 0, 0];
    const accents = { placed: 0, open: 0 };
    let total = 0;
    let rest = 0;
    order.forEach((unit, at) => {
      const shown = problem.shown[unit]!;
      const domain = problem.domains[unit]!;
      if (domain[0] !== BASE) total += shown;
      if (at < from) {
        if (roles[unit]! < BASE) placed[roles[unit]!]! += shown;
        if (roles[unit] === ACCENT) accents.placed++;
        return;
      }
      let least = Infinity;
      for (const role of domain) {
        least = Math.min(least, this.added[unit * 4 + role]!);
        if (role < BASE) open[role]! += shown;
        if (role === ACCENT) accents.open++;
      }
      rest += least;
    });
    return rest + leastShareCost(problem, placed, open, total) + leastAccentCost(problem, accents.placed, accents.open);
  }
}
