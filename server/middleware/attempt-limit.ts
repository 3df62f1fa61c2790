import { createHash } from 'node:crypto';
import type { Request, RequestHandler } from 'express';
import { ipKeyGenerator, rateLimit, type ClientRateLimitInfo, type Store } from 'express-rate-limit';
import { LessThan, type DataSource } from 'typeorm';
import { AppError } from '../../shared/errors';
import { RateLimitEntity } from '../entities/rate-limit-entity';

interface LimitDeps {
  readonly dataSource: DataSource;
  readonly now: () => Date;
}

interface LimitOptions {
  /** Names the counter; requests under the same name and key are counted together. */
  readonly name: string;
  readonly max: number;
  readonly windowMs: number;
  readonly keyOf: (req: Request) => string;
  /** Count only what did not succeed. */
  readonly onlyFailures: boolean;
}

/** An address as it is counted: IPv6 by its /56, which is what one household gets. */
export const addressOf = (req: Request): string => ipKeyGenerator(req.ip ?? 'unknown');

/** Refuses with `too-many-requests` and Retry-After once a key has used its attempts within the window. */
export function attemptLimit(deps: LimitDeps, { name, max, windowMs, keyOf, onlyFailures }: LimitOptions): RequestHandler {
  return rateLimit({
    windowMs,
    limit: max,
    keyGenerator: keyOf,
    skipSuccessfulRequests: onlyFailures,
    store: new DatabaseStore(deps, name, windowMs),
    standardHeaders: 'draft-8',
    legacyHeaders: false,
    // Both counters of one sign-in use their own key; the proxy settings are checked by `trust proxy` itself.
    validate: false,
    handler: (_req, _res, next) => next(new AppError('too-many-requests')),
  });
}

/** Counts in MariaDB, each attempt in one statement, so that processes and parallel requests share one count. */
class DatabaseStore implements Store {
  readonly localKeys = false;

  constructor(
    private readonly deps: LimitDeps,
    private readonly name: string,
    private readonly windowMs: number,
  ) {}

  async increment(key: string): Promise<ClientRateLimitInfo> {
    const { dataSource, now } = this.deps;
    const at = now();
    const resetsAt = new Date(at.getTime() + this.windowMs);
    // Assignments run from left to right: `hits` still sees the old end of the window.
    const rows: { hits: number; resets_at: Date }[] = await dataSource.query(
      `INSERT INTO rate_limits (id, hits, resets_at) VALUES (?, 1, ?)
       ON DUPLICATE KEY UPDATE hits = IF(resets_at <= ?, 1, hits + 1), resets_at = IF(resets_at <= ?, VALUES(resets_at), resets_at)
       RETURNING hits, resets_at`,
      [this.idOf(key), resetsAt, at, at],
    );
    const [row] = rows;
    return { totalHits: row?.hits ?? 1, resetTime: row?.resets_at ?? resetsAt };
  }

  async decrement(key: string): Promise<void> {
    await this.deps.dataSource.query('UPDATE rate_limits SET hits = hits - 1 WHERE id = ? AND hits > 0', [this.idOf(key)]);
  }

  async resetKey(key: string): Promise<void> {
    await this.deps.dataSource.manager.delete(RateLimitEntity, { id: this.idOf(key) });
  }

  private idOf(key: string): string {
    return `${this.name}:${createHash('sha256').update(key).digest('hex')}`;
  }
}

/** Removes counters whose window is over. */
export async function pruneLimits({ dataSource, now }: LimitDeps): Promise<void> {
  await dataSource.manager.delete(RateLimitEntity, { resetsAt: LessThan(now()) });
}
