import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { ROUTES } from '#server/routes/route-table';
import type { Role } from '#server/entities/people.entities';
import { makeTestApp } from '../../support/test-app';
import type { Client, TestApp } from '../../support/test-app';

let test: TestApp;
const clients = {} as Record<Role, Client>;
const ROLES = ['applicant', 'reviewer', 'administrator'] as const;

beforeAll(async () => {
  test = await makeTestApp();
  for (const role of ROLES) clients[role] = await test.signInAs(role);
});
afterAll(() => test.close());

const NONSENSE: unknown[] = [
  {},
  [],
  null,
  'text',
  { version: 1e308, reason: { $ne: 1 }, line: [], unknown: true },
  { version: '1; DROP TABLE users', reason: 'x'.repeat(100_000) },
  JSON.parse('{"__proto__": {"role": "administrator"}, "constructor": {"prototype": {}}}'),
];
const QUERIES = [
  '',
  '?limit=-1',
  '?limit=1&limit=2',
  '?sort=(select 1)',
  '?filter[state]=%00',
  '?cursor=AAAA',
  '?__proto__[x]=1',
];
const IDS = [
  '00000000-0000-4000-8000-000000000000',
  '27-9999',
  "1' OR '1'='1",
  '%2e%2e%2f',
  '%00',
  'A'.repeat(3000),
];

/** Signing out and a new password would end the very session that asks. */
const SPARED = new Set(['signOut', 'changePassword']);
const routes = ROUTES.filter((route) => !SPARED.has(route.operationId));
const pathWith = (path: string, id: string) => path.replace(/\{\w+\}/g, encodeURI(id).replaceAll('%25', '%'));

describe('nonsense from people who are signed in', () => {
  it.each(routes.map((route) => [route.operationId, route] as const))(
    '%s answers it with a listed problem, never with a fault of the server',
    async (operationId, { method, path }) => {
      const verb = method.toLowerCase() as 'get' | 'post' | 'put' | 'patch' | 'delete';
      const answers = [];
      for (const role of ROLES) {
        const { agent, csrfToken } = clients[role];
        for (const id of path.includes('{') ? IDS : IDS.slice(0, 1)) {
          const variants = method === 'GET' || method === 'DELETE' ? QUERIES : NONSENSE;
          for (const variant of id === IDS[0] ? variants : variants.slice(0, 1)) {
            const isQuery = typeof variant === 'string' && variants === QUERIES;
            const url = pathWith(path, id) + (isQuery ? variant : '');
            const call = agent[verb](url)
              .set('X-CSRF-Token', csrfToken)
              .set('Content-Type', 'application/json');
            const answer = await (isQuery ? call : call.send(JSON.stringify(variant)));
            answers.push({
              status: answer.status,
              url: url.slice(0, 120),
              role,
              type: String(answer.headers['content-type']),
            });
          }
        }
      }
      expect(answers.length, operationId).toBeGreaterThan(2);
      expect(answers.filter((answer) => answer.status >= 500)).toEqual([]);
      const refusals = answers.filter((answer) => answer.status >= 400);
      expect(refusals.filter((answer) => !answer.type.startsWith('application/problem+json'))).toEqual([]);
    },
    60_000,
  );

  it('leaves nothing of it on the prototype of objects, and everybody’s role as it was', async () => {
    expect(({} as { role?: string }).role).toBeUndefined();
    for (const role of ROLES) expect((await clients[role].get('/api/session')).body).toMatchObject({ role });
  });
});
