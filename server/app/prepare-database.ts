import { createHmac } from 'node:crypto';
import { ConfigError } from '../config/config';
import type { Config } from '../config/config';
import { migrate } from '../database/migrate';
import { makeDataSource } from '../database/data-source';
import { seedBaseline } from '../database/seeds/baseline';
import { holdsDemo, seedDemo } from '../database/seeds/demo';
import { User } from '../entities/people.entities';

/** The owner's calendar until an administrator sets another. */
const FIRST_TIME_ZONE = 'UTC';

export interface Prepared {
  /** Whether there is anybody at all. */
  empty: boolean;
}

/** Migrates, lays what every installation begins with (rules, conductors, a calendar), and plays the demo once. */
export async function prepareDatabase(config: Config, now: Date): Promise<Prepared> {
  const { databaseUrl, sessionSecret, demo, publicUrl } = config;
  await migrate(databaseUrl, sessionSecret);
  const owner = makeDataSource(databaseUrl, 'owner');
  await owner.initialize();
  try {
    await owner.transaction((manager) => seedBaseline(manager, { now, timeZone: FIRST_TIME_ZONE }));
    // The demo shows everybody's mail: never over people who are not invented.
    if (demo && !(await seedDemo(owner, publicUrl, now)) && !(await holdsDemo(owner)))
      throw new ConfigError([
        'DEMO is on, but the database holds people of a real set-up: start with DEMO=off.',
      ]);
    return { empty: !(await owner.manager.exists(User)) };
  } finally {
    await owner.destroy();
  }
}

/** The word that opens the first-run set-up: the same on every node, known to who sees the server's output. */
export function setUpTokenOf(secret: string): string {
  return createHmac('sha256', secret).update('first-run set-up').digest('base64url');
}
