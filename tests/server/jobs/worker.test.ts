import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { enqueue } from '#server/database/enqueue';
import { queueMail } from '#server/database/outbox';
import { roleUrl } from '#server/database/roles';
import { QUEUES } from '#server/integrations/queue-names';
import type { Mail } from '#server/integrations/mail';
import { startWorker } from '#server/jobs/worker';
import type { RunningWorker } from '#server/jobs/worker';
import { makeLogger } from '#server/logging/logger';
import { makeTestDatabase } from '../../support/test-database';
import type { TestDatabase } from '../../support/test-database';

let db: TestDatabase;
let workers: RunningWorker[];
const sent: Mail[] = [];

beforeAll(async () => {
  db = await makeTestDatabase();
  const settings = {
    surroundings: { ...db.surroundings, dataSource: db.worker },
    databaseUrl: roleUrl(db.ownerUrl, db.secret, 'worker'),
    mailer: { send: async (mail: Mail) => void sent.push(mail), close: () => undefined },
    log: makeLogger('silent'),
  };
  workers = [await startWorker(settings), await startWorker(settings)];
});
afterAll(async () => {
  for (const worker of workers) await worker.stop();
  await db.close();
});

async function eventually<T>(look: () => Promise<T>, good: (value: T) => boolean): Promise<T> {
  for (let i = 0; i < 150; i++) {
    const value = await look();
    if (good(value)) return value;
    await new Promise((next) => setTimeout(next, 100));
  }
  throw new Error('it never came to pass');
}

describe('two workers on one database', () => {
  it('do each job to its end', async () => {
    const ids = ['a', 'b', 'c', 'd'].map((c) => c.repeat(8) + '-1111-4111-8111-111111111111');
    await db.asSystem(async (tx) => {
      for (const id of ids) await enqueue(tx, QUEUES.checkRun, id);
    });
    const states = () =>
      db.owner.query<{ state: string }[]>('SELECT state FROM pgboss.job WHERE name = $1', [QUEUES.checkRun]);
    const done = await eventually(states, (rows) => rows.every((row) => row.state === 'completed'));
    expect(done).toHaveLength(4);
  });

  it('send each mail once', async () => {
    await db.asSystem(async (tx) => {
      for (let n = 0; n < 6; n++) {
        const mail = { kind: 'notice', orgId: null, subject: 'Hello', body: 'Hello.\n' };
        await queueMail(tx, { ...mail, causeId: String(n), recipient: `p${n}@example.org` });
      }
    });
    await eventually(
      async () => sent.length,
      (count) => count >= 6,
    );
    expect(sent.map((mail) => mail.recipient).sort()).toEqual(
      Array.from({ length: 6 }, (_, n) => `p${n}@example.org`),
    );
  });
});
