import { describe, expect, it } from 'vitest';
import { createDataSource } from '#server/data-source';
import { withDatabase } from '../support/database';

/** MariaDB's number for a failed CHECK; the driver's table of names is MySQL's and calls it something else. */
const CHECK_FAILED = 4025;

describe('the tables', () => {
  const database = withDatabase();

  it('are after all migrations what the entities say', async () => {
    const dataSource = await createDataSource(database().rootUrl).initialize();
    const { upQueries } = await dataSource.driver.createSchemaBuilder().log();
    await dataSource.destroy();
    expect(upQueries.map(({ query }) => query)).toEqual([]);
  });

  it('hold what no code may break', async () => {
    const { dataSource } = database();
    const insert = (finestMark: number) =>
      dataSource.query(
        `INSERT INTO studios (id, name, unit, tolerance, finest_mark, hidden, bytes_used, bytes_quota, created_at)
         VALUES (UUID(), 'A', 'in', 0, ?, 0, 0, 1, NOW(3))`,
        [finestMark],
      );
    await expect(insert(0)).rejects.toMatchObject({ driverError: { errno: CHECK_FAILED } });
    await expect(insert(1)).resolves.toMatchObject({ affectedRows: 1 });
  });

  it('give a date back as it was put in, whatever the time zone', async () => {
    const [row] = await database().dataSource.query<{ day: string }[]>("SELECT DATE '2026-12-24' AS day");
    expect(row?.day).toBe('2026-12-24');
  });

  it('go away again when all migrations are taken back', async () => {
    const dataSource = await createDataSource(database().rootUrl).initialize();
    for (const _migration of dataSource.migrations) await dataSource.undoLastMigration();
    const left = await dataSource.query<{ name: string }[]>(
      "SELECT table_name AS name FROM information_schema.tables WHERE table_schema = DATABASE() AND table_name <> 'migrations'",
    );
    await dataSource.runMigrations();
    await dataSource.destroy();
    expect(left).toEqual([]);
  });
});
