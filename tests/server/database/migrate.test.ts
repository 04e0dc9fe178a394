import pg from 'pg';
import { afterAll, describe, expect, inject, it } from 'vitest';
import { makeDataSource } from '#server/database/data-source';
import { migrate } from '#server/database/migrate';
import { roleUrl } from '#server/database/roles';
import { verifyChain } from '#server/database/audit/verify-chain';
import { createDatabase, dropDatabase, randomDatabaseName, urlOf } from '../../support/databases';

const cluster = inject('postgres');
const names: string[] = [];
afterAll(async () => {
  for (const name of names) await dropDatabase(cluster.ownerUrl, name);
});

async function asClusterOwner(statement: string): Promise<void> {
  const client = new pg.Client({ connectionString: cluster.ownerUrl });
  await client.connect();
  await client.query(statement);
  await client.end();
}

describe('migrating', () => {
  it('lets two servers that start together take turns', async () => {
    const name = randomDatabaseName();
    names.push(name);
    const url = await createDatabase(cluster.ownerUrl, name);
    await Promise.all([migrate(url, cluster.secret), migrate(url, cluster.secret)]);
    const owner = makeDataSource(url, 'owner');
    await owner.initialize();
    const done = await owner.query<{ name: string }[]>('SELECT name FROM migrations');
    expect(new Set(done.map((row) => row.name)).size).toBe(done.length);
    expect(await verifyChain(owner)).toMatchObject({ whole: true, entries: 0 });
    await owner.destroy();
  });

  it('works for an owner who is no superuser, and the walls stand there too', async () => {
    const name = randomDatabaseName();
    names.push(name);
    await asClusterOwner(`CREATE ROLE plain_owner LOGIN CREATEROLE PASSWORD 'plain'`);
    await asClusterOwner(`CREATE DATABASE ${name} OWNER plain_owner`);
    const url = new URL(urlOf(cluster.ownerUrl, name));
    url.username = 'plain_owner';
    url.password = 'plain';
    await migrate(url.href, cluster.secret);
    await migrate(url.href, cluster.secret);
    const web = makeDataSource(roleUrl(url.href, cluster.secret, 'web'), 'web');
    await web.initialize();
    expect(await web.query('SELECT count(*)::int AS n FROM applications')).toEqual([{ n: 0 }]);
    await expect(web.query('DELETE FROM audit_events')).rejects.toThrow(/permission denied/);
    await expect(web.query('CREATE TABLE mine (a int)')).rejects.toThrow(/permission denied/);
    await expect(web.query('SET ROLE plain_owner')).rejects.toThrow(/permission denied/);
    await web.destroy();
  });

  it('says what is missing when the owner may not make roles', async () => {
    const name = randomDatabaseName();
    names.push(name);
    await asClusterOwner(`CREATE ROLE bare_owner LOGIN PASSWORD 'bare'`);
    await asClusterOwner(`CREATE DATABASE ${name} OWNER bare_owner`);
    const url = new URL(urlOf(cluster.ownerUrl, name));
    url.username = 'bare_owner';
    url.password = 'bare';
    await expect(migrate(url.href, cluster.secret)).rejects.toThrow(/CREATEROLE/);
  });
});
