import { performance } from 'node:perf_hooks';
import { suggestPlaced } from '#shared/colour/suggest-placed';
import { TRIM_SETTINGS_INCH } from '#shared/model/trim-settings';
import { printsById } from '../support/builders';
import { randomOf, randomSpread } from '../support/random-spread';
import type { BenchRow } from './bench';
import { percentile } from './timing';

const RUNS = 10;
const ROUNDS = 4;
/** Mats, each with a print of its own, and the time that Compose can wait for their schemes. */
const GROWTH = [
  [10, 60],
  [40, 100],
  [160, 400],
] as const;

/**
 * Three schemes with their placements and shares, as Compose's worker makes them, of spreads and prints never seen
 * before. Each spread is made anew in every round and counted at its least: what other programs of a busy machine take
 * away in one round is not counted.
 */
function timesOf(mats: number, prints: number): number[] {
  const rounds = Array.from({ length: ROUNDS }, () =>
    Array.from({ length: RUNS }, (_, i) => {
      const spread = randomSpread(randomOf(mats * 1000 + i), { mats, prints });
      const byId = printsById(spread.prints);
      const start = performance.now();
      suggestPlaced({ doc: spread.doc, prints: byId, trim: TRIM_SETTINGS_INCH });
      return performance.now() - start;
    }),
  );
  return rounds[0]!.map((_, i) => Math.min(...rounds.map((times) => times[i]!)));
}

/** 24 prints on 30 mats against the goal; then how the time grows with the mats. */
export function rows(): BenchRow[] {
  const row = (id: string, value: number, goal: number): BenchRow => ({ id, value, floor: null, ratio: null, unit: 'ms', goal, better: 'lower' });
  const main = timesOf(30, 24);
  return [
    row('schemes.30-mats-24-prints.median', percentile(main, 0.5), 60),
    row('schemes.30-mats-24-prints.worst', Math.max(...main), 120),
    ...GROWTH.map(([mats, goal]) => row(`schemes.${mats}-mats.median`, percentile(timesOf(mats, mats), 0.5), goal)),
  ];
}
