import { performance } from 'node:perf_hooks';

/** Milliseconds that `work` takes. */
export async function timed(work: () => Promise<unknown>): Promise<number> {
  const start = performance.now();
  await work();
  return performance.now() - start;
}

/** The value below which that share (0–1) of the values lies. */
export function percentile(values: readonly number[], share: number): number {
  const sorted = [...values].sort((a, b) => a - b);
  return sorted[Math.min(sorted.length - 1, Math.floor(sorted.length * share))] ?? Number.NaN;
}

/** Medians of two kinds of work done in turn, so that what else the machine does meets both alike. One round warms up. */
export async function medianOfBoth(rounds: number, ours: () => Promise<unknown>, bare: () => Promise<unknown>): Promise<{ ours: number; bare: number }> {
  const mine: number[] = [];
  const floor: number[] = [];
  for (let round = 0; round <= rounds; round += 1) {
    const [a, b] = [await timed(ours), await timed(bare)];
    if (round === 0) continue;
    mine.push(a);
    floor.push(b);
  }
  return { ours: percentile(mine, 0.5), bare: percentile(floor, 0.5) };
}
