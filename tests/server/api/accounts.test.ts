import { randomUUID } from 'node:crypto';
import { describe, expect, it } from 'vitest';
import { SessionEntity } from '#server/entities/session-entity';
import { UserEntity } from '#server/entities/user-entity';
import { PASSWORD_MAX } from '#shared/contracts/accounts';
import { TEST_PASSWORD, withApp } from '../../support/app';

const cookieOf = (headers: Record<string, unknown>): string => String(([] as unknown[]).concat(headers['set-cookie'] ?? [])[0] ?? '');
const sessionIdOf = (headers: Record<string, unknown>): string => cookieOf(headers).split(';')[0] ?? '';
const newSignUp = () => ({ email: `${randomUUID()}@example.org`, password: TEST_PASSWORD, name: 'Ada Pell', studioName: 'Pell' });

describe('accounts', () => {
  const app = withApp({ trustedProxies: ['loopback'] });

  it('makes an account, a studio and its ownership, and signs in', async () => {
    const agent = app().stranger();
    const input = newSignUp();
    const answer = await agent.post('/api/accounts').send({ ...input, email: ` ${input.email.toUpperCase()} ` }).expect(201);
    expect(answer.body).toMatchObject({ user: { email: input.email, name: 'Ada Pell' }, studios: [{ name: 'Pell', role: 'owner', unit: 'in' }] });
    await agent.get('/api/session').expect(200).expect(({ body }) => expect(body.user.email).toBe(input.email));
  });

  it('refuses a second account for an address and keeps the first', async () => {
    const input = newSignUp();
    await app().stranger().post('/api/accounts').send(input).expect(201);
    const answer = await app().stranger().post('/api/accounts').send({ ...input, password: 'another long password' }).expect(409);
    expect(answer.body).toMatchObject({ code: 'already-exists', detail: expect.stringContaining('sign in') });
    await app().stranger().post('/api/session').send({ email: input.email, password: TEST_PASSWORD }).expect(200);
  });

  it('names every field that does not fit', async () => {
    const answer = await app().stranger().post('/api/accounts').send({ email: 'x', password: 'short', name: ' ', nickname: 'A' }).expect(400);
    expect(answer.type).toBe('application/problem+json');
    const paths = (answer.body.fields as { path: string }[]).map(({ path }) => path).sort();
    expect(paths).toEqual(['email', 'name', 'nickname', 'password', 'studioName']);
    for (const path of paths) expect(answer.body.detail).toContain(path);
  });

  it('answers a body that is no JSON, or too much of it, with one clear problem', async () => {
    const send = (body: string) => app().stranger().post('/api/session').set('Content-Type', 'application/json').send(body);
    await send('{"email":').expect(400).expect(({ body }) => expect(body.code).toBe('invalid-input'));
    await send(JSON.stringify({ email: 'x'.repeat(100_000) })).expect(413).expect(({ body }) => expect(body.code).toBe('too-large'));
  });

  it('stores neither the password nor the session id', async () => {
    const person = await app().signUp();
    const { dataSource } = app().deps;
    const user = await dataSource.manager.findOneByOrFail(UserEntity, { id: person.userId });
    expect(user.passwordHash).toMatch(/^\$argon2id\$v=19\$m=19456,t=2,p=1\$/);
    const signedIn = await person.agent.post('/api/session').send({ email: person.email, password: TEST_PASSWORD }).expect(200);
    const plainId = decodeURIComponent(sessionIdOf(signedIn.headers).split('=')[1] ?? '').slice(2).split('.')[0] ?? '';
    expect(plainId.length).toBeGreaterThan(20);
    const rows = await dataSource.manager.findBy(SessionEntity, { userId: person.userId });
    expect(rows).toHaveLength(1);
    expect(JSON.stringify(rows)).not.toContain(plainId);
  });

  it('sets a cookie that scripts cannot read and other sites cannot send, Secure behind TLS', async () => {
    const { email } = await app().signUp();
    const signIn = (headers: Record<string, string>) => app().stranger().post('/api/session').set(headers).send({ email, password: TEST_PASSWORD }).expect(200);
    const plain = cookieOf((await signIn({})).headers);
    expect(plain).toMatch(/; HttpOnly/);
    expect(plain).toMatch(/; SameSite=Lax/);
    expect(plain).not.toMatch(/; Secure/);
    expect(cookieOf((await signIn({ 'X-Forwarded-Proto': 'https' })).headers)).toMatch(/; Secure/);
  });

  it('gives a new session id at sign-in, and the old one is worth nothing', async () => {
    const person = await app().signUp();
    const first = await person.agent.post('/api/session').send({ email: person.email, password: TEST_PASSWORD }).expect(200);
    const second = await person.agent.post('/api/session').send({ email: person.email, password: TEST_PASSWORD }).expect(200);
    const [before, after] = [sessionIdOf(first.headers), sessionIdOf(second.headers)];
    expect(after).not.toBe(before);
    await app().stranger().get('/api/session').set('Cookie', before).expect(401);
    await app().stranger().get('/api/session').set('Cookie', after).expect(200);
  });

  it('takes no session id that the server did not make', async () => {
    const planted = 'pairleaf.session=s%3Aplanted.planted';
    const { email } = await app().signUp();
    const answer = await app().stranger().post('/api/session').set('Cookie', planted).send({ email, password: TEST_PASSWORD }).expect(200);
    expect(sessionIdOf(answer.headers)).not.toContain('planted');
  });

  it('signs out for good', async () => {
    const { agent, email } = await app().signUp();
    const cookie = sessionIdOf((await agent.post('/api/session').send({ email, password: TEST_PASSWORD })).headers);
    await agent.delete('/api/session').expect(204);
    await agent.get('/api/session').expect(401).expect(({ body }) => expect(body.code).toBe('unauthenticated'));
    await app().stranger().get('/api/session').set('Cookie', cookie).expect(401);
  });

  it('tells a wrong password and an unknown address alike', async () => {
    const { email } = await app().signUp();
    const wrong = await app().stranger().post('/api/session').send({ email, password: 'not the password' }).expect(401);
    const unknown = await app().stranger().post('/api/session').send({ email: 'nobody@example.org', password: 'not the password' }).expect(401);
    expect(wrong.body).toEqual(unknown.body);
  });

  it('refuses a password over the limit before it is hashed', async () => {
    const password = 'p'.repeat(PASSWORD_MAX + 1);
    await app().stranger().post('/api/session').send({ email: 'nobody@example.org', password }).expect(400);
    await app().stranger().post('/api/accounts').send({ ...newSignUp(), password: 'p'.repeat(PASSWORD_MAX) }).expect(201);
  });

  it('drops sessions whose time is over', async () => {
    const { agent, userId } = await app().signUp();
    const { dataSource, sessionStore } = app().deps;
    await dataSource.manager.update(SessionEntity, { userId }, { expiresAt: new Date(Date.now() - 1) });
    await agent.get('/api/session').expect(401);
    expect(await sessionStore.prune()).toBeGreaterThan(0);
    expect(await dataSource.manager.countBy(SessionEntity, { userId })).toBe(0);
  });
});
