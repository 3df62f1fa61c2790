import { describe, expect, it } from 'vitest';
import { z } from 'zod';
import { createRoutes } from '#server/routes/table';
import { STATUS } from '#server/middleware/error-handler';
import { beginSpread, withApp } from '../../support/app';

interface Operation {
  readonly operationId: string;
  readonly parameters: readonly { readonly name: string; readonly in: string; readonly required: boolean }[];
  readonly requestBody?: { readonly content: Record<string, { readonly schema: object }> };
  readonly responses: Record<string, { readonly content?: Record<string, { readonly schema: object }> }>;
  readonly security: readonly object[];
  readonly 'x-permission'?: string;
}

interface Description {
  readonly openapi: string;
  readonly paths: Record<string, Record<string, Operation>>;
  readonly components: { readonly schemas: Record<string, object> };
}

describe('the description of the API', () => {
  const app = withApp();
  const load = async (): Promise<Description> => (await app().stranger().get('/api/openapi.json').expect(200)).body as Description;

  it('has every route of the table, with its permission, its parameters and its failures', async () => {
    const { paths, openapi } = await load();
    expect(openapi).toBe('3.1.0');
    const routes = createRoutes(app().deps);
    const described = Object.entries(paths).flatMap(([path, byMethod]) => Object.keys(byMethod).map((method) => `${method} ${path}`));
    expect(described.sort()).toEqual(routes.map(({ method, path }) => `${method} /api${path.replace(/:(\w+)/g, '{$1}')}`).sort());
    for (const route of routes) {
      const operation = paths[`/api${route.path.replace(/:(\w+)/g, '{$1}')}`]![route.method]!;
      const inPath = operation.parameters.filter((parameter) => parameter.in === 'path').map(({ name }) => name);
      expect(inPath, route.path).toEqual([...route.path.matchAll(/:(\w+)/g)].map(([, name]) => name));
      expect(operation['x-permission'], route.path).toBe(route.access === 'public' || route.access === 'signed-in' ? undefined : route.access);
      expect(Object.keys(operation.responses), route.path).toContain(String(route.answer.status));
      for (const code of [...(route.errors ?? []), 'unavailable' as const]) expect(Object.keys(operation.responses), `${route.path} ${code}`).toContain(String(STATUS[code]));
    }
  });

  it('has one name for each operation and an end for each reference', async () => {
    const description = await load();
    const ids = Object.values(description.paths).flatMap((byMethod) => Object.values(byMethod).map(({ operationId }) => operationId));
    expect(new Set(ids).size).toBe(ids.length);
    const references = [...JSON.stringify(description).matchAll(/"\$ref":"([^"]+)"/g)].map(([, reference]) => reference!);
    expect(references.length).toBeGreaterThan(20);
    for (const reference of references) {
      expect(reference).toMatch(/^#\/components\/schemas\//);
      expect(description.components.schemas, reference).toHaveProperty([reference.split('/').at(-1)!]);
    }
  });

  it('agrees with what the routes take and give', async () => {
    const description = await load();
    /** The description's own schemas, read back as a validator: a second reading beside the Zod schemas that the routes use. */
    const validator = (schema: object): z.ZodType => z.fromJSONSchema({ ...inline(schema, description), $schema: 'https://json-schema.org/draft/2020-12/schema' });
    const operation = (method: string, path: string) => description.paths[path]![method]!;
    const body = (method: string, path: string) => validator(operation(method, path).requestBody!.content['application/json']!.schema);
    const answer = (path: string, status = '200') => validator(operation('get', path).responses[status]!.content!['application/json']!.schema);

    const good = { id: '3f1f5c0a-9d1c-4b0e-8f37-1b1f8a7e2f10', title: 'Winter', formatId: 'a4' };
    const album = body('post', '/api/studios/{studioId}/albums');
    expect(album.safeParse(good).success).toBe(true);
    expect(album.safeParse({ ...good, formatId: 4 }).success).toBe(false);
    expect(album.safeParse({ id: good.id, title: 'x' }).success).toBe(false);

    const owner = await app().signUp();
    await owner.agent.post(`/api/studios/${owner.studioId}/albums`).send(good).expect(201);
    const spread = await beginSpread(owner);
    const real = (await owner.agent.get(`/api/spreads/${spread.id}`)).body;
    expect(answer('/api/spreads/{spreadId}').safeParse(real).error).toBeUndefined();
    expect(answer('/api/spreads/{spreadId}').safeParse({ ...real, revision: 'one' }).success).toBe(false);
    const session = (await owner.agent.get('/api/session')).body;
    expect(answer('/api/session').safeParse(session).error).toBeUndefined();
    const problem = (await app().stranger().get('/api/session').expect(401)).body;
    const problemSchema = validator(operation('get', '/api/session').responses['401']!.content!['application/problem+json']!.schema);
    expect(problemSchema.safeParse(problem).error).toBeUndefined();
  });
});

/** References written out; the description has none that lead back to themselves. */
function inline(schema: unknown, description: Description): Record<string, unknown> {
  const walk = (value: unknown): unknown => {
    if (Array.isArray(value)) return value.map(walk);
    if (typeof value !== 'object' || value === null) return value;
    if ('$ref' in value && typeof value.$ref === 'string') return walk(description.components.schemas[value.$ref.split('/').at(-1)!]);
    return Object.fromEntries(Object.entries(value).map(([key, inner]) => [key, walk(inner)]));
  };
  return walk(schema) as Record<string, unknown>;
}
