import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { IdempotencyKey } from '#server/entities/file.entities';
import { RateLimit, StoredSession } from '#server/entities/people.entities';
import { sweep } from '#server/jobs/sweeper';
import type * as Api from '#shared/contracts/api.generated';
import { aDraft, aLine, expecting, runChecks, step } from '../../support/case';
import { aUser } from '../../support/people';
import { makeTestApp } from '../../support/test-app';
import { makeTestDatabase } from '../../support/test-database';
import type { TestDatabase } from '../../support/test-database';

let db: TestDatabase;
beforeAll(async () => {
  db = await makeTestDatabase();
});
afterAll(() => db.close());

describe('the sweeper', () => {
  it('clears away what has run out and nothing else', async () => {
    const now = db.clock.now().getTime();
    const [before, after] = [new Date(now - 1000), new Date(now + 1000)];
    const day = 24 * 3_600_000;
    await db.asSystem(async ({ manager, ...tx }) => {
      const { id: userId } = await aUser({ manager, ...tx });
      await manager.insert(StoredSession, [
        { sid: 'old', sess: {}, expire: before },
        { sid: 'live', sess: {}, expire: after },
      ]);
      const key = {
        userId,
        operationId: 'fileApplication',
        requestHash: 'x',
        status: 200,
        answer: {} as never,
      };
      await manager.insert(IdempotencyKey, [
        { ...key, key: 'old', createdAt: new Date(now - day - 1000) },
        { ...key, key: 'live', createdAt: new Date(now - day + 1000) },
      ]);
      await manager.insert(RateLimit, [
        { key: 'old', points: 1, expire: String(now - 1000) },
        { key: 'live', points: 1, expire: String(now + 1000) },
      ]);
    });
    await sweep({ ...db.surroundings, dataSource: db.worker });
    expect((await db.owner.manager.find(StoredSession)).map((row) => row.sid)).toEqual(['live']);
    expect((await db.owner.manager.find(IdempotencyKey)).map((row) => row.key)).toEqual(['live']);
    expect((await db.owner.manager.find(RateLimit)).map((row) => row.key)).toEqual(['live']);
  });

  it('tells of a run that no job stands behind any more, and leaves one that waits alone', async () => {
    const app = await makeTestApp();
    const applicant = await app.signInAs('applicant');
    const [dead, waiting] = [
      await aDraft(applicant, [aLine('Sarn tie')]),
      await aDraft(applicant, [aLine('Sarn')]),
    ];
    for (const { number } of [dead, waiting]) await step(applicant, number, 'file');
    // the worker that had it died at each try
    await app.db.owner.query(
      `WITH gone AS (UPDATE check_runs r SET status = 'running' FROM revisions v, applications a
          WHERE v.id = r.revision_id AND a.id = v.application_id AND a.number = $1 RETURNING r.id)
        UPDATE pgboss.job j SET state = 'failed' FROM gone WHERE j.id = gone.id`,
      [dead.number],
    );
    await sweep({ ...app.db.surroundings, dataSource: app.db.worker });
    const reviewer = await app.signInAs('reviewer');
    const checkOf = async ({ number }: { number: string }) =>
      (await expecting<Api.Application>(200, reviewer.get(`/api/applications/${number}`))).check;
    expect(await checkOf(dead)).toMatchObject({ state: 'failed' });
    expect(await checkOf(waiting)).toMatchObject({ state: 'queued' });
    const refusal = await reviewer.post(`/api/applications/${dead.number}/take`, {});
    expect((refusal.body as { detail: string }).detail).toContain('made again');
    await expecting(202, reviewer.post(`/api/applications/${dead.number}/revisions/A/runs`, {}));
    await runChecks(app.db);
    expect(await step(reviewer, dead.number, 'take')).toMatchObject({ state: 'in-review' });
    await app.close();
  });
});
