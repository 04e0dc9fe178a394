import { PROBLEMS } from '../../shared/contracts/errors';
import { parameterNames, parameterPattern } from './path-parameters';
import { inQuery, requestSchema } from './request-content';
import type { Route } from '../routes/route';
import { componentName, schemaDocuments } from './schema-documents';

type Json = Record<string, unknown>;

const reference = (path: string) => ({ $ref: `#/components/schemas/${componentName(path)}` });

function pathParameters(path: string): Json[] {
  return parameterNames(path).map((name) => ({
    name,
    in: 'path',
    required: true,
    schema: { type: 'string', pattern: parameterPattern(name) },
  }));
}

function queryParameters(route: Route, schemas: Map<string, Json>): Json[] {
  const path = requestSchema(route);
  if (path === null || !inQuery(route)) return [];
  const { properties = {}, required = [] } = (schemas.get(path) ?? {}) as {
    properties?: Record<string, Json>;
    required?: string[];
  };
  return Object.entries(properties).map(([name, schema]) => ({
    name,
    in: 'query',
    required: required.includes(name),
    schema,
  }));
}

function headerParameters({ idempotent, versioned, access, method }: Route): Json[] {
  const header = (name: string, required: boolean, description: string) => ({
    name,
    in: 'header',
    required,
    description,
    schema: { type: 'string' },
  });
  const guarded = access !== 'anyone' && access !== 'half-signed-in' && method !== 'GET';
  return [
    ...(guarded ? [header('X-CSRF-Token', true, 'The csrfToken of GET /api/session.')] : []),
    ...(idempotent
      ? [header('Idempotency-Key', false, 'A repeat with the same key gets the same answer.')]
      : []),
    ...(versioned ? [header('If-Match', false, 'The version that was read; the same as `version`.')] : []),
  ];
}

function requestBody(route: Route): Json {
  if (route.upload) {
    const fields = Object.fromEntries(route.upload.fields.map((name) => [name, { type: 'string' }]));
    const file = { type: 'string', contentMediaType: 'application/octet-stream' };
    const schema = { type: 'object', required: ['file'], properties: { file, ...fields } };
    return { requestBody: { required: true, content: { 'multipart/form-data': { schema } } } };
  }
  const path = requestSchema(route);
  if (path === null || inQuery(route)) return {};
  return { requestBody: { required: true, content: { 'application/json': { schema: reference(path) } } } };
}

function success(schema: string): Json {
  if (schema === 'bytes')
    return { '*/*': { schema: { type: 'string', contentMediaType: 'application/octet-stream' } } };
  if (schema === 'openapi') return { 'application/json': { schema: { type: 'object' } } };
  return { 'application/json': { schema: reference(`responses/${schema}`) } };
}

function responses({ answers, access }: Route): Json {
  const good = Object.entries(answers).map(([status, schema]) => [
    status,
    { description: 'Done', content: success(schema) },
  ]);
  const refusals = access === 'anyone' ? {} : { 401: { $ref: '#/components/responses/problem' } };
  return { ...Object.fromEntries(good), ...refusals, default: { $ref: '#/components/responses/problem' } };
}

function operation(route: Route, schemas: Map<string, Json>): Json {
  const open = route.access === 'anyone';
  return {
    operationId: route.operationId,
    summary: route.summary,
    ...(open ? { security: [] } : {}),
    parameters: [
      ...pathParameters(route.path),
      ...queryParameters(route, schemas),
      ...headerParameters(route),
    ],
    ...requestBody(route),
    responses: responses(route),
  };
}

const PROBLEM_SCHEMA = {
  type: 'object',
  required: ['type', 'title', 'status'],
  properties: {
    type: { type: 'string', enum: Object.keys(PROBLEMS).map((name) => `/problems/${name}`) },
    title: { type: 'string' },
    status: { type: 'integer' },
    detail: { type: 'string' },
    instance: { type: 'string' },
    requestId: { type: 'string' },
    errors: { type: 'array', items: { type: 'object' } },
  },
};

/** The OpenAPI document, made from the route table and the schemas: it cannot say what the server does not do. */
export function openApiDocument(routes: readonly Route[], root: string, cookie: string): Json {
  const schemas = schemaDocuments(root);
  const paths: Record<string, Json> = {};
  for (const route of routes) {
    (paths[route.path] ??= {})[route.method.toLowerCase()] = operation(route, schemas);
  }
  return {
    openapi: '3.1.0',
    info: { title: 'Counterpoise', version: '1' },
    security: [{ session: [] }],
    paths,
    components: {
      schemas: {
        ...Object.fromEntries([...schemas].map(([path, schema]) => [componentName(path), schema])),
        problem: PROBLEM_SCHEMA,
      },
      responses: {
        problem: {
          description: 'A refusal (RFC 9457)',
          content: { 'application/problem+json': { schema: { $ref: '#/components/schemas/problem' } } },
        },
      },
      securitySchemes: { session: { type: 'apiKey', in: 'cookie', name: cookie } },
    },
  };
}
