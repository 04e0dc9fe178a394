import { LessThan } from 'typeorm';
import { system } from '../database/actor';
import { inTransaction } from '../database/transaction';
import { IdempotencyKey } from '../entities/file.entities';
import { RateLimit, StoredSession } from '../entities/people.entities';
import type { Surroundings } from '../integrations/surroundings';

const DAY_MS = 24 * 60 * 60 * 1000;

/**
 * Runs that no job stands behind any more, as when a worker has died at each try: they are told to have failed, so that
 * a reviewer can ask for another check. A job that is only late is left alone.
 */
const ABANDONED = `UPDATE check_runs r SET status = 'failed', finished_at = $1,
    failure = 'The check did not come to its end. A reviewer can ask for another one.'
  WHERE r.status IN ('queued', 'running') AND NOT EXISTS (
    SELECT 1 FROM pgboss.job j WHERE j.id = r.id AND j.state IN ('created', 'retry', 'active'))`;

/** Clears away what has run out: sessions, kept answers, counters. Nothing of a case is ever swept. */
export async function sweep(surroundings: Surroundings): Promise<void> {
  await inTransaction(surroundings, system('sweeper'), async ({ manager, now }) => {
    await manager.delete(StoredSession, { expire: LessThan(now) });
    await manager.delete(IdempotencyKey, { createdAt: LessThan(new Date(now.getTime() - DAY_MS)) });
    await manager.delete(RateLimit, { expire: LessThan(String(now.getTime())) });
    await manager.query(ABANDONED, [now]);
  });
}
