/**
 * `npm run bench`: every bench file in turn, each starting what it needs by itself. `--json` prints one JSON array and
 * nothing else; other words pick the files whose names contain them.
 */
import { parseArgs } from 'node:util';
import type { BenchRow } from './bench';
import { findBenches, meetsGoal, runBench, tableOf } from './bench';

const { values, positionals } = parseArgs({ options: { json: { type: 'boolean', default: false } }, allowPositionals: true });
const say = (line: string): void => void process.stderr.write(`${line}\n`);

const rows: BenchRow[] = [];
const faults: string[] = [];
const names = findBenches(new URL('./', import.meta.url), positionals);
if (names.length === 0) faults.push(`No bench file is named like ${positionals.join(' or ') || '*.bench.ts'}.`);
for (const name of names) {
  const began = performance.now();
  say(`${name} …`);
  try {
    rows.push(...(await runBench(new URL(name, import.meta.url))));
    say(`  done in ${((performance.now() - began) / 1000).toFixed(1)} s`);
  } catch (error) {
    faults.push(`${name}: ${error instanceof Error ? (error.stack ?? error.message) : String(error)}`);
  }
}

console.log(values.json ? JSON.stringify(rows, null, 2) : tableOf(rows));
for (const fault of faults) say(fault);
const missed = rows.filter((row) => !meetsGoal(row));
if (missed.length > 0) say(`${missed.length} of ${rows.length} figures miss their goal.`);
// Figures depend on the machine: only a bench that could not be run is a failure.
process.exit(faults.length === 0 ? 0 : 1);
