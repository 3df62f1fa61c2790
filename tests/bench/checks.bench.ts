import { performance } from 'node:perf_hooks';
import { runChecks } from '#shared/checks/run-checks';
import { viewSpread } from '#shared/checks/view-spread';
import { weighSpread } from '#shared/checks/weight';
import type { CommandCall } from '#shared/commands/calls';
import { runCommand } from '#shared/commands/run-command';
import { applyPatch } from '#shared/model/patch';
import type { Print } from '#shared/model/print';
import type { SpreadDocument } from '#shared/model/spread';
import { TRIM_SETTINGS_INCH } from '#shared/model/trim-settings';
import { idOf, printsById } from '../support/builders';
import { randomOf, randomSpread, type Random } from '../support/random-spread';
import type { BenchRow } from './bench';

const MATS = 40;
const PRINTS = 40;
const EDITS = 500;
const ROUNDS = 3;
const SCRATCH_RUNS = 60;
const WARM_UP = 80;
/** One object, as the editor's store keeps it. */
const NOT_USED_ELSEWHERE = {};

type Prints = ReadonlyMap<string, Print>;

/** What Compose does at every step of a drag: the view, all checks with their remedies, and the weights. */
function judge(doc: SpreadDocument, prints: Prints): number {
  const view = viewSpread({ doc, prints, trim: TRIM_SETTINGS_INCH, usedElsewhere: NOT_USED_ELSEWHERE });
  return runChecks(view).length + weighSpread(view).left;
}

function timed(run: () => void): number {
  const start = performance.now();
  run();
  return performance.now() - start;
}

const percentile = (values: readonly number[], share: number): number => [...values].sort((a, b) => a - b)[Math.min(values.length - 1, Math.floor(values.length * share))]!;

/** One edit of the kind that a drag makes many of, or a person presses. */
function randomEdit(random: Random, doc: SpreadDocument): CommandCall {
  const mat = doc.mats[Math.floor(random() * doc.mats.length)]!;
  const other = doc.mats[Math.floor(random() * doc.mats.length)]!;
  const step = (): number => Math.round(random() * 4) - 2;
  const edits: readonly CommandCall[] = [
    { id: 'window.slide', args: { matId: mat.id, x: Math.round(random() * 12_000), y: Math.round(random() * 8_000) } },
    { id: 'mats.resize', args: { matId: mat.id, x: mat.x, y: mat.y, w: Math.max(2, mat.w + step()), h: Math.max(2, mat.h + step()) } },
    { id: 'mats.setColor', args: { matIds: [mat.id], color: random() < 0.5 ? '#a8c5bd' : '#2b2b2b' } },
    { id: 'prints.move', args: { fromMatId: mat.id, toMatId: other.id } },
    { id: 'prints.place', args: { printId: doc.table[Math.floor(random() * doc.table.length)]!, matId: mat.id } },
    { id: 'mats.setReveal', args: { matIds: [mat.id], reveal: Math.round(random() * 4) * 254 } },
  ];
  return edits[Math.floor(random() * edits.length)]!;
}

interface Times {
  readonly judged: readonly number[];
  readonly passes: readonly number[];
}

/** The same edits from the same start, on new objects in every round. */
function afterEdits(seed: number): Times {
  const random = randomOf(seed);
  const spread = randomSpread(random, { mats: MATS, prints: PRINTS });
  const prints = printsById(spread.prints);
  let { doc } = spread;
  const judged: number[] = [];
  const passes: number[] = [];
  judge(doc, prints);
  let made = 0;
  while (judged.length < EDITS + WARM_UP) {
    const patch = runCommand(doc, randomEdit(random, doc), { prints, trim: TRIM_SETTINGS_INCH, newId: () => idOf((made += 1), 7) });
    if (Object.keys(patch).length === 0) continue;
    doc = applyPatch(doc, patch);
    judged.push(timed(() => judge(doc, prints)));
    passes.push(timed(() => JSON.stringify(doc)));
  }
  return { judged: judged.slice(WARM_UP), passes: passes.slice(WARM_UP) };
}

/** Documents and prints of which nothing is remembered: new objects, decoded and measured anew. */
function fromScratch(seed: number): readonly number[] {
  const times = Array.from({ length: SCRATCH_RUNS + WARM_UP }, (_, i) => {
    const { doc, prints } = randomSpread(randomOf(seed + i), { mats: MATS, prints: PRINTS });
    const byId = printsById(prints);
    return timed(() => judge(doc, byId));
  });
  return times.slice(WARM_UP);
}

/**
 * Each of a row of measurements, repeated in so many rounds, at its least: what other programs of a busy
 * machine take away in one round is not counted, what the same edit costs every time is.
 */
const leastOf = (rounds: readonly (readonly number[])[]): number[] => rounds[0]!.map((_, i) => Math.min(...rounds.map((times) => times[i]!)));

/**
 * All checks on 40 mats and 40 prints, remedies tried and weights measured. The last row's floor is one pass over the
 * document in the same run, writing it out as JSON, so that it says the same on a slow machine.
 */
export function rows(): BenchRow[] {
  const rounds = Array.from({ length: ROUNDS }, () => afterEdits(1));
  const edits = leastOf(rounds.map(({ judged }) => judged));
  const scratch = leastOf(Array.from({ length: ROUNDS }, () => fromScratch(1000)));
  const row = (id: string, value: number, goal: number): BenchRow => ({ id, value, floor: null, ratio: null, unit: 'ms', goal, better: 'lower' });
  const median = percentile(edits, 0.5);
  const pass = percentile(leastOf(rounds.map(({ passes }) => passes)), 0.5);
  return [
    row('checks.edit.median', median, 2),
    row('checks.edit.p99', percentile(edits, 0.99), 8),
    row('checks.scratch.median', percentile(scratch, 0.5), 5),
    { ...row('checks.edit.passes', median, 60), floor: pass, ratio: median / pass },
  ];
}
