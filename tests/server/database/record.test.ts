import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { AuditEvent } from '#server/entities/record.entities';
import { recordEvent } from '#server/database/audit/record-event';
import { verifyChain } from '#server/database/audit/verify-chain';
import { makeTestDatabase } from '../../support/test-database';
import type { TestDatabase } from '../../support/test-database';
import { anOrganisation, aPerson } from '../../support/people';
import type { UserActor } from '../../support/people';

let db: TestDatabase;
let ours: UserActor;
let rival: UserActor;

const note = (actor: UserActor, act: string) =>
  db.as(actor, async (tx) =>
    recordEvent(tx, { act, orgId: actor.orgId, after: { z: 1, a: [0.1, null, 'ü'] } }),
  );

beforeAll(async () => {
  db = await makeTestDatabase();
  await db.asSystem(async (tx) => {
    ours = await aPerson(tx, await anOrganisation(tx), 'applicant');
    rival = await aPerson(tx, await anOrganisation(tx), 'applicant');
  });
});
afterAll(() => db.close());

describe('the audit chain', () => {
  it('stays one chain under writes at once from several organisations', async () => {
    await Promise.all(Array.from({ length: 40 }, (_, i) => note(i % 2 ? ours : rival, `test.number-${i}`)));
    const verdict = await verifyChain(db.owner);
    expect(verdict).toMatchObject({ whole: true, entries: 40 });
  });

  it('writes nothing of a transaction that fails', async () => {
    const before = await db.owner.manager.count(AuditEvent);
    await expect(
      db.as(ours, async (tx) => {
        recordEvent(tx, { act: 'test.undone', orgId: ours.orgId });
        throw new Error('half-way');
      }),
    ).rejects.toThrow('half-way');
    expect(await db.owner.manager.count(AuditEvent)).toBe(before);
  });

  it('shows an applicant the own entries only', async () => {
    const seen = await db.as(ours, (tx) => tx.manager.find(AuditEvent));
    expect(seen).toHaveLength(20);
    expect(new Set(seen.map((event) => event.orgId))).toEqual(new Set([ours.orgId]));
  });

  it.each([
    ['web', 'UPDATE audit_events SET act = $1', ['changed']],
    ['web', 'DELETE FROM audit_events WHERE act <> $1', ['']],
    ['owner', 'UPDATE audit_events SET act = $1', ['changed']],
    ['owner', 'DELETE FROM audit_events WHERE act <> $1', ['']],
  ] as const)('refuses the %s role: %s', async (role, statement, values) => {
    await expect(db[role].query(statement, [...values])).rejects.toThrow(/permission denied|only ever added/);
  });

  it('refuses to be emptied, also in replica mode', async () => {
    await expect(db.owner.query('TRUNCATE audit_events')).rejects.toThrow(/only ever added/);
    await expect(
      db.owner.transaction(async (manager) => {
        await manager.query('SET LOCAL session_replication_role = replica');
        await manager.query(`UPDATE audit_events SET act = 'changed'`);
      }),
    ).rejects.toThrow(/only ever added/);
  });

  /** What only somebody with the keys to the database can do: the chain has to show it afterwards. */
  async function tamper(statement: string): Promise<void> {
    await db.owner.query('ALTER TABLE audit_events DISABLE TRIGGER USER');
    await db.owner.query(statement);
    await db.owner.query('ALTER TABLE audit_events ENABLE ALWAYS TRIGGER audit_events_added_only');
  }

  it('shows a changed entry, and the entry it is', async () => {
    await tamper(`UPDATE audit_events SET after = '{"a":[0.1,null,"ü"],"z":2}' WHERE seq = 17`);
    expect(await verifyChain(db.owner)).toEqual({
      whole: false,
      seq: '17',
      reason: 'its content does not match its hash',
    });
    await tamper(`UPDATE audit_events SET after = '{"a":[0.1,null,"ü"],"z":1}' WHERE seq = 17`);
    expect(await verifyChain(db.owner)).toMatchObject({ whole: true });
  });

  it('shows a deleted entry', async () => {
    await tamper('DELETE FROM audit_events WHERE seq = 25');
    expect(await verifyChain(db.owner)).toMatchObject({ whole: false, reason: 'entry 25 is missing' });
  });
});
