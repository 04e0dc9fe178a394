import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { API_OPERATIONS } from '#shared/contracts/api-paths';
import { ROUTES } from '#server/routes/route-table';
import { makeTestApp } from '../../support/test-app';
import type { TestApp } from '../../support/test-app';

interface Operation {
  operationId: string;
  responses: Record<string, unknown>;
  security?: unknown[];
}
interface Document {
  openapi: string;
  paths: Record<string, Record<string, Operation>>;
  components: { schemas: Record<string, unknown> };
}

let test: TestApp;
let document: Document;
beforeAll(async () => {
  test = await makeTestApp();
  document = (await test.visitor().get('/api/openapi.json').expect(200)).body as Document;
});
afterAll(() => test.close());

const documented = () =>
  Object.entries(document.paths).flatMap(([path, methods]) =>
    Object.entries(methods).map(
      ([method, { operationId }]) => `${operationId} ${method.toUpperCase()} ${path}`,
    ),
  );

/** Every reference in a document. */
function references(node: unknown): string[] {
  if (Array.isArray(node)) return node.flatMap(references);
  if (typeof node !== 'object' || node === null) return [];
  return Object.entries(node).flatMap(([key, value]) =>
    key === '$ref' && typeof value === 'string' ? [value] : references(value),
  );
}

/** What a reference within the document points at. */
function resolved(reference: string): unknown {
  return reference
    .slice(2)
    .split('/')
    .map((part) => part.replaceAll('~1', '/').replaceAll('~0', '~'))
    .reduce<unknown>((node, part) => (node as Record<string, unknown> | undefined)?.[part], document);
}

interface Layer {
  route?: { path: string; methods: Record<string, boolean> };
}

describe('the OpenAPI document', () => {
  it('is of version 3.1 and holds exactly the operations of the contract', () => {
    expect(document.openapi).toMatch(/^3\.1\./);
    const contract = Object.entries(API_OPERATIONS).map(
      ([id, { method, path }]) => `${id} ${method} ${path}`,
    );
    expect(documented().sort()).toEqual(contract.sort());
  });

  it('holds exactly what the server really answers', () => {
    const layers = (test.app as unknown as { router: { stack: Layer[] } }).router.stack;
    const real = layers.flatMap(({ route }) => {
      if (!route || !route.path.startsWith('/api')) return [];
      const methods = Object.keys(route.methods).filter((method) => method !== '_all');
      // The refusal of other methods is registered for all of them at once.
      if (methods.length > 1) return [];
      return methods.map((method) => `${method.toUpperCase()} ${route.path.replace(/:(\w+)/g, '{$1}')}`);
    });
    const told = documented().map((line) => line.replace(/^\w+ /, ''));
    expect([...new Set(real)].sort()).toEqual(told.sort());
  });

  it('has no reference that leads nowhere', () => {
    const broken = [...new Set(references(document))].filter(
      (reference) => resolved(reference) === undefined,
    );
    expect(broken).toEqual([]);
  });

  it('says of each operation what it answers, refusals included', () => {
    for (const methods of Object.values(document.paths)) {
      for (const { operationId, responses } of Object.values(methods)) {
        expect(Object.keys(responses), operationId).toContain('default');
        expect(
          Object.keys(responses).some((status) => /^2/.test(status)),
          operationId,
        ).toBe(true);
      }
    }
  });
});

describe('the route table', () => {
  it('names access, answers and a summary in every row', () => {
    for (const { operationId, access, answers, summary } of ROUTES) {
      expect(access, operationId).toBeTruthy();
      expect(Object.keys(answers).length, operationId).toBeGreaterThan(0);
      expect(summary.length, operationId).toBeGreaterThan(5);
    }
  });

  const fill = (path: string) =>
    path
      .replace('{applicationId}', '27-0001')
      .replace('{lineKey}', 'L1')
      .replace('{letter}', 'A')
      .replace(/\{(number|run)\}/g, '1')
      .replace('{fingerprint}', 'x')
      .replace(/\{\w+\}/g, '00000000-0000-4000-8000-000000000000');

  it.each(
    ROUTES.filter((route) => typeof route.access === 'object').map(
      (route) => [route.operationId, route] as const,
    ),
  )('%s answers a visitor with 401 and nothing else', async (_id, { method, path }) => {
    const agent = test.visitor();
    const call = agent[method.toLowerCase() as 'get'](fill(path));
    const answer = await (method === 'GET' ? call : call.set('X-CSRF-Token', 'x'));
    expect(answer.body).toMatchObject({ status: 401, type: '/problems/not-signed-in' });
  });

  it.each(ROUTES.map((route) => [route.operationId, route] as const))(
    '%s keeps its answer out of every cache',
    async (_id, { method, path }) => {
      const answer = await test.visitor()[method.toLowerCase() as 'get'](fill(path));
      expect(answer.headers['cache-control']).toBe('no-store');
      expect(answer.headers['x-content-type-options']).toBe('nosniff');
      expect(answer.headers['x-request-id']).toMatch(/^[0-9a-f-]{36}$/);
      expect(answer.status).toBeLessThan(500);
    },
  );
});

describe('addresses that do not exist', () => {
  it('are problems under /api, and methods that are not taken say which are', async () => {
    expect((await test.visitor().get('/api/nothing')).body).toMatchObject({
      status: 404,
      type: '/problems/not-found',
    });
    const answer = await test.visitor().patch('/api/session');
    expect(answer.body).toMatchObject({ status: 405 });
    expect(answer.headers.allow?.split(', ').sort()).toEqual(['DELETE', 'GET', 'POST']);
  });

  it('say nothing of what is inside', async () => {
    const answer = await test.visitor().post('/api/session').type('json').send('{"email":');
    expect(answer.body).toMatchObject({ status: 400, type: '/problems/invalid-request' });
    expect(answer.text).not.toMatch(/SyntaxError|at .*\.ts|node_modules/);
    const bomb = await test
      .visitor()
      .post('/api/session')
      .send({ email: 'x', password: 'x'.repeat(3_000_000) });
    expect(bomb.body).toMatchObject({ status: 413, type: '/problems/too-large' });
  });
});
