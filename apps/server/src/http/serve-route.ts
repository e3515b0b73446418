import { may, mayAnywhere } from '@windrow/ventilation/permissions/permissions';
import type { Request, RequestHandler } from 'express';
import { z } from 'zod';
import type { Deps } from '../deps.ts';
import { invalid, notAllowed, notSignedIn, versionNeeded } from '../errors.ts';
import { insertAudit } from '../queries/audit.ts';
import { fieldErrors } from '../services/field-errors.ts';
import type { SignedIn } from '../services/sign-ins.ts';
import { writeOnce } from '../services/write.ts';
import type { Route } from './route.ts';

const Key = z.uuid();

/** Parse → who asks → may they → do it → answer. The same column for every route, so that none can leave a step out. */
export function serveRoute(deps: Deps, route: Route): RequestHandler {
  return async (req, res) => {
    const { person, cookie } = await deps.signIns.whoIs(req.headers.cookie);
    if (cookie) res.appendHeader('Set-Cookie', cookie);
    if (route.needs !== 'nobody' && !person) throw notSignedIn();
    // The schemas decide what it is; the handler's own types say so again.
    const input = parseInput(route, req) as never;
    if (person) await requireMay(deps, route, person, input);

    if (route.kind === 'session') {
      const body = await route.handle({ deps, person, input, req, res });
      if (body === undefined) res.status(route.status ?? 204).end();
      else res.status(route.status ?? 200).json(body);
      return;
    }
    if (!person) throw notSignedIn();
    if (route.kind === 'read') {
      res.status(route.status ?? 200).json(await route.handle({ deps, person, input }));
      return;
    }
    const version = route.versioned ? readVersion(req) : 0;
    const answer = await writeOnce(
      deps,
      { person, key: readKey(req), fingerprint: fingerprintOf(req) },
      async (write) => ({
        status: route.status ?? 200,
        body: await route.handle({ deps, write, input, version }),
      }),
    );
    res.status(answer.status).json(answer.body);
  };
}

function parseInput(route: Route, req: Request): object {
  return {
    params: route.params ? parse(route.params, req.params, '') : undefined,
    query: route.query ? parse(route.query, req.query, '') : undefined,
    body: route.body ? parse(route.body, req.body ?? {}, '') : undefined,
  };
}

function parse(schema: z.ZodType, value: unknown, under: string): unknown {
  const parsed = schema.safeParse(value);
  if (!parsed.success) throw invalid(fieldErrors(parsed.error, under));
  return parsed.data;
}

async function requireMay(deps: Deps, route: Route, person: SignedIn, input: never): Promise<void> {
  const { needs } = route;
  if (needs === 'nobody' || needs === 'anybody-signed-in') return;
  if (needs.in === 'any') {
    if (!mayAnywhere(person.grants, needs.act)) throw await refused(deps, route, person, null);
    return;
  }
  // Whoever may do it nowhere is not told which things exist.
  if (!mayAnywhere(person.grants, needs.act)) throw await refused(deps, route, person, null);
  const unitId = await needs.in(deps, input);
  if (!may(person.grants, needs.act, unitId)) throw await refused(deps, route, person, unitId);
}

async function refused(deps: Deps, route: Route, person: SignedIn, unitId: string | null): Promise<Error> {
  await insertAudit(deps.db, {
    at: deps.now().toISOString(),
    person_id: person.personId,
    act: `${route.method.toUpperCase()} ${route.path}`,
    unit_id: unitId,
    subject: null,
    outcome: 'refused',
  });
  return notAllowed();
}

function readKey(req: Request): string {
  const key = Key.safeParse(req.get('Idempotency-Key'));
  if (!key.success) {
    throw invalid([
      {
        path: 'Idempotency-Key',
        message: `every write carries a UUID made for it, not ${JSON.stringify(req.get('Idempotency-Key') ?? null)}`,
      },
    ]);
  }
  return key.data;
}

/** `"3"`, `3` and `W/"3"` all mean version 3. */
function readVersion(req: Request): number {
  const header = req.get('If-Match');
  if (header === undefined) throw versionNeeded();
  const version = /^(?:W\/)?"?(\d{1,9})"?$/.exec(header.trim())?.[1];
  if (version === undefined)
    throw invalid([
      { path: 'If-Match', message: `must be the version that was read, such as "3", not ${header}` },
    ]);
  return Number(version);
}

function fingerprintOf(req: Request): string {
  return JSON.stringify([req.method, req.originalUrl, req.get('If-Match') ?? null, req.body ?? null]);
}
