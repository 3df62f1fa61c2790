import { describe, expect, it } from 'vitest';
import { RateLimitEntity } from '#server/entities/rate-limit-entity';
import { TEST_PASSWORD, withApp } from '../../support/app';

const WRONG = 'surely not this one';

describe('attempts to sign in', () => {
  const app = withApp({ limits: { signInPerAccount: 3, signInPerAddress: 8, rateWindowMs: 60_000 }, trustedProxies: ['loopback'] });
  const from = (address: string, email: string, password: string) =>
    app().stranger().post('/api/session').set('X-Forwarded-For', address).send({ email, password });

  it('are counted per account, from wherever they come, and told when to try again', async () => {
    const { email } = await app().signUp();
    for (const n of [1, 2, 3]) await from(`192.0.2.${n}`, email, WRONG).expect(401);
    const refused = await from('192.0.2.4', email, TEST_PASSWORD).expect(429);
    expect(refused.body).toMatchObject({ code: 'too-many-requests', status: 429 });
    expect(Number(refused.headers['retry-after'])).toBeGreaterThan(0);
    expect(Number(refused.headers['retry-after'])).toBeLessThanOrEqual(60);
  });

  it('are counted per address, whatever the account', async () => {
    for (let n = 0; n < 8; n += 1) await from('198.51.100.7', `nobody-${n}@example.org`, WRONG).expect(401);
    await from('198.51.100.7', 'nobody-9@example.org', WRONG).expect(429);
    await from('198.51.100.8', 'nobody-10@example.org', WRONG).expect(401);
  });

  it('that succeed are not counted', async () => {
    const { email } = await app().signUp();
    for (let n = 0; n < 5; n += 1) await from('203.0.113.5', email, TEST_PASSWORD).expect(200);
  });

  it('are counted exactly when they come at once', async () => {
    const { email } = await app().signUp();
    const answers = await Promise.all(Array.from({ length: 8 }, (_, n) => from(`203.0.113.${100 + n}`, email, WRONG)));
    expect(answers.filter(({ status }) => status === 401)).toHaveLength(3);
    expect(answers.filter(({ status }) => status === 429)).toHaveLength(5);
  });

  it('may go on once the window is over', async () => {
    const { email } = await app().signUp();
    for (let n = 0; n < 4; n += 1) await from(`203.0.113.${200 + n}`, email, WRONG);
    await app().deps.dataSource.query('UPDATE rate_limits SET resets_at = ?', [new Date(Date.now() - 1)]);
    await from('203.0.113.210', email, TEST_PASSWORD).expect(200);
  });

  it('leave no address and no e-mail in the database', async () => {
    const { email } = await app().signUp();
    await from('203.0.113.250', email, WRONG).expect(401);
    const rows = JSON.stringify(await app().deps.dataSource.manager.find(RateLimitEntity));
    expect(rows).toContain('sign-in-account:');
    expect(rows).not.toContain(email);
    expect(rows).not.toContain('203.0.113');
  });
});

describe('sign-ups from one address', () => {
  const app = withApp({ limits: { signUpPerAddress: 2 } });

  it('are limited', async () => {
    await app().signUp();
    await app().signUp();
    await expect(app().signUp()).rejects.toThrow(/429/);
  });
});
