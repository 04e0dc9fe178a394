import { createMongoAbility } from '@casl/ability';
import type { RawRuleOf } from '@casl/ability';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { defineAbility } from '#shared/policies/ability';
import type { AppAbility } from '#shared/policies/subjects';
import { Application } from '#server/entities/case.entities';
import { accessibleBy } from '#server/policies/accessible-by';
import { anOrganisation, aPerson } from '../../support/people';
import type { UserActor } from '../../support/people';
import { makeTestDatabase } from '../../support/test-database';
import type { TestDatabase } from '../../support/test-database';

let db: TestDatabase;
let people: UserActor[];
let rows: Application[];

beforeAll(async () => {
  db = await makeTestDatabase();
  await db.asSystem(async (tx) => {
    const owner = await anOrganisation(tx, { kind: 'owner' });
    const orgs = [await anOrganisation(tx), await anOrganisation(tx), await anOrganisation(tx)];
    const applicants = [];
    for (const org of orgs) applicants.push(await aPerson(tx, org, 'applicant'));
    const barred = {
      ...(await aPerson(tx, owner, 'reviewer')),
      barredOrgIds: [orgs[0]?.id ?? '', orgs[2]?.id ?? ''],
    };
    people = [
      ...applicants,
      await aPerson(tx, owner, 'reviewer'),
      barred,
      await aPerson(tx, owner, 'administrator'),
    ];
    let number = 0;
    for (const { orgId, userId } of applicants) {
      for (const firstFiledAt of [null, new Date('2027-01-05T10:00:00Z'), new Date('2027-02-05T10:00:00Z')]) {
        for (const title of ['plain', 'it\'s "quoted" %']) {
          number += 1;
          const text = `27-${String(number).padStart(4, '0')}`;
          const row = { orgId, number: text, title, connectionKind: 'load', createdBy: userId, firstFiledAt };
          await tx.manager.insert(Application, { ...row, capacityMw: number % 2 ? null : number });
        }
      }
    }
  });
  rows = await db.owner.manager.find(Application, { order: { number: 'ASC' } });
});
afterAll(() => db.close());

const record = (row: Application) => ({ ...row, kind: 'Application' as const });

async function found(ability: AppAbility, action: 'read' | 'review' | 'update'): Promise<string[]> {
  const query = db.owner.manager.createQueryBuilder(Application, 'application').orderBy('application.number');
  return (await accessibleBy(query, ability, action, 'Application').getMany()).map((row) => row.number);
}

describe('the where-clause of an ability', () => {
  it.each(['read', 'review', 'update'] as const)(
    'finds exactly the rows that the ability allows to %s, for every role',
    async (action) => {
      const seen = new Set<number>();
      for (const person of people) {
        const ability = defineAbility(person);
        const allowed = rows.filter((row) => ability.can(action, record(row))).map((row) => row.number);
        expect(await found(ability, action), `${person.role} ${person.barredOrgIds.length}`).toEqual(allowed);
        seen.add(allowed.length);
      }
      // Roles differ here, or the comparison would say nothing.
      expect(seen.size).toBeGreaterThan(1);
    },
  );

  it('finds nothing for nobody', async () => {
    expect(await found(defineAbility(null), 'read')).toEqual([]);
  });

  const abilityOf = (rules: object[]) =>
    createMongoAbility<AppAbility>(rules as RawRuleOf<AppAbility>[], {
      detectSubjectType: (subject) => (subject as { kind: 'Application' }).kind,
    });

  it.each([
    ['equal', { title: 'it\'s "quoted" %' }],
    ['not equal, with nulls', { capacityMw: { $ne: 4 } }],
    ['null', { capacityMw: null }],
    ['not null', { capacityMw: { $ne: null } }],
    ['one of', { number: { $in: ['27-0001', '27-0018'] } }],
    ['one of none', { number: { $in: [] } }],
    ['none of', { capacityMw: { $nin: [2, 4] } }],
    ['two fields', { title: 'plain', capacityMw: { $ne: null } }],
  ])('agrees with the check of an object: %s', async (_name, conditions) => {
    for (const inverted of [false, true]) {
      const rules = inverted
        ? [
            { action: 'read', subject: 'Application' },
            { action: 'read', subject: 'Application', conditions, inverted },
          ]
        : [{ action: 'read', subject: 'Application', conditions }];
      const ability = abilityOf(rules);
      const allowed = rows.filter((row) => ability.can('read', record(row))).map((row) => row.number);
      expect(await found(ability, 'read'), String(inverted)).toEqual(allowed);
    }
  });

  it('refuses a field and an operator that it cannot turn into SQL', async () => {
    const unknown = abilityOf([{ action: 'read', subject: 'Application', conditions: { nothing: 1 } }]);
    await expect(found(unknown, 'read')).rejects.toThrow(/no column nothing/);
    for (const condition of [{ $regex: 'p' }, { $lt: 'p' }, { $gte: 'p' }, { $exists: true }]) {
      const odd = abilityOf([{ action: 'read', subject: 'Application', conditions: { title: condition } }]);
      await expect(found(odd, 'read'), JSON.stringify(condition)).rejects.toThrow(/no SQL form/);
    }
  });
});
