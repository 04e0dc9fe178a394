import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import PgBoss from 'pg-boss';
import { conditionalUpdate } from '#server/database/conditional-update';
import { enqueue } from '#server/database/enqueue';
import { oncePerKey } from '#server/database/idempotency';
import { APPEND_ONLY_TABLES } from '#server/database/migrations/first/protections';
import { roleUrl } from '#server/database/roles';
import { Application } from '#server/entities/case.entities';
import { RunValue } from '#server/entities/verdict.entities';
import { Problem } from '#server/errors/problem';
import { QUEUES } from '#server/integrations/queue-names';
import { anOrganisation, aPerson } from '../../support/people';
import type { UserActor } from '../../support/people';
import { makeTestDatabase } from '../../support/test-database';
import type { TestDatabase } from '../../support/test-database';

let db: TestDatabase;
let actor: UserActor;
let applicationId: string;

beforeAll(async () => {
  db = await makeTestDatabase();
  actor = await db.asSystem(async (tx) => aPerson(tx, await anOrganisation(tx), 'applicant'));
  applicationId = await db.as(actor, async (tx) => {
    const row = {
      orgId: actor.orgId,
      number: '27-0001',
      title: 'First',
      connectionKind: 'load',
      createdBy: actor.userId,
    };
    return String((await tx.manager.insert(Application, row)).identifiers[0]?.id);
  });
});
afterAll(() => db.close());

const kindOf = (error: unknown) => (error instanceof Problem ? error.kind : String(error));

describe('a change of what several people may change', () => {
  it('is won by exactly one of a hundred at once; the others are told it is stale', async () => {
    const change = (n: number) =>
      db.as(actor, ({ manager }) =>
        conditionalUpdate(manager, Application, { id: applicationId, version: 1 }, { title: `by ${n}` }),
      );
    const results = await Promise.allSettled(Array.from({ length: 100 }, (_, n) => change(n)));
    const won = results.filter((result) => result.status === 'fulfilled');
    expect(won.map((result) => result.value)).toEqual([2]);
    const lost = results
      .filter((result) => result.status === 'rejected')
      .map((result) => kindOf(result.reason));
    expect(new Set(lost)).toEqual(new Set(['stale']));
    expect(await db.owner.manager.findOneBy(Application, { id: applicationId })).toMatchObject({
      version: 2,
    });
  });

  it('is refused when what else it relies on no longer holds', async () => {
    const { version } = await db.owner.manager.findOneByOrFail(Application, { id: applicationId });
    await expect(
      db.as(actor, ({ manager }) =>
        conditionalUpdate(
          manager,
          Application,
          { id: applicationId, version, title: 'First' },
          { title: 'again' },
        ),
      ),
    ).rejects.toMatchObject({ kind: 'stale' });
  });
});

describe('a write with an Idempotency-Key', () => {
  const request = (key: string, content: unknown = { n: 1 }) => ({
    userId: actor.userId,
    key,
    operationId: 'createApplication',
    content,
  });
  const insert = (number: string) => async () => ({ status: 201, body: { number } });

  it('has one effect for a hundred at once, and the same answer or "in flight" for all', async () => {
    let effects = 0;
    const send = () =>
      db.as(actor, (tx) =>
        oncePerKey(tx, request('hundred'), async () => {
          effects += 1;
          await new Promise((next) => setTimeout(next, 50));
          return { status: 201, body: { effects } };
        }),
      );
    const results = await Promise.allSettled(Array.from({ length: 100 }, send));
    expect(effects).toBe(1);
    for (const result of results) {
      if (result.status === 'fulfilled')
        expect(result.value).toMatchObject({ status: 201, body: { effects: 1 } });
      else expect(kindOf(result.reason)).toBe('in-flight');
    }
    expect(await send()).toMatchObject({ replayed: true, body: { effects: 1 } });
  });

  it('that fails leaves the key free for another try', async () => {
    const fail = db.as(actor, (tx) =>
      oncePerKey(tx, request('fails'), async () => {
        throw new Error('half-way');
      }),
    );
    await expect(fail).rejects.toThrow('half-way');
    expect(await db.as(actor, (tx) => oncePerKey(tx, request('fails'), insert('27-0009')))).toMatchObject({
      replayed: false,
    });
  });

  it('is refused for another body, and forgotten after a day', async () => {
    await db.as(actor, (tx) => oncePerKey(tx, request('day'), insert('27-0010')));
    const other = db.as(actor, (tx) => oncePerKey(tx, request('day', { n: 2 }), insert('27-0011')));
    await expect(other).rejects.toMatchObject({ kind: 'key-reused' });
    db.clock.advance(24 * 3_600_000);
    const next = await db.as(actor, (tx) => oncePerKey(tx, request('day', { n: 2 }), insert('27-0011')));
    expect(next).toMatchObject({ replayed: false, body: { number: '27-0011' } });
  });
});

