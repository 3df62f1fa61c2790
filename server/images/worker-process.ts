import { fork, type ChildProcess } from 'node:child_process';
import { readFile } from 'node:fs/promises';
import { setPriority } from 'node:os';
import { fileURLToPath } from 'node:url';
import { Refusal, type AnswerMessage } from './worker-messages';

export interface WorkerLimits {
  /** The process is ended when its resident memory grows past this. */
  readonly maxRssBytes: number;
  /** The process is ended when one task takes longer. */
  readonly timeLimitMs: number;
}

/** Why a worker process ended before it answered. */
export type WorkerEnd = 'memory' | 'time' | 'crash' | 'stopped';

export class WorkerEndedError extends Error {
  constructor(readonly end: WorkerEnd) {
    super(`The worker process ended: ${end}`);
    this.name = 'WorkerEndedError';
  }
}

const ROOT = fileURLToPath(new URL('../../', import.meta.url));
const WATCH_MS = 50;
/** Below the API process, so that picture work never starves requests. */
const NICENESS = 10;

interface Running {
  readonly resolve: (result: unknown) => void;
  readonly reject: (error: Error) => void;
  readonly onProgress: (progress: number) => void;
}

/** One child process that does one task at a time under a memory cap and a time limit. */
export class WorkerProcess {
  private readonly child: ChildProcess;
  private readonly exited: Promise<void>;
  private running: Running | null = null;
  private end: WorkerEnd | null = null;
  private lastId = 0;
  /** Highest resident memory seen by the watch. */
  peakRssBytes = 0;

  /** @param script - the worker's own module, TypeScript as everything here. */
  constructor(
    script: URL,
    private readonly limits: WorkerLimits,
  ) {
    this.child = fork(fileURLToPath(script), {
      // Where tsx and its settings are found.
      cwd: ROOT,
      execArgv: ['--import', 'tsx'],
      stdio: ['ignore', 'ignore', 'inherit', 'ipc'],
      // Nothing of ours that is secret is a picture's business.
      env: { PATH: process.env.PATH, NODE_ENV: process.env.NODE_ENV, TMPDIR: process.env.TMPDIR },
    });
    if (this.child.pid !== undefined) lowerPriority(this.child.pid);
    this.child.on('message', (answer: AnswerMessage) => this.handleAnswer(answer));
    this.exited = new Promise((resolve) => {
      const handleExit = (): void => {
        this.end ??= 'crash';
        this.settle()?.reject(new WorkerEndedError(this.end));
        resolve();
      };
      this.child.once('exit', handleExit);
      this.child.once('error', handleExit);
    });
  }

  get pid(): number | undefined {
    return this.child.pid;
  }

  get isAlive(): boolean {
    return this.end === null;
  }

  /** @throws Refusal · WorkerEndedError · Error for a bug inside the worker. */
  async run(task: unknown, onProgress: (progress: number) => void = () => undefined): Promise<unknown> {
    if (this.running) throw new Error('This worker is busy');
    if (!this.isAlive) throw new WorkerEndedError(this.end ?? 'crash');
    const id = (this.lastId += 1);
    const answer = new Promise<unknown>((resolve, reject) => {
      this.running = { resolve, reject, onProgress };
    });
    const timer = setTimeout(() => this.kill('time'), this.limits.timeLimitMs);
    const watch = setInterval(() => void this.watchMemory(), WATCH_MS);
    this.child.send({ id, task }, (error) => {
      if (error) this.kill('crash');
    });
    try {
      return await answer;
    } finally {
      clearTimeout(timer);
      clearInterval(watch);
    }
  }

  async stop(): Promise<void> {
    if (this.isAlive) this.kill('stopped');
    await this.exited;
  }

  private handleAnswer(answer: AnswerMessage): void {
    if (answer.id !== this.lastId) return;
    if (answer.kind === 'progress') this.running?.onProgress(answer.progress);
    else if (answer.kind === 'done') this.settle()?.resolve(answer.result);
    else if (answer.kind === 'refused') this.settle()?.reject(new Refusal(answer.reason, answer.data));
    else this.settle()?.reject(new Error(`Worker failed: ${answer.message}`));
  }

  private settle(): Running | null {
    const { running } = this;
    this.running = null;
    return running;
  }

  private async watchMemory(): Promise<void> {
    const rss = this.child.pid === undefined ? 0 : await residentBytes(this.child.pid);
    this.peakRssBytes = Math.max(this.peakRssBytes, rss);
    if (rss > this.limits.maxRssBytes) this.kill('memory');
  }

  private kill(cause: WorkerEnd): void {
    this.end ??= cause;
    this.child.kill('SIGKILL');
  }
}

function lowerPriority(pid: number): void {
  try {
    setPriority(pid, NICENESS);
  } catch {
    // The child may be gone already, which `exit` reports.
  }
}

/** Resident memory of a process; 0 where the system has no /proc or the process is gone. */
async function residentBytes(pid: number): Promise<number> {
  const status = await readFile(`/proc/${pid}/status`, 'utf8').catch(() => '');
  return Number(/^VmRSS:\s+(\d+) kB/m.exec(status)?.[1] ?? 0) * 1024;
}
