import { Problem } from '@windrow/ventilation/contract/problem';
import { z } from 'zod';
import type { Route } from './route.ts';

/** The routes as OpenAPI 3.1, made from the very schemas that parse the requests. */
export function openApi(routes: readonly Route[], version: string): object {
  const paths: Record<string, Record<string, object>> = {};
  for (const route of routes) {
    const path = route.path.replace(/:(\w+)/g, '{$1}');
    paths[path] = { ...paths[path], [route.method]: operation(route) };
  }
  return {
    openapi: '3.1.0',
    info: {
      title: 'Windrow',
      version,
      description: 'Ventilation census board. An information display: not a monitor, not an alarm.',
    },
    paths,
    components: {
      schemas: { Problem: schemaOf(Problem, 'output') },
      securitySchemes: { session: { type: 'apiKey', in: 'cookie', name: 'windrow' } },
    },
  };
}

function operation(route: Route): object {
  const status = String(route.status ?? 200);
  return {
    summary: route.summary,
    ...(route.needs === 'nobody' ? {} : { security: [{ session: [] }] }),
    parameters: [
      ...fields(route.params, 'path'),
      ...fields(route.query, 'query'),
      ...(route.kind === 'write' ? [header('Idempotency-Key', 'A UUID made for this entry')] : []),
      ...(route.versioned ? [header('If-Match', 'The version that was read, such as "3"')] : []),
    ],
    ...(route.body
      ? {
          requestBody: {
            required: true,
            content: { 'application/json': { schema: schemaOf(route.body, 'input') } },
          },
        }
      : {}),
    responses: {
      [status]: route.response
        ? {
            description: 'Done',
            content: { 'application/json': { schema: schemaOf(route.response, 'output') } },
          }
        : { description: 'Done' },
      default: {
        description: 'Problem',
        content: { 'application/problem+json': { schema: { $ref: '#/components/schemas/Problem' } } },
      },
    },
  };
}

function fields(schema: z.ZodType | undefined, where: 'path' | 'query'): object[] {
  if (!(schema instanceof z.ZodObject)) return [];
  return Object.entries(schema.shape).map(([name, field]) => ({
    name,
    in: where,
    required: where === 'path',
    schema: schemaOf(field, 'input'),
  }));
}

const header = (name: string, description: string) => ({
  name,
  in: 'header',
  required: true,
  description,
  schema: { type: 'string' },
});

function schemaOf(schema: z.core.$ZodType, io: 'input' | 'output'): object {
  const { $schema: _dialect, ...rest } = z.toJSONSchema(schema, { io, unrepresentable: 'any' });
  return rest;
}
