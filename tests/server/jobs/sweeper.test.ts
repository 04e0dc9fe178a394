import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { IdempotencyKey } from '#server/entities/file.entities';
import { RateLimit, StoredSession } from '#server/entities/people.entities';
import { sweep } from '#server/jobs/sweeper';
import { aUser } from '../../support/people';
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
});
