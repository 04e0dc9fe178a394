import { resolve } from 'node:path';
import supertest from 'supertest';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { makeApp } from '#server/app/make-app';
import { makeConfig } from '#server/config/config';
import { makeDataSource } from '#server/database/data-source';
import { makePlainPool } from '#server/database/plain-pool';
import { roleUrl } from '#server/database/roles';
import { makeLogger } from '#server/logging/logger';
import { makeCutLine } from '../../support/cut-line';
import type { CutLine } from '../../support/cut-line';
import { makeTestDatabase } from '../../support/test-database';
import type { TestDatabase } from '../../support/test-database';

let db: TestDatabase;
let line: CutLine;
let request: ReturnType<typeof supertest>;
let close: () => Promise<void>;

beforeAll(async () => {
  db = await makeTestDatabase();
  line = await makeCutLine(roleUrl(db.ownerUrl, db.secret, 'web'));
  const dataSource = makeDataSource(line.url, 'web');
  await dataSource.initialize();
  const pool = makePlainPool(line.url, 2);
  const config = makeConfig({ databaseUrl: line.url, sessionSecret: db.secret, logLevel: 'silent' });
  const surroundings = { ...db.surroundings, dataSource };
  const root = resolve(import.meta.dirname, '../../..');
  const log = makeLogger('silent');
  request = supertest(
    makeApp({ config, surroundings, pool, log, root, checkAnswers: true, setUpToken: null }),
  );
  close = async () => {
    await pool.end();
    await dataSource.destroy();
    await line.close();
    await db.close();
  };
});
afterAll(() => close());

/** Asks until the answer is the wanted one, within the time that is promised. */
async function within(ms: number, path: string, status: number): Promise<void> {
  const until = Date.now() + ms;
  for (;;) {
    const answer = await request.get(path);
    if (answer.status === status) return;
    if (Date.now() > until) throw new Error(`${path} still answers ${answer.status}`);
    await new Promise((next) => setTimeout(next, 100));
  }
}

// Promised are 2 s and 5 s; three times that is allowed here.
describe('when the database is gone', () => {
  it('answers ready while it is there', async () => {
    expect((await request.get('/api/health/ready').expect(200)).body).toEqual({ status: 'ready' });
  });

  it('lives, is not ready and says so, and is back by itself when the database is', async () => {
    line.cut();
    await within(6000, '/api/health/ready', 503);
    await request.get('/api/health/live').expect(200);
    for (const path of ['/api/health/ready', '/api/session']) {
      const answer = await request.get(path);
      expect(answer.body, path).toMatchObject({ status: 503, type: '/problems/unavailable' });
      expect(Number(answer.headers['retry-after'])).toBeGreaterThan(0);
    }
    const signIn = await request.post('/api/session').send({ email: 'a@example.org', password: 'x' });
    expect(signIn.status).toBe(503);
    line.mend();
    await within(15_000, '/api/health/ready', 200);
    await request.get('/api/session').expect(200);
  });

  it('takes a session it cannot look up for an error, not for nobody', async () => {
    line.cut();
    const answer = await request.get('/api/session').set('Cookie', 'cp=s%3Aabc.def');
    expect(answer.status).toBe(503);
    line.mend();
    await within(15_000, '/api/session', 200);
  });
});
