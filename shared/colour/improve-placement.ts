import { ACCENT, accentCost, pairCost, placementCost, shareCost, type PlacementProblem } from './placement-cost';

/** An improvement must be worth this much, so that rounding never turns in a circle. */
const LEAST_GAIN = 1e-9;
/** Searches begin with no accent, and with accents spread out from each of so many small units. */
const STARTS = 10;
/** Placements looked at in all searches together, so that 160 mats stay quick. */
const MOST_TRIES = 30_000;

/**
 * A placement that no change of one unit and no swap of two improves, or the best met within MOST_TRIES: the
 * best of STARTS local searches. Deterministic.
 */
export function improvePlacement(problem: PlacementProblem): Uint8Array {
  let best: Uint8Array | null = null;
  let least = Infinity;
  let tries = 0;
  for (let start = 0; start < STARTS && (start === 0 || tries < MOST_TRIES); start++) {
    const state = new PlacementState(problem, startRoles(problem, start));
    tries += descend(problem, state, MOST_TRIES - tries);
    const cost = placementCost(problem, state.roles);
    if (cost < least - LEAST_GAIN) {
      least = cost;
      best = state.roles;
    }
  }
  return best!;
}

/** Every unit's cheapest role but accent; from the second start on accents are laid out far from each other. */
function startRoles(problem: PlacementProblem, start: number): Uint8Array {
  const roles = Uint8Array.from(problem.domains, (domain) => domain.find((role) => role !== ACCENT) ?? domain[0]!);
  if (start === 0) return roles;
  const open = problem.domains.flatMap((domain, i) => (domain.includes(ACCENT) ? [i] : []));
  const cheap = [...open].sort((a, b) => problem.own[a * 4 + ACCENT]! - problem.own[b * 4 + ACCENT]! || a - b);
  const first = cheap[(start - 1) % Math.max(1, cheap.length)];
  const taken = first === undefined ? [] : [first];
  while (taken.length > 0 && taken.length < Math.min(problem.accents.least, cheap.length)) {
    taken.push(farthestFrom(problem, taken, cheap.filter((i) => !taken.includes(i))));
  }
  for (const i of taken) roles[i] = ACCENT;
  return roles;
}

function farthestFrom(problem: PlacementProblem, taken: readonly number[], candidates: readonly number[]): number {
  const worth = (i: number): number => {
    const { x, y } = problem.centres[i]!;
    const apart = Math.min(...taken.map((k) => Math.hypot(x - problem.centres[k]!.x, y - problem.centres[k]!.y)));
    return apart / (1 + problem.own[i * 4 + ACCENT]!);
  };
  return candidates.reduce((a, b) => (worth(b) > worth(a) ? b : a));
}

/** @returns how many placements were looked at. */
function descend({ domains, count }: PlacementProblem, state: PlacementState, most: number): number {
  let tries = 0;
  for (let improved = true; improved && tries < most; ) {
    improved = false;
    for (let i = 0; i < count; i++) {
      for (const role of domains[i]!) {
        if (role === state.roles[i]) continue;
        tries++;
        if (state.attempt(i, role, i, role)) improved = true;
      }
    }
    for (let i = 0; i < count; i++) {
      for (let k = 0; k < i && tries < most; k++) {
        const one = state.roles[i]!;
        const other = state.roles[k]!;
        if (one === other || !domains[i]!.includes(other) || !domains[k]!.includes(one)) continue;
        tries++;
        if (state.attempt(i, other, k, one)) improved = true;
      }
    }
  }
  return tries;
}

/** A placement with its cost kept up to date, so that a change costs as much as the unit has neighbours. */
class PlacementState {
  private local = 0;
  private readonly sums = new Float64Array(8);
  private accents: number;
  private cost: number;

  constructor(
    private readonly problem: PlacementProblem,
    readonly roles: Uint8Array,
  ) {
    for (let i = 0; i < problem.count; i++) {
      this.local += problem.own[i * 4 + roles[i]!]!;
      for (const k of problem.neighbours[i]!) if (k > i) this.local += pairCost(roles[i]!, roles[k]!);
      this.sums[problem.page[i]! * 4 + roles[i]!]! += problem.shown[i]!;
    }
    this.accents = accentCost(problem, this.accented());
    this.cost = this.local + shareCost(problem, this.sums) + this.accents;
  }

  /** Gives two units (or one, named twice) other roles where that is cheaper; changes nothing where it is not. */
  attempt(i: number, role: number, k: number, other: number): boolean {
    const before = this.roles[i]!;
    const otherBefore = this.roles[k]!;
    this.set(i, role);
    this.set(k, other);
    const least = this.local + shareCost(this.problem, this.sums);
    const needed = this.cost - LEAST_GAIN;
    // What accents cost is never negative: most changes are refused without asking for their triangle.
    if (least < needed) {
      const isSame = (role === ACCENT) === (before === ACCENT) && (other === ACCENT) === (otherBefore === ACCENT);
      const accents = isSame ? this.accents : accentCost(this.problem, this.accented());
      if (least + accents < needed) {
        this.accents = accents;
        this.cost = least + accents;
        return true;
      }
    }
    this.set(k, otherBefore);
    this.set(i, before);
    return false;
  }

  private set(i: number, role: number): void {
    const { own, neighbours, page, shown } = this.problem;
    const before = this.roles[i]!;
    if (role === before) return;
    this.local += own[i * 4 + role]! - own[i * 4 + before]!;
    for (const k of neighbours[i]!) this.local += pairCost(role, this.roles[k]!) - pairCost(before, this.roles[k]!);
    this.sums[page[i]! * 4 + before]! -= shown[i]!;
    this.sums[page[i]! * 4 + role]! += shown[i]!;
    this.roles[i] = role;
  }

  private accented(): number[] {
    const found: number[] = [];
    for (let i = 0; i < this.roles.length; i++) if (this.roles[i] === ACCENT) found.push(i);
    return found;
  }
}
