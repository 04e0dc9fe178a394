import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { inQuery, requestSchema } from '#server/app/request-content';
import { ROUTES } from '#server/routes/route-table';
import { defineAbility } from '#shared/policies/ability';
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
const IDS = ['00000000-0000-4000-8000-000000000000', '27-9999', "1' OR '1'='1", '%00', 'A'.repeat(3000)];

/** Signing out and a new password would end the very session that asks. */
const SPARED = new Set(['signOut', 'changePassword']);
const routes = ROUTES.filter((route) => !SPARED.has(route.operationId));
const pathWith = (path: string, id: string) => path.replace(/\{\w+\}/g, encodeURI(id).replaceAll('%25', '%'));

/** Who comes furthest: the role that the route is for. */
function insider({ access }: (typeof routes)[number]): Role {
  if (typeof access !== 'object') return 'applicant';
  return ROLES.find((role) => defineAbility(clients[role].actor).can(access.can, access.on)) ?? 'applicant';
}

/** Every nonsense of content from whom the route is for, every nonsense of an id once, and one from each outsider. */
function attempts(route: (typeof routes)[number]): { role: Role; id: string; content: unknown }[] {
  const role = insider(route);
  const all = inQuery(route) ? QUERIES : NONSENSE;
  // without a schema whatever is sent is refused alike
  const contents = requestSchema(route) === null ? all.slice(0, 2) : all;
  const [id = ''] = IDS;
  const ids = route.path.includes('{') ? IDS.slice(1) : [];
  return [
    ...contents.map((content) => ({ role, id, content })),
    ...ids.map((other) => ({ role, id: other, content: contents[0] })),
    ...ROLES.filter((other) => other !== role).map((other) => ({ role: other, id, content: contents[0] })),
  ];
}

async function tell(
  route: (typeof routes)[number],
  { role, id, content }: ReturnType<typeof attempts>[number],
) {
  const verb = route.method.toLowerCase() as 'get' | 'post' | 'put' | 'patch' | 'delete';
  const { agent, csrfToken } = clients[role];
  const isQuery = inQuery(route);
  const url = pathWith(route.path, id) + (isQuery ? String(content) : '');
  const call = agent[verb](url).set('X-CSRF-Token', csrfToken).set('Content-Type', 'application/json');
  const { status, headers } = await (isQuery ? call : call.send(JSON.stringify(content)));
  return { status, url: url.slice(0, 120), role, type: String(headers['content-type']) };
}

describe('nonsense from people who are signed in', () => {
  it.each(routes.map((route) => [route.operationId, route] as const))(
    '%s answers it with a listed problem, never with a fault of the server',
    async (operationId, route) => {
      const answers = [];
      for (const attempt of attempts(route)) answers.push(await tell(route, attempt));
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
