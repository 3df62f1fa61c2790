import { AppError } from '../../shared/errors';
import { WorkerEndedError, WorkerProcess, type WorkerLimits } from './worker-process';

export interface PoolOptions extends WorkerLimits {
  readonly script: URL;
  /** Most processes at once; each does one task at a time. */
  readonly size: number;
  /** Most tasks that wait; one more is refused as `unavailable`. */
  readonly maxWaiting: number;
  /** An idle process is ended after this, to give its memory back. */
  readonly idleMs: number;
}

interface Waiting {
  readonly task: unknown;
  readonly onProgress?: (progress: number) => void;
  readonly resolve: (result: unknown) => void;
  readonly reject: (error: unknown) => void;
  /** A task whose process was ended from outside is tried once more. */
  attemptsLeft: number;
}

/** A bounded queue in front of child processes that start when there is work and are replaced when they end. */
export class WorkerPool<Task, Result> {
  private readonly queue: Waiting[] = [];
  private readonly busy = new Set<WorkerProcess>();
  private readonly idle = new Map<WorkerProcess, NodeJS.Timeout>();
  private isClosed = false;

  constructor(private readonly options: PoolOptions) {}

  /** Processes at work now; for tests and for the health page. */
  get busyPids(): number[] {
    return [...this.busy].flatMap(({ pid }) => (pid === undefined ? [] : [pid]));
  }

  /** @throws Refusal · WorkerEndedError · AppError('unavailable') when too many tasks wait already. */
  run(task: Task, onProgress?: (progress: number) => void): Promise<Result> {
    if (this.isClosed || this.queue.length >= this.options.maxWaiting) {
      return Promise.reject(new AppError('unavailable', { reason: 'busy' }));
    }
    return new Promise<unknown>((resolve, reject) => {
      this.queue.push({ task, onProgress, resolve, reject, attemptsLeft: 2 });
      this.next();
    }) as Promise<Result>;
  }

  async close(): Promise<void> {
    this.isClosed = true;
    for (const { reject } of this.queue.splice(0)) reject(new WorkerEndedError('stopped'));
    for (const timer of this.idle.values()) clearTimeout(timer);
    await Promise.all([...this.busy, ...this.idle.keys()].map((worker) => worker.stop()));
    this.idle.clear();
  }

  private next(): void {
    if (this.busy.size >= this.options.size) return;
    const waiting = this.queue.shift();
    if (!waiting) return;
    const worker = this.takeIdle() ?? new WorkerProcess(this.options.script, this.options);
    this.busy.add(worker);
    void this.give(worker, waiting).finally(() => {
      this.busy.delete(worker);
      if (worker.isAlive && !this.isClosed) this.rest(worker);
      this.next();
    });
  }

  private async give(worker: WorkerProcess, waiting: Waiting): Promise<void> {
    waiting.attemptsLeft -= 1;
    try {
      waiting.resolve(await worker.run(waiting.task, waiting.onProgress));
    } catch (error) {
      const wasCrash = error instanceof WorkerEndedError && error.end === 'crash';
      if (wasCrash && waiting.attemptsLeft > 0 && !this.isClosed) this.queue.unshift(waiting);
      else waiting.reject(error);
    }
  }

  private takeIdle(): WorkerProcess | null {
    for (const [worker, timer] of this.idle) {
      clearTimeout(timer);
      this.idle.delete(worker);
      if (worker.isAlive) return worker;
    }
    return null;
  }

  private rest(worker: WorkerProcess): void {
    const timer = setTimeout(() => {
      this.idle.delete(worker);
      void worker.stop();
    }, this.options.idleMs);
    timer.unref();
    this.idle.set(worker, timer);
  }
}
