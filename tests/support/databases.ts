import { randomBytes } from 'node:crypto';
import pg from 'pg';

async function asOwner(ownerUrl: string, statement: string): Promise<void> {
  const client = new pg.Client({ connectionString: ownerUrl });
  await client.connect();
  try {
    await client.query(statement);
  } finally {
    await client.end();
  }
}

export function urlOf(ownerUrl: string, database: string): string {
  const url = new URL(ownerUrl);
  url.pathname = `/${database}`;
  return url.href;
}

/** Names come from the tests themselves, so they may stand in the statement. */
export async function createDatabase(ownerUrl: string, name: string, template?: string): Promise<string> {
  await asOwner(ownerUrl, `CREATE DATABASE ${name}${template ? ` TEMPLATE ${template}` : ''}`);
  return urlOf(ownerUrl, name);
}

export async function dropDatabase(ownerUrl: string, name: string): Promise<void> {
  await asOwner(ownerUrl, `DROP DATABASE IF EXISTS ${name} WITH (FORCE)`);
}

export const randomDatabaseName = () => `test_${randomBytes(6).toString('hex')}`;