describe('a job', () => {
  const id = '11111111-1111-4111-8111-111111111111';
  const queued = async () =>
    (
      await db.owner.query<{ id: string }[]>('SELECT id FROM pgboss.job WHERE name = $1', [QUEUES.checkRun])
    ).map((row) => row.id);

  it('is queued with the transaction that causes it, or not at all', async () => {
    const undone = db.as(actor, async (tx) => {
      await enqueue(tx, QUEUES.checkRun, id);
      throw new Error('undone');
    });
    await expect(undone).rejects.toThrow('undone');
    expect(await queued()).toEqual([]);
    await db.as(actor, (tx) => enqueue(tx, QUEUES.checkRun, id));
    expect(await queued()).toEqual([id]);
  });

  it('is queued once, however often its cause comes up', async () => {
    await db.as(actor, (tx) => enqueue(tx, QUEUES.checkRun, id));
    expect(await queued()).toEqual([id]);
  });

  it('reaches a worker that owns nothing', async () => {
    const boss = new PgBoss({
      connectionString: roleUrl(db.ownerUrl, db.secret, 'worker'),
      migrate: false,
      schedule: false,
    });
    await boss.start();
    try {
      const jobs = await boss.fetch<{ id: string }>(QUEUES.checkRun);
      expect(jobs.map((job) => job.data)).toEqual([{ id }]);
      await boss.complete(QUEUES.checkRun, id);
      expect((await boss.getJobById(QUEUES.checkRun, id))?.state).toBe('completed');
    } finally {
      await boss.stop({ graceful: false });
    }
  });
});

describe('what is filed', () => {
  it.each(APPEND_ONLY_TABLES)(
    '%s: the serving roles may neither change nor delete a row, the owner neither',
    async (table) => {
      for (const role of ['web', 'worker'] as const) {
        const rights = await db.owner.query<Record<string, boolean>[]>(
          `SELECT has_table_privilege($1, $2, 'UPDATE') AS change, has_table_privilege($1, $2, 'DELETE') AS delete,
           has_table_privilege($1, $2, 'TRUNCATE') AS empty`,
          [`counterpoise_${role}`, table],
        );
        expect(rights).toEqual([{ change: false, delete: false, empty: false }]);
      }
      const triggers = await db.owner.query(
        `SELECT tgname FROM pg_trigger WHERE tgrelid = $1::regclass AND tgenabled = 'A' AND NOT tgisinternal ORDER BY 1`,
        [table],
      );
      expect(triggers).toEqual([{ tgname: `${table}_added_only` }, { tgname: `${table}_not_emptied` }]);
    },
  );

  it.each([NaN, Infinity, -Infinity])('holds no %s where a number stands', async (declared) => {
    const value = {
      runId: applicationId,
      lineKey: 'L1',
      circuit: 1,
      parameter: 'x1',
      orgId: actor.orgId,
      declared,
    };
    await expect(db.asSystem((tx) => tx.manager.insert(RunValue, value))).rejects.toThrow(
      /ck_run_values_declared/,
    );
  });

  it('has both bounds on every check of a floating-point column', async () => {
    const columns = await db.owner.query<{ table: string; column: string }[]>(`
      SELECT c.table_name AS table, c.column_name AS column FROM information_schema.columns c
      WHERE c.table_schema = 'public' AND c.data_type = 'double precision' ORDER BY 1, 2`);
    const checks = await db.owner.query<{ table: string; text: string }[]>(`
      SELECT conrelid::regclass::text AS table, pg_get_constraintdef(oid) AS text FROM pg_constraint
      WHERE contype = 'c' AND connamespace = 'public'::regnamespace`);
    expect(columns.length).toBeGreaterThan(10);
    for (const { table, column } of columns) {
      const texts = checks
        .filter((check) => check.table === table && check.text.includes(column))
        .map((check) => check.text);
      expect(texts.join(), `${table}.${column}`).toMatch(/<=/);
    }
  });
});
