import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { z } from 'zod';
import { routes } from '../../apps/server/src/http/routes.ts';
import { requireAsDescribed } from '../support/described.ts';
import { type House, openHouse } from '../support/house.ts';
import { PROBES } from './permissions/probes.ts';
import { openScene, type Scene } from './permissions/scene.ts';

const Schema = z.looseObject({});
const Parameter = z.strictObject({
  name: z.string().min(1),
  in: z.enum(['path', 'query', 'header']),
  required: z.boolean(),
  description: z.string().optional(),
  schema: Schema,
});
const Content = z.record(z.string(), z.strictObject({ schema: Schema }));
/** The part of OpenAPI 3.1 that this description uses, strictly: a key besides is a mistake. */
const Operation = z.strictObject({
  summary: z.string().min(5),
  security: z.array(z.record(z.string(), z.array(z.string()))).optional(),
  parameters: z.array(Parameter),
  requestBody: z.strictObject({ required: z.literal(true), content: Content }).optional(),
  responses: z.record(
    z.string().regex(/^(\d{3}|default)$/),
    z.strictObject({ description: z.string(), content: Content.optional() }),
  ),
});
const Description = z.strictObject({
  openapi: z.literal('3.1.0'),
  info: z.strictObject({ title: z.string(), version: z.string(), description: z.string() }),
  paths: z.record(
    z.string().startsWith('/api/'),
    z.partialRecord(z.enum(['get', 'post', 'put', 'patch', 'delete']), Operation),
  ),
  components: z.strictObject({
    schemas: z.record(z.string(), Schema),
    securitySchemes: z.record(z.string(), z.looseObject({ type: z.literal('apiKey') })),
  }),
});

let house: House;
let scene: Scene;
let description: z.infer<typeof Description>;
beforeAll(async () => {
  house = await openHouse();
  scene = await openScene(house);
  description = (await house.anybody().get('/api/openapi.json')).as(Description);
});
afterAll(() => house.close());

const operationOf = ({ path, method }: { path: string; method: string }) =>
  Object.entries(description.paths).find(([described]) => described === path.replace(/:(\w+)/g, '{$1}'))?.[1][
    method as 'get'
  ];

/** Every `$ref` in a value. */
function references(value: unknown): string[] {
  if (Array.isArray(value)) return value.flatMap(references);
  if (typeof value !== 'object' || value === null) return [];
  return Object.entries(value).flatMap(([key, inner]) =>
    key === '$ref' && typeof inner === 'string' ? [inner] : references(inner),
  );
}

describe('openapi.json', () => {
  it('describes every route and nothing else', () => {
    const described = Object.entries(description.paths).flatMap(([path, operations]) =>
      Object.keys(operations).map((method) => `${method} ${path}`),
    );
    expect(described.sort()).toEqual(
      routes.map(({ method, path }) => `${method} ${path.replace(/:(\w+)/g, '{$1}')}`).sort(),
    );
  });

  it('names the parts of each address as parameters, each with its own schema', () => {
    for (const route of routes) {
      const inPath = operationOf(route)?.parameters.filter((parameter) => parameter.in === 'path') ?? [];
      const names = [...route.path.matchAll(/:(\w+)/g)].map(([, name]) => name);
      expect(
        inPath.map(({ name }) => name),
        route.path,
      ).toEqual(names);
      expect(inPath.every(({ required }) => required)).toBe(true);
    }
  });

  it('asks for a key on every write, and for a version where something is replaced', () => {
    for (const route of routes) {
      const headers =
        operationOf(route)
          ?.parameters.filter((parameter) => parameter.in === 'header')
          .map(({ name }) => name) ?? [];
      expect(headers, `${route.method} ${route.path}`).toEqual([
        ...(route.kind === 'write' ? ['Idempotency-Key'] : []),
        ...(route.versioned ? ['If-Match'] : []),
      ]);
    }
  });

  it('gives each route its answer, its refusal and its body', () => {
    for (const route of routes) {
      const operation = operationOf(route);
      const status = String(route.status ?? 200);
      expect(Object.keys(operation?.responses ?? {})).toEqual([status, 'default']);
      expect(Boolean(operation?.responses[status]?.content)).toBe(route.response !== null);
      expect(operation?.responses.default?.content?.['application/problem+json']?.schema).toEqual({
        $ref: '#/components/schemas/Problem',
      });
      expect(operation?.requestBody !== undefined).toBe(route.body !== undefined);
      expect(operation?.security !== undefined).toBe(route.needs !== 'nobody');
    }
  });

  it('points only at what it holds', () => {
    for (const reference of references(description)) expect(reference).toBe('#/components/schemas/Problem');
  });

  it('refuses unknown fields where the server does', () => {
    const check = operationOf({ path: '/api/stays/:stayId/checks', method: 'post' });
    expect(check?.requestBody?.content['application/json']?.schema).toMatchObject({
      type: 'object',
      additionalProperties: false,
      properties: {
        settings: { additionalProperties: false, properties: { fio2Percent: { minimum: 21, maximum: 100 } } },
      },
    });
  });
});

describe('every answer of the service', () => {
  it('is held against its description by the harness, which notices what is missing or too much', () => {
    const headers = new Headers({ 'content-type': 'application/json' });
    const health = { status: 'ok', revision: 1, serverTime: house.ago(0), version: 'test' };
    const check =
      (body: object, status = 200) =>
      () =>
        requireAsDescribed('GET', '/api/health', { status, body, headers });
    expect(check(health)).not.toThrow();
    expect(check({ ...health, revision: '1' })).toThrow('not as described');
    expect(check({ ...health, password_hash: 'x' })).toThrow('more than is described');
    expect(check(health, 201)).toThrow('is described with 200');
    expect(check({ title: 'No' }, 404)).toThrow('not as a problem document');
    expect(() => requireAsDescribed('GET', '/api/nowhere', { status: 200, body: {}, headers })).toThrow(
      'no route',
    );
  });

  it.each(routes.map(({ method, path }) => `${method.toUpperCase()} ${path}`))(
    '%s is as described',
    async (key) => {
      const method = key.slice(0, key.indexOf(' '));
      for (const [number, caller] of [
        scene.inHospital.charge,
        scene.inHospital.supervisor,
        scene.inHospital.administrator,
      ].entries()) {
        const probe = await PROBES[key]?.({ scene, place: scene.alder, caller, number: number + 900 });
        if (!probe) throw new Error(`${key} has no probe`);
        const { path, as: instead, after, ...asking } = probe;
        const reply = await (instead ?? caller).ask(method, path, asking);
        if (reply.status < 300) await after?.();
      }
    },
  );
});
