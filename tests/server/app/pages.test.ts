import { mkdirSync, mkdtempSync, rmSync, symlinkSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { PassThrough } from 'node:stream';
import supertest from 'supertest';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { makeApp } from '#server/app/make-app';
import { makeLogger } from '#server/logging/logger';
import { anOrganisation } from '../../support/people';
import { makeTestApp, PASSWORD } from '../../support/test-app';
import type { TestApp } from '../../support/test-app';

let test: TestApp;
let root: string;
let request: ReturnType<typeof supertest>;
let secure: ReturnType<typeof supertest>;
let logged = '';

beforeAll(async () => {
  test = await makeTestApp();
  root = mkdtempSync(join(tmpdir(), 'pages-'));
  symlinkSync(join(test.context.root, 'schemas'), join(root, 'schemas'));
  mkdirSync(join(root, 'dist/client/assets'), { recursive: true });
  writeFileSync(
    join(root, 'dist/client/index.html'),
    '<meta property="csp-nonce" nonce="__CSP_NONCE__"><p>page</p>',
  );
  writeFileSync(join(root, 'dist/client/assets/main-a1b2.js'), 'export {};');
  const stream = new PassThrough();
  stream.on('data', (chunk: Buffer) => (logged += chunk.toString()));
  const context = { ...test.context, root, log: makeLogger('debug', stream) };
  request = supertest(makeApp(context));
  secure = supertest(makeApp({ ...context, config: { ...context.config, secure: true } }));
});
afterAll(async () => {
  rmSync(root, { recursive: true });
  await test.close();
});

const policyOf = (answer: { headers: Record<string, string> }) =>
  Object.fromEntries(
    (answer.headers['content-security-policy'] ?? '').split(';').map((part) => {
      const [name = '', ...values] = part.trim().split(' ');
      return [name, values];
    }),
  );

describe('the page', () => {
  it('answers every address of the client, with a style nonce of its own each time', async () => {
    const [first, second] = [
      await request.get('/').expect(200),
      await request.get('/applications/27-0001').expect(200),
    ];
    const nonces = [first, second].map((answer) => /nonce="([^"]+)"/.exec(answer.text)?.[1]);
    expect(nonces[0]).not.toBe(nonces[1]);
    expect(policyOf(first)['style-src']).toEqual(["'self'", `'nonce-${nonces[0]}'`]);
    expect(first.headers['cache-control']).toBe('no-store');
  });

  it('has a policy that allows nothing unsafe, nothing from elsewhere and no framing', async () => {
    const policy = policyOf(await request.get('/'));
    expect(policy['default-src']).toEqual(["'self'"]);
    expect(policy['script-src']).toEqual(["'self'"]);
    for (const name of ['object-src', 'base-uri', 'frame-ancestors'])
      expect(policy[name]).toEqual(["'none'"]);
    expect(JSON.stringify(policy)).not.toMatch(/unsafe|https?:|\*/);
  });

  it('serves built files for good, and a missing file as missing', async () => {
    const asset = await request.get('/assets/main-a1b2.js').expect(200);
    expect(asset.headers['cache-control']).toMatch(/immutable/);
    await request.get('/assets/gone-c3d4.js').expect(404);
    await request.get('/../package.json').expect(404);
    await request.get('/%2e%2e/%2e%2e/package.json').expect(404);
  });

  it('over https asks browsers to stay there, and names the cookie so that nobody can plant it', async () => {
    const answer = await secure.get('/').expect(200);
    expect(answer.headers['strict-transport-security']).toMatch(/max-age=31536000; includeSubDomains/);
    const { email } = await test.account('applicant', await test.db.asSystem((tx) => anOrganisation(tx)));
    const signIn = await secure
      .post('/api/session')
      .set('X-Forwarded-Proto', 'https')
      .send({ email, password: PASSWORD });
    const [cookie = ''] = signIn.headers['set-cookie'] as unknown as string[];
    expect(cookie).toMatch(/^__Host-cp=/);
    expect(cookie).toMatch(/; Path=\/;.*HttpOnly; Secure; SameSite=Lax/);
    expect(cookie).not.toMatch(/Domain/);
  });
});

describe('the log', () => {
  it('holds requests with their ids, and no password, cookie, token or query', async () => {
    const { email } = await test.account('applicant', await test.db.asSystem((tx) => anOrganisation(tx)));
    const answer = await request.post('/api/session').send({ email, password: PASSWORD }).expect(200);
    await request.post('/api/session').send({ email, password: 'hunter2 in the wrong field' }).expect(401);
    await request.get('/api/session?name=somebody').expect(422);
    const [cookie = ''] = answer.headers['set-cookie'] as unknown as string[];
    expect(logged).toContain(answer.headers['x-request-id']);
    const secrets = [
      PASSWORD,
      'hunter2',
      email,
      'somebody',
      cookie.split(';')[0] ?? '',
      String(answer.body.csrfToken),
    ];
    for (const secret of secrets) expect(logged.includes(secret), secret).toBe(false);
  });
});
