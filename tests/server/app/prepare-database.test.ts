import { afterEach, beforeEach, describe, expect, it } from 'vitest';
import { prepareDatabase } from '#server/app/prepare-database';
import { ConfigError, makeConfig } from '#server/config/config';
import { User } from '#server/entities/people.entities';
import { DEMO_ACCOUNTS } from '#server/services/accounts/demo-accounts';
import { makeTestDatabase, type TestDatabase } from '../../support/test-database';

const NOW = new Date('2027-03-04T09:30:00Z');

let db: TestDatabase;
beforeEach(async () => {
  db = await makeTestDatabase();
});
afterEach(() => db.close());

const prepare = (demo: 'on' | 'off') =>
  prepareDatabase(makeConfig({ databaseUrl: db.ownerUrl, sessionSecret: db.secret, demo }), NOW);

const addPerson = (email: string) =>
  db.owner.manager.insert(User, { email, emailKey: email, displayName: 'R. Root', createdAt: NOW });

describe('a database that holds people already', () => {
  it('gets no demo, which would show their mail, where they are of a real set-up', async () => {
    await addPerson('root@eastmere.example');
    await expect(prepare('on')).rejects.toThrow(ConfigError);
    await expect(prepare('on')).rejects.toThrow('start with DEMO=off');
    expect(await prepare('off')).toEqual({ empty: false });
  });

  it('keeps its demo where they are the demo’s', async () => {
    await addPerson(DEMO_ACCOUNTS[0]?.email ?? '');
    expect(await prepare('on')).toEqual({ empty: false });
  });
});
