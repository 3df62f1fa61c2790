import { vi } from 'vitest';

/** What one route of the fake answers: a status and a JSON body. */
export type FakeAnswer = readonly [status: number, body?: unknown];

export interface FakeCall {
  readonly method: string;
  readonly path: string;
  readonly body: unknown;
}

/** A problem document as the server sends it. */
export const problem = (code: string, status: number, detail: string, more: object = {}): FakeAnswer => [
  status,
  { type: 'about:blank', title: code, status, detail, code, ...more },
];

/**
 * Puts a small fake in the place of `fetch`. Routes are written `GET /prints/:printId`, without `/api`.
 * A request to any other fails the test.
 *
 * @returns every call that was made, in order.
 */
export function fakeApi(routes: Readonly<Record<string, FakeAnswer | ((call: FakeCall) => FakeAnswer)>>): FakeCall[] {
  const calls: FakeCall[] = [];
  vi.stubGlobal('fetch', async (url: string, init: RequestInit = {}) => {
    const path = url.replace(/^\/api/, '').replace(/\?.*/, '');
    const call = { method: init.method ?? 'GET', path, body: typeof init.body === 'string' ? JSON.parse(init.body) : undefined };
    calls.push(call);
    const key = Object.keys(routes).find((route) => matches(route, call));
    if (key === undefined) throw new Error(`the fake knows no ${call.method} ${path}`);
    const route = routes[key]!;
    const [status, body] = typeof route === 'function' ? route(call) : route;
    return new Response(body === undefined ? null : JSON.stringify(body), { status });
  });
  return calls;
}

function matches(route: string, { method, path }: FakeCall): boolean {
  const [routeMethod, routePath] = route.split(' ') as [string, string];
  return method === routeMethod && new RegExp(`^${routePath.replace(/:\w+/g, '[^/]+')}$`).test(path);
}
