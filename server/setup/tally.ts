import { z } from 'zod';

/** What one suite came to. */
export interface Tally {
  readonly passed: number;
  readonly failed: number;
  readonly tests: readonly TimedTest[];
}

export interface TimedTest {
  readonly name: string;
  readonly durationMs: number;
}

/** The parts of Vitest's JSON report that are counted. */
const reportSchema = z.object({
  testResults: z.array(
    z.object({
      name: z.string(),
      status: z.string(),
      assertionResults: z.array(
        z.object({ fullName: z.string(), status: z.string(), duration: z.number().nullish() }),
      ),
    }),
  ),
});

/** One test that fails: a suite that could not be counted. */
export const BROKEN: Tally = { passed: 0, failed: 1, tests: [] };

/**
 * Counts a Vitest run. Nothing may hide: a skipped test, a file that did not load, a run without a report and an
 * error outside any test each count as failed.
 *
 * @param report - the JSON report, or null where the run wrote none.
 * @param exitCode - of the run.
 */
export function tallyOf(report: unknown, exitCode: number): Tally {
  const parsed = reportSchema.safeParse(report);
  if (!parsed.success) return BROKEN;
  const files = parsed.data.testResults;
  const tests = files.flatMap((file) => file.assertionResults);
  const passed = tests.filter(({ status }) => status === 'passed').length;
  const brokenFiles = files.filter(
    (file) => file.status === 'failed' && file.assertionResults.every(({ status }) => status !== 'failed'),
  ).length;
  const failed = tests.length - passed + brokenFiles;
  return {
    passed,
    failed: failed === 0 && (exitCode !== 0 || passed === 0) ? 1 : failed,
    tests: tests.map(({ fullName, duration }) => ({ name: fullName, durationMs: duration ?? 0 })),
  };
}

export const sumOf = (tallies: readonly Tally[]): Tally => ({
  passed: tallies.reduce((sum, { passed }) => sum + passed, 0),
  failed: tallies.reduce((sum, { failed }) => sum + failed, 0),
  tests: tallies.flatMap(({ tests }) => tests),
});

/** The slowest tests, slowest first, one line each. */
export const slowest = ({ tests }: Tally, count: number): string[] =>
  [...tests]
    .sort((a, b) => b.durationMs - a.durationMs)
    .slice(0, count)
    .map(({ name, durationMs }) => `${(durationMs / 1000).toFixed(1).padStart(7)} s  ${name}`);
