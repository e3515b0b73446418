import { isDeepStrictEqual } from 'node:util';
import { Problem } from '@windrow/ventilation/contract/problem';
import type { Route } from '../../apps/server/src/http/route.ts';
import { routes } from '../../apps/server/src/http/routes.ts';

type Answered = { status: number; body: unknown; headers: Headers };

const PATTERNS = routes.map((route) => ({
  route,
  pattern: new RegExp(`^${route.path.replaceAll('.', '\\.').replace(/:\w+/g, '[^/]+')}$`),
}));

/** The route that an address belongs to, if any. */
export function routeOf(method: string, path: string): Route | undefined {
  const bare = path.split('?')[0] ?? path;
  return PATTERNS.find(({ route, pattern }) => route.method === method.toLowerCase() && pattern.test(bare))
    ?.route;
}

/**
 * An answer is what openapi.json says of its route, and nothing besides: a field that is not described
 * has left the server by accident. A refusal is always a problem document.
 */
export function requireAsDescribed(method: string, path: string, { status, body, headers }: Answered): void {
  const says = (words: string) => new Error(`${method} ${path} answered ${status}: ${words}`);
  const type = headers.get('content-type') ?? '';
  if (status >= 400) {
    const problem = Problem.strict().safeParse(body);
    if (!type.startsWith('application/problem+json')) throw says(`as ${type}, not as a problem document`);
    if (!problem.success) throw says(`not a problem document: ${problem.error.message}`);
    if (problem.data.status !== status) throw says(`with ${problem.data.status} in its problem document`);
    return;
  }
  const route = routeOf(method, path);
  if (!route) throw says('but no route has this address');
  if (status !== (route.status ?? 200)) throw says(`but is described with ${route.status ?? 200}`);
  if (route.response === null) {
    if (body !== null) throw says('with a body, but is described without one');
    return;
  }
  const parsed = route.response.safeParse(body);
  if (!parsed.success) throw says(`not as described: ${parsed.error.message}`);
  if (!isDeepStrictEqual(parsed.data, body))
    throw says(`with more than is described: ${JSON.stringify(body)}`);
}
