import { randomBytes } from 'node:crypto';
import { existsSync, readdirSync } from 'node:fs';
import { join } from 'node:path';
import type { TestProject } from 'vitest/node';
import { addressOf, DATA_FOLDER, discard, start } from '../../server/scripts/postgres.mjs';
import { makeDataSource } from '../../server/database/data-source';
import { seedBaseline } from '../../server/database/seeds/baseline';
import { migrate } from '../../server/database/migrate';
import { createDatabase } from './databases';

declare module 'vitest' {
  export interface ProvidedContext {
    postgres: TestCluster;
  }
}

export interface TestCluster {
  /** Address of the cluster's own database, as its owner. */
  ownerUrl: string;
  /** The migrated database that each test file's own is cloned from. */
  template: string;
  secret: string;
}

const PREFIX = 'test-';

function isAlive(pid: number): boolean {
  try {
    process.kill(pid, 0);
    return true;
  } catch {
    return false;
  }
}

/** A run that was killed leaves its cluster behind. */
async function discardOrphans(): Promise<void> {
  if (!existsSync(DATA_FOLDER)) return;
  for (const name of readdirSync(DATA_FOLDER).filter((entry) => /^test-\d+(-\w+)?$/.test(entry))) {
    const pid = Number(name.split('-')[1]);
    if (!isAlive(pid)) await discard({ folder: join(DATA_FOLDER, name) });
  }
}

/** What every installation begins with: rules, conductors, a calendar. */
async function layBaseline(url: string): Promise<void> {
  const owner = makeDataSource(url, 'owner');
  await owner.initialize();
  const now = new Date('2027-01-04T08:00:00.000Z');
  await owner.transaction((manager) => seedBaseline(manager, { now, timeZone: 'UTC' }));
  await owner.destroy();
}

/** A throw-away cluster for this run, with one migrated database to clone. Durability is off: nothing is kept. */
export default async function setup(project: TestProject): Promise<() => Promise<void>> {
  await discardOrphans();
  const folder = join(DATA_FOLDER, `${PREFIX}${process.pid}-${project.name}`);
  const cluster = await start({ folder, fast: true });
  const ownerUrl = addressOf(cluster, 'postgres');
  const template = 'counterpoise_template';
  const secret = randomBytes(32).toString('base64url');
  await createDatabase(ownerUrl, template);
  await migrate(addressOf(cluster, template), secret);
  await layBaseline(addressOf(cluster, template));
  project.provide('postgres', { ownerUrl, template, secret });
  return () => discard({ folder });
}
