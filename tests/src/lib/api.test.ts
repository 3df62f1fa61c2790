import { describe, expect, it, vi } from 'vitest';
import { z } from 'zod';
import { api, type ApiError } from '@/lib/api';
import { fakeApi, problem } from '../../support/fake-api';

const schema = z.object({ name: z.string() });
const failureOf = (promise: Promise<unknown>): Promise<ApiError> => promise.then(() => expect.fail('it succeeded'), (error: ApiError) => error);

describe('the api client', () => {
  it('sends JSON and gives back what the schema accepts', async () => {
    const calls = fakeApi({ 'POST /piles': [201, { name: 'The line', extra: 1 }] });
    expect(await api.post('/piles', schema, { name: 'The line' })).toEqual({ name: 'The line' });
    expect(calls[0]).toEqual({ method: 'POST', path: '/piles', body: { name: 'The line' } });
  });

  it('throws the code, sentence, data and fields of a problem', async () => {
    fakeApi({ 'GET /piles': problem('stale-revision', 409, 'Changed meanwhile.', { data: { revision: 8 }, fields: [{ path: 'name', message: 'too long' }] }) });
    expect(await failureOf(api.get('/piles', schema))).toMatchObject({
      code: 'stale-revision',
      status: 409,
      detail: 'Changed meanwhile.',
      data: { revision: 8 },
      fields: [{ path: 'name', message: 'too long' }],
    });
  });

  it('calls a server that does not answer unavailable', async () => {
    vi.stubGlobal('fetch', () => Promise.reject(new TypeError('Failed to fetch')));
    expect(await failureOf(api.get('/piles', schema))).toMatchObject({ code: 'unavailable', status: 0 });
  });

  it('takes a proxy’s own page for an absent server', async () => {
    vi.stubGlobal('fetch', () => Promise.resolve(new Response('<html>Bad gateway</html>', { status: 502 })));
    expect(await failureOf(api.get('/piles', schema))).toMatchObject({ code: 'unavailable', status: 502 });
  });

  it('calls an answer that does not fit its schema a bug', async () => {
    fakeApi({ 'GET /piles': [200, { title: 'The line' }] });
    expect(await failureOf(api.get('/piles', schema))).toMatchObject({ code: 'bug', status: 200 });
  });

  it('lets an answer without content through where none is awaited', async () => {
    fakeApi({ 'DELETE /piles/1': [204] });
    expect(await api.delete('/piles/1')).toBeUndefined();
  });
});
