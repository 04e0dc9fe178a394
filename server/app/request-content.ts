import type { Request } from 'express';
import * as validators from '../../shared/contracts/api-validators.generated.js';
import { faultsAgainst } from '../../shared/contracts/validators-by-name';
import type { SchemaPath } from '../../shared/contracts/validators-by-name';
import { invalidContent, Problem } from '../errors/problem';
import { unkeptText } from '../files/kept-text';
import type { Route } from '../routes/route';

export const inQuery = ({ method }: Pick<Route, 'method'>) => method === 'GET' || method === 'DELETE';

/** The schema that a request's query or body must meet; none means that there must not be one. */
export function requestSchema(route: Pick<Route, 'operationId'>): SchemaPath | null {
  const path = `requests/${route.operationId}`;
  return Object.hasOwn(validators.validatorNames, path) ? (path as SchemaPath) : null;
}

const ENTITY_TAG = /^(?:W\/)?"(\d{1,10})"$/;

/** `If-Match` says the same as `version`: whoever sends both must mean one. */
function withVersion(request: Request, content: Record<string, unknown>): Record<string, unknown> {
  const header = request.get('if-match');
  if (header === undefined) return content;
  const version = ENTITY_TAG.exec(header.trim())?.[1];
  if (version === undefined) {
    throw new Problem('invalid-request', {
      detail: 'If-Match must hold one version in quotes, such as "3".',
    });
  }
  const given = inQuery(request as Pick<Route, 'method'>) ? version : Number(version);
  if (content.version !== undefined && content.version !== given) {
    throw new Problem('invalid-request', { detail: 'If-Match and version name two different versions.' });
  }
  return { ...content, version: given };
}

const isEmpty = (value: unknown) =>
  value === undefined || (typeof value === 'object' && value !== null && Object.keys(value).length === 0);

function refuseUnexpected(place: string, value: unknown): void {
  if (isEmpty(value)) return;
  const first = typeof value === 'object' && value !== null ? (Object.keys(value)[0] ?? '') : '';
  throw invalidContent([
    { pointer: `/${first}`, value: null, expected: 'nothing', message: `This address takes no ${place}.` },
  ]);
}

export interface Content {
  query: unknown;
  body: unknown;
}

/** Query and body, held against the route's schema; nothing is coerced and nothing unknown let through. */
export function readContent(route: Route, request: Request): Content {
  const hasBody = !inQuery(route) && !route.upload;
  if (hasBody && request.headers['content-length'] !== '0' && request.headers['content-type'] !== undefined) {
    if (!request.is('application/json')) throw new Problem('unsupported-media-type');
  }
  const schema = requestSchema(route);
  const raw: unknown = hasBody ? ((request.body as unknown) ?? {}) : { ...request.query };
  refuseUnexpected(
    hasBody ? 'query' : 'body',
    hasBody ? request.query : route.upload ? undefined : request.body,
  );
  if (schema === null) {
    if (!route.upload) refuseUnexpected(hasBody ? 'body' : 'query', raw);
    return { query: {}, body: {} };
  }
  const isObject = typeof raw === 'object' && raw !== null && !Array.isArray(raw);
  const content = isObject ? withVersion(request, raw as Record<string, unknown>) : raw;
  if (route.versioned && isObject && (content as { version?: unknown }).version === undefined) {
    throw new Problem('version-required', {
      detail: 'Send the version that you read, as version or If-Match.',
    });
  }
  const faults = faultsAgainst(schema, content);
  if (faults.length === 0) faults.push(...unkeptText(content));
  if (faults.length > 0) throw invalidContent(faults);
  return hasBody ? { query: {}, body: content } : { query: content, body: {} };
}
