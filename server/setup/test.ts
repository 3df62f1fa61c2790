import { spawn } from 'node:child_process';
import { mkdtempSync, readFileSync, rmSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { fileURLToPath } from 'node:url';
import type { Tally } from './tally';
import { BROKEN, slowest, sumOf, tallyOf } from './tally';

/**
 * `npm test`: every suite in turn, each in a process of its own, and one line with the sum. With `--refs` only the
 * suite over the published instance files.
 */
const ROOT = fileURLToPath(new URL('../../', import.meta.url));
const SLOWEST_SHOWN = 20;

interface Suite {
  readonly name: string;
  run(): Promise<Tally>;
}

const program = (path: string): string => join(ROOT, 'node_modules', path);

/** A tool that passes or fails as a whole: one test. */
const tool = (name: string, path: string, ...args: string[]): Suite => ({
  name,
  run: async () => ((await runNode([program(path), ...args])) === 0 ? { passed: 1, failed: 0, tests: [] } : BROKEN),
});

const vitest = (project: string): Suite => ({
  name: `${project} tests`,
  run: async () => {
    const folder = mkdtempSync(join(tmpdir(), 'pairleaf-report-'));
    const reportFile = join(folder, 'report.json');
    try {
      const exitCode = await runNode([
        program('vitest/vitest.mjs'),
        'run',
        ...['--project', project, '--reporter=dot', '--reporter=json', `--outputFile.json=${reportFile}`],
      ]);
      return tallyOf(readReport(reportFile), exitCode);
    } finally {
      rmSync(folder, { recursive: true, force: true });
    }
  },
});

const SUITES: readonly Suite[] = [
  tool('types', 'typescript/bin/tsc', '--noEmit'),
  tool('lint', 'eslint/bin/eslint.js', '.', '--max-warnings=0'),
  tool('build', 'vite/bin/vite.js', 'build', '--logLevel=warn'),
  vitest('shared'),
  vitest('server'),
  vitest('src'),
  vitest('e2e'),
];

const REFERENCE_SUITES: readonly Suite[] = [vitest('refs')];

function runNode(args: readonly string[]): Promise<number> {
  return new Promise((resolve) => {
    const child = spawn(process.execPath, args, { cwd: ROOT, stdio: 'inherit' });
    child.on('error', () => resolve(1));
    child.on('close', (code) => resolve(code ?? 1));
  });
}

function readReport(file: string): unknown {
  try {
    return JSON.parse(readFileSync(file, 'utf8'));
  } catch {
    return null;
  }
}

async function main(): Promise<void> {
  const suites = process.argv.includes('--refs') ? REFERENCE_SUITES : SUITES;
  const began = Date.now();
  const tallies: Tally[] = [];
  for (const suite of suites) {
    const suiteBegan = Date.now();
    console.log(`\n— ${suite.name}`);
    const tally = await suite.run();
    tallies.push(tally);
    console.log(`  ${suite.name}: ${tally.passed} passed, ${tally.failed} failed, ${seconds(suiteBegan)}`);
  }
  const sum = sumOf(tallies);
  console.log(`\nThe ${Math.min(SLOWEST_SHOWN, sum.tests.length)} slowest tests:`);
  for (const line of slowest(sum, SLOWEST_SHOWN)) console.log(line);
  console.log(`\nAll in ${seconds(began)}.`);
  console.log(`${sum.passed} passed, ${sum.failed} failed`);
  process.exitCode = sum.failed === 0 ? 0 : 1;
}

const seconds = (since: number): string => `${((Date.now() - since) / 1000).toFixed(1)} s`;

await main();
