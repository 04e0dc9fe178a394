import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { Application } from '#server/entities/case.entities';
import { asSystem } from '#server/database/transaction';
import { Note } from '#server/entities/review.entities';
import { makeTestDatabase } from '../../support/test-database';
import type { TestDatabase } from '../../support/test-database';
import { anOrganisation, aPerson } from '../../support/people';
import type { UserActor } from '../../support/people';

let db: TestDatabase;
let ours: UserActor;
let rival: UserActor;
let reviewer: UserActor;
let rivalCase: string;

async function anApplication(actor: UserActor, number: string): Promise<string> {
  return db.as(actor, async (tx) => {
    const made = await tx.manager.insert(Application, {
      orgId: actor.orgId,
      number,
      title: `Canary ${number}`,
      connectionKind: 'generation',
      createdBy: actor.userId,
    });
    return (made.identifiers[0] as { id: string }).id;
  });
}

beforeAll(async () => {
  db = await makeTestDatabase();
  await db.asSystem(async (tx) => {
    const owner = await anOrganisation(tx, { kind: 'owner' });
    ours = await aPerson(tx, await anOrganisation(tx), 'applicant');
    rival = await aPerson(tx, await anOrganisation(tx), 'applicant');
    reviewer = await aPerson(tx, owner, 'reviewer');
  });
  await anApplication(ours, '27-0001');
  rivalCase = await anApplication(rival, '27-0002');
});
afterAll(() => db.close());

describe('row security, the second wall', () => {
  it('shows an applicant the own rows only, even where a query forgets to ask', async () => {
    const seen = await db.as(ours, (tx) => tx.manager.find(Application));
    expect(seen.map((row) => row.number)).toEqual(['27-0001']);
  });

  it("neither reads, changes nor writes another organisation's rows", async () => {
    await db.as(ours, async (tx) => {
      expect(await tx.manager.findOneBy(Application, { id: rivalCase })).toBeNull();
      const result = await tx.manager.update(Application, { id: rivalCase }, { title: 'taken over' });
      expect(result.affected).toBe(0);
    });
    await expect(
      db.as(ours, (tx) =>
        tx.manager.insert(Application, {
          orgId: rival.orgId,
          number: '27-0003',
          title: 'smuggled in',
          connectionKind: 'generation',
          createdBy: ours.userId,
        }),
      ),
    ).rejects.toThrow(/row-level security/);
  });

  it("shows the owner's people all of them", async () => {
    const seen = await db.as(reviewer, (tx) => tx.manager.find(Application));
    expect(seen).toHaveLength(2);
  });

  it('shows nothing outside a transaction that says who acts', async () => {
    expect(await db.web.manager.find(Application)).toEqual([]);
  });

  it('does not leak the actor of one transaction into the next on the same connection', async () => {
    for (let i = 0; i < 20; i++) {
      await db.as(reviewer, (tx) => tx.manager.count(Application));
      expect(await db.web.manager.count(Application)).toBe(0);
    }
  });

  it('widens the sight for one look-up only, nested or failed', async () => {
    await db.as(ours, async (tx) => {
      const count = () => tx.manager.count(Application);
      const nested = await asSystem(tx, async () => {
        await asSystem(tx, count);
        return count();
      });
      expect(nested).toBe(2);
      expect(await count()).toBe(1);
      const failed = asSystem(tx, async () => {
        throw new Error('no');
      });
      await expect(failed).rejects.toThrow('no');
      expect(await count()).toBe(1);
    });
  });

  it('hides reviewers’ notes from the applicant they are about', async () => {
    await db.as(reviewer, (tx) =>
      tx.manager.insert(Note, {
        orgId: rival.orgId,
        applicationId: rivalCase,
        text: 'between us',
        writtenBy: reviewer.userId,
        writtenAt: tx.now,
      }),
    );
    expect(await db.as(rival, (tx) => tx.manager.find(Note))).toEqual([]);
    expect(await db.as(reviewer, (tx) => tx.manager.find(Note))).toHaveLength(1);
  });
});

describe('the catalogue', () => {
  it('has row security on every table with an organisation', async () => {
    const bare = await db.owner.query(`
      SELECT c.relname FROM pg_class c JOIN pg_attribute a ON a.attrelid = c.oid AND a.attname = 'org_id'
      WHERE c.relkind = 'r' AND c.relnamespace = 'public'::regnamespace AND NOT a.attisdropped
        AND (NOT c.relrowsecurity OR NOT EXISTS (SELECT 1 FROM pg_policy p WHERE p.polrelid = c.oid))`);
    expect(bare).toEqual([]);
  });

  it('lets the serving roles own nothing and pass no wall', async () => {
    const roles = await db.owner.query(`
      SELECT rolname, rolsuper, rolbypassrls, rolcreaterole, rolcreatedb,
        (SELECT count(*)::int FROM pg_class WHERE relowner = r.oid) AS owned
      FROM pg_roles r WHERE rolname LIKE 'counterpoise\\_%' ORDER BY rolname`);
    const none = { rolsuper: false, rolbypassrls: false, rolcreaterole: false, rolcreatedb: false, owned: 0 };
    expect(roles).toEqual([
      { rolname: 'counterpoise_web', ...none },
      { rolname: 'counterpoise_worker', ...none },
    ]);
  });

  it('is exactly what the entities describe', async () => {
    const drift = await db.owner.driver.createSchemaBuilder().log();
    expect(drift.upQueries.map((query) => query.query)).toEqual([]);
  });

  it('has no view and no function that runs with more rights than its caller', async () => {
    const found = await db.owner.query(`
      SELECT proname AS name FROM pg_proc WHERE prosecdef AND pronamespace = 'public'::regnamespace
      UNION ALL SELECT relname FROM pg_class WHERE relkind IN ('v', 'm') AND relnamespace = 'public'::regnamespace`);
    expect(found).toEqual([]);
  });
});
