import { describe, expect, it } from 'vitest';
import { createTestDatabase, withDatabase } from '../support/database';

describe('the database of a test file', () => {
  const database = withDatabase();

  it('is migrated, and empty of people', async () => {
    expect(await database().dataSource.query('SELECT COUNT(*) AS n FROM users')).toEqual([{ n: '0' }]);
  });

  it('lets the app write rows but not change tables', async () => {
    await expect(database().dataSource.query('DROP TABLE users')).rejects.toThrow(/denied/);
  });

  it('is nobody else’s', async () => {
    const other = await createTestDatabase();
    await expect(database().dataSource.query(`SELECT 1 FROM ${other.dataSource.driver.database}.users`)).rejects.toThrow(/denied/);
    await other.drop();
  });
});
