import { describe, expect, it } from 'vitest';
import { slowest, sumOf, tallyOf } from '#server/setup/tally';

const file = (status: string, ...statuses: string[]) => ({
  name: 'a.test.ts',
  status,
  assertionResults: statuses.map((each, at) => ({ fullName: `test ${at}`, status: each, duration: 10 * at })),
});
const counts = (report: unknown, exitCode: number): [number, number] => {
  const { passed, failed } = tallyOf(report, exitCode);
  return [passed, failed];
};

describe('the count that npm test ends with', () => {
  it.each([
    ['passes', { testResults: [file('passed', 'passed', 'passed')] }, 0, [2, 0]],
    ['failures', { testResults: [file('failed', 'passed', 'failed')] }, 1, [1, 1]],
    ['a skipped test as failed', { testResults: [file('passed', 'passed', 'skipped')] }, 0, [1, 1]],
    ['a file that does not load', { testResults: [file('failed')] }, 1, [0, 1]],
    ['a hook that fails after tests that passed', { testResults: [file('failed', 'passed')] }, 1, [1, 1]],
    ['an error outside any test', { testResults: [file('passed', 'passed')] }, 1, [1, 1]],
    ['a run that found no test', { testResults: [] }, 0, [0, 1]],
    ['a run without a report', null, 1, [0, 1]],
  ])('counts %s', (_what, report, exitCode, expected) => {
    expect(counts(report, exitCode)).toEqual(expected);
  });

  it('adds suites up and lists the slowest first', () => {
    const sum = sumOf([tallyOf({ testResults: [file('passed', 'passed', 'passed')] }, 0), tallyOf(null, 1)]);
    expect([sum.passed, sum.failed]).toEqual([2, 1]);
    expect(slowest(sum, 1)).toEqual(['    0.0 s  test 1']);
  });
});
