import { STATUS_CODES } from 'node:http';
import { z } from 'zod';
import { GRANT_HEADER } from '../../shared/contracts/grants';
import type { ErrorCode } from '../../shared/errors';
import { errorTitle } from '../../shared/words/en/errors';
import { PROBLEM_TYPE, STATUS } from '../middleware/error-handler';
import { SESSION_COOKIE } from '../middleware/sessions';
import type { MultipartBody, Route } from '../routes/define-route';
import { createComponents, type Components, type JsonSchema } from './components';

/** An OpenAPI 3.1 description, made from the very schemas that the routes parse with. */
export function describeApi(routes: readonly Route[]) {
  const components = createComponents();
  const paths: Record<string, Record<string, object>> = {};
  for (const route of routes) {
    const path = `/api${route.path.replace(/:(\w+)/g, '{$1}')}`;
    (paths[path] ??= {})[route.method] = describeRoute(route, components);
  }
  return {
    openapi: '3.1.0',
    info: { title: 'Pairleaf', version: '1', description: 'Plan a two-page album spread from photographs that are already printed.' },
    paths,
    components: {
      schemas: components.schemas(),
      securitySchemes: {
        session: { type: 'apiKey', in: 'cookie', name: SESSION_COOKIE },
        grant: { type: 'apiKey', in: 'header', name: GRANT_HEADER },
      },
    },
  };
}

function describeRoute(route: Route, components: Components): object {
  const access = route.access;
  return {
    operationId: operationId(route),
    summary: route.summary,
    security: access === 'public' ? [] : access === 'signed-in' ? [{ session: [] }] : [{ session: [] }, { grant: [] }],
    ...(access !== 'public' && access !== 'signed-in' && { 'x-permission': access }),
    parameters: [...parameters(route.params, 'path'), ...parameters(route.query, 'query')],
    ...(route.body && { requestBody: { required: true, content: bodyContent(route.body, components) } }),
    responses: { ...success(route, components), ...failures(route, components) },
  };
}

/** `GET /albums/:albumId/spreads` → `getAlbumsAlbumIdSpreads`. */
function operationId({ method, path }: Route): string {
  const words = path.split(/[/:.-]+/).filter((word) => word !== '');
  return method + words.map((word) => word[0]!.toUpperCase() + word.slice(1)).join('');
}

function parameters(schema: z.ZodType | undefined, where: 'path' | 'query'): object[] {
  if (!(schema instanceof z.ZodObject)) return [];
  const json = z.toJSONSchema(schema, { io: 'output', unrepresentable: 'any' }) as { properties?: Record<string, JsonSchema> };
  return Object.entries(json.properties ?? {}).map(([name, property]) => ({
    name,
    in: where,
    required: where === 'path' || !(schema.shape[name] as z.ZodType).safeParse(undefined).success,
    schema: property,
  }));
}

function bodyContent(body: z.ZodType | MultipartBody, components: Components): object {
  if (!('multipart' in body)) return { 'application/json': { schema: components.input(body) } };
  const fields = z.toJSONSchema(body.multipart, { io: 'input', unrepresentable: 'any' }) as JsonSchema & { properties?: object };
  const files = Object.fromEntries(body.files.map((name) => [name, { type: 'string', format: 'binary' }]));
  return {
    'multipart/form-data': {
      schema: { type: 'object', properties: { ...fields.properties, ...files }, required: body.files, additionalProperties: false },
    },
  };
}

function success({ answer }: Route, components: Components): object {
  const description = STATUS_CODES[answer.status] ?? '';
  if ('streams' in answer) {
    const binary = { schema: { type: 'string', format: 'binary' } };
    return { [answer.status]: { description, content: Object.fromEntries(answer.streams.map((type) => [type, binary])) } };
  }
  if (!('schema' in answer)) return { [answer.status]: { description } };
  return { [answer.status]: { description, content: { 'application/json': { schema: components.output(answer.schema) } } } };
}

/** The codes that a route can give, by status: its own, and those that follow from what it takes. */
function failures(route: Route, components: Components): object {
  const isGuarded = route.access !== 'public' && route.access !== 'signed-in';
  const codes = new Set<ErrorCode>([
    ...(route.params || route.query || route.body ? (['invalid-input'] as const) : []),
    ...(route.body && !('multipart' in route.body) ? (['too-large'] as const) : []),
    ...(route.access === 'public' ? [] : (['unauthenticated'] as const)),
    ...(isGuarded ? (['forbidden', 'not-found'] as const) : []),
    ...(route.method === 'get' ? [] : (['cross-site'] as const)),
    ...(route.errors ?? []),
    'bug',
    'unavailable',
  ]);
  const byStatus = new Map<number, ErrorCode[]>();
  for (const code of codes) byStatus.set(STATUS[code], [...(byStatus.get(STATUS[code]) ?? []), code]);
  return Object.fromEntries(
    [...byStatus].map(([status, list]) => [
      status,
      {
        description: list.map((code) => `${code}: ${errorTitle(code)}`).join('; '),
        content: { [PROBLEM_TYPE]: { schema: components.problem() } },
      },
    ]),
  );
}
