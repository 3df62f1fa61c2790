import { createHash } from 'node:crypto';
import { Store, type SessionData } from 'express-session';
import { LessThan, MoreThan, type DataSource } from 'typeorm';
import { SessionEntity } from '../entities/session-entity';

/** A session's end is moved in the database at most this often, so that reading does not mean writing. */
const TOUCH_EVERY_MS = 60 * 60_000;

interface StoreDeps {
  readonly dataSource: DataSource;
  readonly now: () => Date;
  readonly maxAgeMs: number;
}

const hashOf = (sessionId: string): string => createHash('sha256').update(sessionId).digest('hex');

/** Sessions in MariaDB, so that every process of the server knows them. */
export class SessionStore extends Store {
  constructor(private readonly deps: StoreDeps) {
    super();
  }

  override get(sessionId: string, done: (error: unknown, session?: SessionData | null) => void): void {
    const { dataSource, now } = this.deps;
    dataSource.manager
      .findOneBy(SessionEntity, { id: hashOf(sessionId), expiresAt: MoreThan(now()) })
      .then((row) => done(null, row?.data ?? null))
      .catch((error: unknown) => done(error));
  }

  override set(sessionId: string, session: SessionData, done: (error?: unknown) => void = () => undefined): void {
    const row = { id: hashOf(sessionId), userId: session.passport?.user ?? null, data: session as object, expiresAt: this.end() };
    this.deps.dataSource.manager
      .upsert(SessionEntity, row, ['id'])
      .then(() => done())
      .catch(done);
  }

  override touch(sessionId: string, _session: SessionData, done: () => void = () => undefined): void {
    const expiresAt = this.end();
    const isDue = LessThan(new Date(expiresAt.getTime() - TOUCH_EVERY_MS));
    this.deps.dataSource.manager
      .update(SessionEntity, { id: hashOf(sessionId), expiresAt: isDue }, { expiresAt })
      .then(() => done())
      // A session that was not prolonged ends earlier; nothing else is lost.
      .catch(() => done());
  }

  override destroy(sessionId: string, done: (error?: unknown) => void = () => undefined): void {
    this.deps.dataSource.manager
      .delete(SessionEntity, { id: hashOf(sessionId) })
      .then(() => done())
      .catch(done);
  }

  /** Removes what has ended. @returns how many. */
  async prune(): Promise<number> {
    const { affected } = await this.deps.dataSource.manager.delete(SessionEntity, { expiresAt: LessThan(this.deps.now()) });
    return affected ?? 0;
  }

  private end(): Date {
    return new Date(this.deps.now().getTime() + this.deps.maxAgeMs);
  }
}
