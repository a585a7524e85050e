/** The API as an OpenAPI 3.1 document, made from the declarations of the routes and their schemas. */
import { healthSchema } from '@shared/api/health';
import { problemSchema, type ApiProblemCode } from '@shared/api/problem';
import * as z from 'zod';
import { CSRF_COOKIE, CSRF_HEADER } from './csrf';
import { statusOf } from './errors';
import type { RouteAnswer, RouteDeclaration } from './route';
import { SESSION_COOKIE } from './session';

type Json = Record<string, unknown>;

/** The OpenAPI document of these routes. */
export function openApiDocument(routes: Readonly<Record<string, RouteDeclaration>>): Json {
  const paths: Record<string, Json> = { '/health': { get: HEALTH } };
  for (const [name, route] of Object.entries(routes)) {
    const path = route.path.replace(/:(\w+)/g, '{$1}');
    paths[path] = { ...paths[path], [route.method]: operation(name, route) };
  }
  return {
    openapi: '3.1.0',
    info: {
      title: 'Staveloom',
      version: '1',
      description: 'Lay out, check and cut round shells made of interlocking wooden tiles.',
    },
    servers: [{ url: '/api' }],
    paths,
    components: {
      schemas: { ApiProblem: jsonSchema(problemSchema, 'output') },
      securitySchemes: {
        session: { type: 'apiKey', in: 'cookie', name: SESSION_COOKIE },
      },
    },
  };
}

const HEALTH: Json = {
  operationId: 'health',
  summary: 'Whether the server and its database can work',
  security: [],
  responses: {
    200: { description: 'Both can', content: jsonContent(jsonSchema(healthSchema, 'output')) },
    503: {
      description: 'The database does not answer',
      content: jsonContent(jsonSchema(healthSchema, 'output')),
    },
  },
};

function operation(name: string, route: RouteDeclaration): Json {
  const rights = route.access === 'anyone' ? null : route.access.anyOf;
  return {
    operationId: name,
    summary: route.summary,
    ...(rights && { description: `Takes the right ${rights.join(' or ')}.` }),
    security: rights ? [{ session: [] }] : [],
    parameters: parametersOf(route),
    ...requestBodyOf(route),
    responses: { ...answerOf(route.answer), ...refusalsOf(route) },
  };
}

function requestBodyOf({ body, upload }: RouteDeclaration): Json {
  if (body) {
    return { requestBody: { required: true, content: jsonContent(jsonSchema(body, 'input')) } };
  }
  if (!upload) return {};
  const { field, most } = upload;
  const file = {
    type: 'string',
    contentMediaType: 'application/octet-stream',
    description: `At most ${most} bytes.`,
  };
  const schema = { type: 'object', properties: { [field]: file }, required: [field] };
  return { requestBody: { required: true, content: { 'multipart/form-data': { schema } } } };
}

function parametersOf(route: RouteDeclaration): Json[] {
  const inPath = [...route.path.matchAll(/:(\w+)/g)].map(([, name]) => ({
    name,
    in: 'path',
    required: true,
    schema: name === 'id' ? { type: 'string', format: 'uuid' } : { type: 'integer', minimum: 1 },
  }));
  const query = route.query ? jsonSchema(route.query, 'input') : {};
  const required = new Set((query['required'] ?? []) as string[]);
  const inQuery = Object.entries((query['properties'] ?? {}) as Json).map(([name, schema]) => ({
    name,
    in: 'query',
    required: required.has(name),
    schema,
  }));
  return [...inPath, ...inQuery, ...(route.method === 'get' ? [] : [CSRF_PARAMETER])];
}

const CSRF_PARAMETER: Json = {
  name: CSRF_HEADER.toUpperCase(),
  in: 'header',
  required: true,
  description: `The value of the cookie ${CSRF_COOKIE}, which every answer hands out when it is missing.`,
  schema: { type: 'string' },
};

function answerOf(answer: RouteAnswer): Json {
  if (answer.status === 204) return { 204: { description: 'Done' } };
  if ('file' in answer) {
    const content = { [answer.file]: { schema: { type: 'string', format: 'binary' } } };
    return { 200: { description: 'The file', content } };
  }
  if ('stream' in answer) {
    const content = { [answer.stream]: { schema: { type: 'string' } } };
    return { 200: { description: 'Events until either side ends', content } };
  }
  const content = jsonContent(jsonSchema(answer.schema, 'output'));
  return { [answer.status]: { description: answer.status === 201 ? 'Made' : 'Done', content } };
}

/** Every refusal a route can answer: its own, and those that follow from what it takes. */
function refusalsOf(route: RouteDeclaration): Json {
  const codes = new Set<ApiProblemCode>([
    ...(route.access === 'anyone' ? [] : (['not-signed-in', 'not-allowed'] as const)),
    ...(route.method === 'get' ? [] : (['forged-request'] as const)),
    ...(route.body || route.upload ? (['bad-input', 'too-large'] as const) : []),
    ...(route.query ? (['bad-input'] as const) : []),
    ...(route.path.includes(':') ? (['not-found'] as const) : []),
    ...route.refusals,
    'failed',
    'unavailable',
  ]);
  const byStatus = new Map<number, ApiProblemCode[]>();
  for (const code of codes) {
    byStatus.set(statusOf(code), [...(byStatus.get(statusOf(code)) ?? []), code]);
  }
  return Object.fromEntries(
    [...byStatus].map(([status, each]) => [
      status,
      {
        description: each.join(', '),
        content: jsonContent({ $ref: '#/components/schemas/ApiProblem' }),
      },
    ]),
  );
}

function jsonContent(schema: Json): Json {
  return { 'application/json': { schema } };
}

function jsonSchema(schema: z.ZodType, io: 'input' | 'output'): Json {
  const { $schema: _, ...rest } = z.toJSONSchema(schema, { io, unrepresentable: 'any' });
  return rest;
}
