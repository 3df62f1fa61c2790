import { oklabDistance, type Oklab } from './convert';

export interface WeightedColor {
  readonly oklab: Oklab;
  readonly weight: number;
}

export interface ColorGroup<T extends WeightedColor> {
  /** Weighted mean in OKLab. */
  readonly mean: Oklab;
  /** The member nearest to the mean: a colour that really occurs. */
  readonly nearest: T;
  readonly weight: number;
  readonly members: readonly T[];
}

const ROUNDS = 12;
/** No group is opened for colours that all lie this near to one: OKLab, about CIEDE2000 5. */
const FAR_ENOUGH = 0.05;

/**
 * Weighted k-means in OKLab, deterministic: the first centre is the heaviest colour, each further one is
 * the colour with the largest weight × distance² to the centres before it. Heaviest group first.
 *
 * @param colors - in any fixed order; the result depends on it only where two colours tie.
 * @param most - no more groups than this; fewer where the colours are alike.
 */
export function groupColors<T extends WeightedColor>(colors: readonly T[], most: number): ColorGroup<T>[] {
  if (colors.length === 0) return [];
  let centres = firstCentres(colors, most);
  let owners = assign(colors, centres);
  for (let round = 0; round < ROUNDS; round++) {
    centres = meansOf(colors, owners, centres);
    const next = assign(colors, centres);
    const isSettled = next.every((owner, i) => owner === owners[i]);
    owners = next;
    if (isSettled) break;
  }
  return centres
    .flatMap((mean, k) => {
      const members = colors.filter((_, i) => owners[i] === k);
      const weight = members.reduce((sum, member) => sum + member.weight, 0);
      if (weight === 0) return [];
      const nearest = members.reduce((a, b) => (oklabDistance(b.oklab, mean) < oklabDistance(a.oklab, mean) ? b : a));
      return [{ mean, nearest, weight, members }];
    })
    .sort((a, b) => b.weight - a.weight);
}

function firstCentres(colors: readonly WeightedColor[], most: number): Oklab[] {
  let next = colors.reduce((a, b) => (b.weight > a.weight ? b : a));
  const centres: Oklab[] = [];
  const distances = new Float64Array(colors.length).fill(Infinity);
  while (centres.length < most) {
    centres.push(next.oklab);
    let best = -1;
    let bestScore = 0;
    colors.forEach((color, i) => {
      distances[i] = Math.min(distances[i]!, oklabDistance(color.oklab, next.oklab));
      const score = color.weight * distances[i]! * distances[i]!;
      if (distances[i]! >= FAR_ENOUGH && score > bestScore) {
        bestScore = score;
        best = i;
      }
    });
    if (best < 0) break;
    next = colors[best]!;
  }
  return centres;
}

function assign(colors: readonly WeightedColor[], centres: readonly Oklab[]): Uint8Array {
  const owners = new Uint8Array(colors.length);
  colors.forEach(({ oklab: [l, a, b] }, i) => {
    let least = Infinity;
    for (let k = 0; k < centres.length; k++) {
      const centre = centres[k]!;
      const square = (centre[0] - l) ** 2 + (centre[1] - a) ** 2 + (centre[2] - b) ** 2;
      if (square < least) {
        least = square;
        owners[i] = k;
      }
    }
  });
  return owners;
}

function meansOf(colors: readonly WeightedColor[], owners: Uint8Array, before: readonly Oklab[]): Oklab[] {
  const sums = before.map(() => [0, 0, 0, 0] as [number, number, number, number]);
  colors.forEach(({ oklab, weight }, i) => {
    const sum = sums[owners[i]!]!;
    sum[0] += oklab[0] * weight;
    sum[1] += oklab[1] * weight;
    sum[2] += oklab[2] * weight;
    sum[3] += weight;
  });
  return sums.map(([l, a, b, weight], k) => (weight > 0 ? [l / weight, a / weight, b / weight] : before[k]!));
}
