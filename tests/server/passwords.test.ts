import { describe, expect, it } from 'vitest';
import { hashPassword, verifyPassword } from '#server/services/passwords';
import { PASSWORD_MAX } from '#shared/contracts/accounts';

const timeOf = async (work: () => Promise<unknown>): Promise<number> => {
  const times: number[] = [];
  for (let n = 0; n < 5; n += 1) {
    const start = performance.now();
    await work();
    times.push(performance.now() - start);
  }
  return times.sort((a, b) => a - b)[2]!;
};

describe('passwords', () => {
  it('are salted: the same one twice gives two hashes, and both fit', async () => {
    const [first, second] = [await hashPassword('bone folder'), await hashPassword('bone folder')];
    expect(first).not.toBe(second);
    expect(await verifyPassword(first, 'bone folder')).toBe(true);
    expect(await verifyPassword(second, 'bone foldeR')).toBe(false);
  });

  it('take as long for an account that is not there', async () => {
    const hash = await hashPassword('bone folder');
    await verifyPassword(null, 'warm up');
    const there = await timeOf(() => verifyPassword(hash, 'wrong'));
    const missing = await timeOf(() => verifyPassword(null, 'wrong'));
    expect(missing / there).toBeGreaterThan(0.4);
    expect(await verifyPassword(null, 'no account has this password')).toBe(false);
  });

  it('over the limit are not hashed at all', async () => {
    const hash = await hashPassword('x');
    const atLimit = await timeOf(() => verifyPassword(hash, 'x'.repeat(PASSWORD_MAX)));
    const over = await timeOf(() => verifyPassword(hash, 'x'.repeat(PASSWORD_MAX + 1)));
    expect(over).toBeLessThan(atLimit / 4);
  });
});
