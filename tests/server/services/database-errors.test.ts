import { randomUUID } from 'node:crypto';
import { QueryFailedError, type DataSource, type QueryRunner } from 'typeorm';
import { describe, expect, it } from 'vitest';
import { createDataSource } from '#server/data-source';
import { asMachineFailure } from '#server/services/database-errors';
import { findFreePort } from '#server/setup/mariadb/ports';
import { withDatabase } from '../../support/database';

const codeOf = (error: unknown): string | undefined => asMachineFailure(error)?.code;
const failed = (code: string): QueryFailedError => new QueryFailedError('SELECT 1', [], Object.assign(new Error(code), { code }));

describe('a failure of the machine', () => {
  const database = withDatabase();

  it('is a database that does not answer', async () => {
    const nobody = createDataSource(`mariadb://pairleaf:x@127.0.0.1:${await findFreePort()}/pairleaf`);
    expect(codeOf(await nobody.initialize().catch((error: unknown) => error))).toBe('unavailable');
  });

  it('is a database that goes away in the middle of a statement', async () => {
    const { dataSource } = database();
    const runner = dataSource.createQueryRunner();
    const [{ id }] = (await runner.query('SELECT CONNECTION_ID() AS id')) as [{ id: number }];
    const waiting = runner.query('SELECT SLEEP(20)').catch((error: unknown) => error);
    await dataSource.query(`KILL CONNECTION ${id}`);
    expect(codeOf(await waiting)).toBe('unavailable');
    await runner.release();
  });

  it('is two transactions that wait for each other', async () => {
    const { dataSource } = database();
    const names = [randomUUID(), randomUUID()];
    for (const id of names) await dataSource.query('INSERT INTO rate_limits (id, hits, resets_at) VALUES (?, 1, NOW())', [id]);
    const hit = (runner: QueryRunner, id: string | undefined): Promise<unknown> => runner.query('UPDATE rate_limits SET hits = hits + 1 WHERE id = ?', [id]);
    const runners = await Promise.all([begun(dataSource), begun(dataSource)]);
    await Promise.all(runners.map((runner, i) => hit(runner, names[i])));
    const crossed = await Promise.all(runners.map((runner, i) => hit(runner, names[1 - i]).catch((error: unknown) => error)));
    expect(crossed.map(codeOf).filter((code) => code !== undefined)).toEqual(['unavailable']);
    for (const runner of runners) {
      if (runner.isTransactionActive) await runner.rollbackTransaction();
      await runner.release();
    }
  });

  it.each([
    ['ER_DISK_FULL', 'disk-full'],
    ['ER_RECORD_FILE_FULL', 'disk-full'],
    ['ER_CON_COUNT_ERROR', 'unavailable'],
    ['ER_DUP_ENTRY', undefined],
    ['ER_PARSE_ERROR', undefined],
  ])('%s is told as %s', (code, told) => {
    expect(codeOf(failed(code))).toBe(told);
  });

  it('is a disk that is full', () => {
    expect(codeOf(Object.assign(new Error('write'), { code: 'ENOSPC' }))).toBe('disk-full');
  });

  it.each([[new Error('unexpected')], [new TypeError('x is not a function')], [null], ['ECONNREFUSED']])('is not %s', (error) => {
    expect(asMachineFailure(error)).toBeNull();
  });
});

async function begun(dataSource: DataSource): Promise<QueryRunner> {
  const runner = dataSource.createQueryRunner();
  await runner.startTransaction();
  return runner;
}
