import { readdirSync } from 'node:fs';
import { z } from 'zod';

/** One measured figure: MODEL.md 20. */
export const benchRowSchema = z.strictObject({
  /** Such as `checks.edit.median`. */
  id: z.string().regex(/^[a-z0-9]+([.-][a-z0-9]+)*$/),
  value: z.number(),
  /** The bare pipeline that the value is held against, in the same unit; null where the goal is absolute. */
  floor: z.number().nullable(),
  /** value / floor, or null. */
  ratio: z.number().nullable(),
  /** Of value and floor: `ms`, `kB`, `MB`, … */
  unit: z.string().min(1),
  /** What the ratio should reach where there is one, otherwise the value. */
  goal: z.number(),
  better: z.enum(['lower', 'higher']),
});
export type BenchRow = z.infer<typeof benchRowSchema>;

const moduleSchema = z.object({ rows: z.custom<() => Promise<BenchRow[]>>((value) => typeof value === 'function') });

export const meetsGoal = ({ value, ratio, goal, better }: BenchRow): boolean =>
  better === 'lower' ? (ratio ?? value) <= goal : (ratio ?? value) >= goal;

/** The bench files whose names contain one of `wanted`, all where none is named, in order. */
export const findBenches = (folder: URL, wanted: readonly string[]): string[] =>
  readdirSync(folder)
    .filter((name) => name.endsWith('.bench.ts') && (wanted.length === 0 || wanted.some((part) => name.includes(part))))
    .sort();

/**
 * Runs one bench file.
 *
 * @throws Error when it exports no `rows`, or its rows do not have the agreed form.
 */
export async function runBench(url: URL): Promise<BenchRow[]> {
  const { rows } = moduleSchema.parse(await import(url.href));
  return z.array(benchRowSchema).min(1).parse(await rows());
}

const HEADINGS = ['', 'figure', 'value', 'floor', 'ratio', 'goal'];

/** The rows as a table for people; each line begins with whether its goal is met. */
export function tableOf(rows: readonly BenchRow[]): string {
  const cells = rows.map((row) => [
    meetsGoal(row) ? 'ok  ' : 'MISS',
    row.id,
    `${short(row.value)} ${row.unit}`,
    row.floor === null ? '' : `${short(row.floor)} ${row.unit}`,
    row.ratio === null ? '' : `${short(row.ratio)} ×`,
    `${row.better === 'lower' ? '≤' : '≥'} ${short(row.goal)}${row.ratio === null ? ` ${row.unit}` : ' ×'}`,
  ]);
  const lines = [HEADINGS, ...cells];
  const widths = HEADINGS.map((_, at) => Math.max(...lines.map((line) => line[at]?.length ?? 0)));
  return lines.map((line) => line.map((cell, at) => pad(cell, widths[at] ?? 0, at >= 2)).join('  ').trimEnd()).join('\n');
}

const short = (figure: number): string => String(Number(figure.toPrecision(4)));
const pad = (cell: string, width: number, isFigure: boolean): string => (isFigure ? cell.padStart(width) : cell.padEnd(width));
