import type { DataSource } from 'typeorm';
import { inject } from 'vitest';
import { makeDataSource } from '#server/database/data-source';
import { roleUrl } from '#server/database/roles';
import { inTransaction } from '#server/database/transaction';
import type { Transaction } from '#server/database/transaction';
import type { Surroundings } from '#server/integrations/surroundings';
import { makeJobQueue } from '#server/integrations/job-queue';
import { standInVirusScan } from '#server/integrations/virus-scan';
import { inlineChecker } from './inline-checker';
import { system } from '#server/database/actor';
import type { Actor } from '#server/database/actor';
import { createDatabase, dropDatabase, randomDatabaseName } from './databases';

/** A clock that stands still until a test moves it. */
export class TestClock {
  private instant = new Date('2027-03-01T09:00:00.000Z');
  now(): Date {
    return new Date(this.instant);
  }
  set(iso: string): void {
    this.instant = new Date(iso);
  }
  advance(ms: number): void {
    this.instant = new Date(this.instant.getTime() + ms);
  }
}

export interface TestDatabase {
  ownerUrl: string;
  secret: string;
  /** Connected as the role that serves requests. */
  web: DataSource;
  worker: DataSource;
  /** Connected as the owner, who passes all walls: for arranging and looking, never for what is tested. */
  owner: DataSource;
  clock: TestClock;
  surroundings: Surroundings;
  /** One transaction as somebody, through the same door as the product's. */
  as<T>(actor: Actor, work: (tx: Transaction) => Promise<T>): Promise<T>;
  asSystem<T>(work: (tx: Transaction) => Promise<T>): Promise<T>;
  close(): Promise<void>;
}

/** A database of one's own, cloned from the migrated template. */
export async function makeTestDatabase(): Promise<TestDatabase> {
  const cluster = inject('postgres');
  const name = randomDatabaseName();
  const ownerUrl = await createDatabase(cluster.ownerUrl, name, cluster.template);
  const connect = (role: 'web' | 'worker') => makeDataSource(roleUrl(ownerUrl, cluster.secret, role), role);
  const web = connect('web');
  const worker = connect('worker');
  const owner = makeDataSource(ownerUrl, 'owner');
  await Promise.all([web.initialize(), worker.initialize(), owner.initialize()]);
  const clock = new TestClock();
  const surroundings: Surroundings = {
    dataSource: web,
    tools: {
      clock,
      jobs: makeJobQueue(),
      virusScan: standInVirusScan,
      checker: inlineChecker,
      publicUrl: new URL('http://127.0.0.1:8080'),
      demo: false,
    },
  };
  return {
    ownerUrl,
    secret: cluster.secret,
    web,
    worker,
    owner,
    clock,
    surroundings,
    as: (actor, work) => inTransaction(surroundings, actor, work),
    asSystem: (work) => inTransaction(surroundings, system('test'), work),
    close: async () => {
      await Promise.all(
        [web.destroy(), worker.destroy(), owner.destroy()].map((end) => end.catch(() => undefined)),
      );
      await dropDatabase(cluster.ownerUrl, name);
    },
  };
}
