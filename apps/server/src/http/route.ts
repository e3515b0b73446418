import type { Act } from '@windrow/ventilation/permissions/permissions';
import type { Request, Response } from 'express';
import type { z } from 'zod';
import type { Deps } from '../deps.ts';
import type { SignedIn } from '../services/sign-ins.ts';
import type { Write } from '../services/write.ts';

type Schema = z.ZodType;
type Parsed<S extends Schema | undefined> = S extends Schema ? z.infer<S> : undefined;

export type Input<
  Params extends Schema | undefined,
  Query extends Schema | undefined,
  Body extends Schema | undefined,
> = {
  params: Parsed<Params>;
  query: Parsed<Query>;
  body: Parsed<Body>;
};

type Common = {
  path: `/api/${string}`;
  summary: string;
  params?: Schema;
  query?: Schema;
  body?: Schema;
  response: Schema | null;
  status?: number;
};

/**
 * What somebody must be allowed to do, and where. `in` finds the unit that the request is about
 * (and answers 404 where the thing is not there); null asks for the whole house, 'any' for any unit.
 */
export type Needs<I> = { act: Act; in: (deps: Deps, input: I) => Promise<string | null> | string | null };

/**
 * One route of the service. All routes stand in one list (routes.ts): it is what is served, what
 * openapi.json says, and what the permission matrix test walks.
 */
export type Route = Common & {
  method: 'get' | 'post' | 'put' | 'patch' | 'delete';
  needs: Needs<never> | 'nobody' | 'anybody-signed-in' | { act: Act; in: 'any' };
  /** Whether `If-Match` with the version that was read is required. */
  versioned?: boolean;
} & (
    | { kind: 'read'; handle: (context: { deps: Deps; person: SignedIn; input: never }) => Promise<unknown> }
    | {
        kind: 'write';
        handle: (context: { deps: Deps; write: Write; input: never; version: number }) => Promise<unknown>;
      }
    | {
        kind: 'session';
        handle: (context: {
          deps: Deps;
          person: SignedIn | null;
          input: never;
          req: Request;
          res: Response;
        }) => Promise<unknown>;
      }
  );

type Typed<
  K extends 'read' | 'write' | 'session',
  P extends Schema | undefined,
  Q extends Schema | undefined,
  B extends Schema | undefined,
> = Omit<Extract<Route, { kind: K }>, 'handle' | 'needs' | 'params' | 'query' | 'body'> & {
  params?: P;
  query?: Q;
  body?: B;
  needs: Needs<Input<P, Q, B>> | Exclude<Route['needs'], Needs<never>>;
  handle: (
    context: Omit<Parameters<Extract<Route, { kind: K }>['handle']>[0], 'input'> & { input: Input<P, Q, B> },
  ) => Promise<unknown>;
};

/** Gives a route its types: what the handler receives is what the schemas parsed. */
export function read<P extends Schema | undefined = undefined, Q extends Schema | undefined = undefined>(
  route: Omit<Typed<'read', P, Q, undefined>, 'kind' | 'method'>,
): Route {
  return { ...route, kind: 'read', method: 'get' };
}

export function write<P extends Schema | undefined = undefined, B extends Schema | undefined = undefined>(
  route: Omit<Typed<'write', P, undefined, B>, 'kind'>,
): Route {
  return { ...route, kind: 'write' };
}

export function session<B extends Schema | undefined = undefined>(
  route: Omit<Typed<'session', undefined, undefined, B>, 'kind'>,
): Route {
  return { ...route, kind: 'session' };
}
