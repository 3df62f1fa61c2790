import { rgbToHex } from '#shared/colour/convert';
import { indexStash, nearestSheet } from '#shared/colour/snap';
import { buildSheet } from '../support/stash';
import type { BenchRow } from './bench';
import { percentile } from './timing';

const PAPERS = 2000;
const COLORS = 5;
const ROUNDS = 40;
const WARM_UP = 5;

/** A colour that is the same in every run. */
const colorAt = (i: number): string => rgbToHex((i * 97) % 256, (i * 57 + 31) % 256, (i * 23 + 101) % 256);

const timed = (run: () => unknown): number => {
  const start = performance.now();
  run();
  return performance.now() - start;
};

/** Five colours of a scheme snapped to 2,000 papers, the making of the index included. */
export function rows(): BenchRow[] {
  const sheets = Array.from({ length: PAPERS }, (_, i) => buildSheet({ hex: colorAt(i) }));
  const wanted = Array.from({ length: COLORS }, (_, i) => colorAt(i * 331 + 7));
  const times = Array.from({ length: ROUNDS + WARM_UP }, () =>
    timed(() => {
      const index = indexStash(sheets);
      for (const hex of wanted) nearestSheet(index, hex, ({ quantity }) => quantity > 0);
    }),
  ).slice(WARM_UP);
  return [{ id: 'stash.snap', value: percentile(times, 0.5), floor: null, ratio: null, unit: 'ms', goal: 10, better: 'lower' }];
}
