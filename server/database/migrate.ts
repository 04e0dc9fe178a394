import { prepareJobQueue } from './job-queue-schema';
import { makeDataSource } from './data-source';
import { ensureRoles } from './roles';

/** Any constant does; it only has to differ from the audit chain's. */
const MIGRATION_LOCK = 7_201_001;

/** Brings the database to the present shape. Two servers starting together take turns. */
export async function migrate(ownerUrl: string, secret: string): Promise<void> {
  const owner = makeDataSource(ownerUrl, 'owner');
  await owner.initialize();
  const lock = owner.createQueryRunner();
  try {
    await lock.query('SET lock_timeout = 60000');
    await lock.query('SELECT pg_advisory_lock($1)', [MIGRATION_LOCK]);
    await ensureRoles(lock, secret);
    await owner.runMigrations({ transaction: 'all' });
    await prepareJobQueue(ownerUrl, lock);
  } finally {
    // Ending the session gives the lock back, whatever happened.
    await lock.release();
    await owner.destroy();
  }
}
