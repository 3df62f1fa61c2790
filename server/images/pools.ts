import { availableParallelism } from 'node:os';
import type { ReadColor } from '../../shared/colour/white-balance';
import type { ExportResult, ExportTask } from './export-spread';
import type { IntakeResult, IntakeTask } from './intake';
import type { ReadingTask } from './read-sheet';
import { WorkerPool } from './worker-pool';

const MEBIBYTE = 1024 * 1024;

/** What the workers may use; the target server has 2 cores and 4 GiB in all (MODEL.md 22). */
export const INTAKE_LIMITS = { maxRssBytes: 900 * MEBIBYTE, timeLimitMs: 60_000 } as const;
export const EXPORT_LIMITS = { maxRssBytes: 1536 * MEBIBYTE, timeLimitMs: 180_000 } as const;

/** So many uploads may wait for a worker: a whole box of 200 files from two people at once. */
const MAX_WAITING_INTAKES = 400;
const IDLE_MS = 60_000;

export type IntakePool = WorkerPool<IntakeTask, IntakeResult>;
export type ReadingPool = WorkerPool<ReadingTask, ReadColor>;
export type ExportPool = WorkerPool<ExportTask, ExportResult>;

export const createIntakePool = (): IntakePool =>
  new WorkerPool({
    script: new URL('./intake-worker.ts', import.meta.url),
    size: Math.min(2, availableParallelism()),
    maxWaiting: MAX_WAITING_INTAKES,
    idleMs: IDLE_MS,
    ...INTAKE_LIMITS,
  });

/** Reads colours from photographed sheets: one at a time, with the limits of an intake. */
export const createReadingPool = (): ReadingPool =>
  new WorkerPool({
    script: new URL('./reading-worker.ts', import.meta.url),
    size: 1,
    maxWaiting: 20,
    idleMs: IDLE_MS,
    ...INTAKE_LIMITS,
  });

/** One export at a time: MODEL.md 16. */
export const createExportPool = (): ExportPool =>
  new WorkerPool({
    script: new URL('./export-worker.ts', import.meta.url),
    size: 1,
    maxWaiting: 20,
    idleMs: IDLE_MS,
    ...EXPORT_LIMITS,
  });
