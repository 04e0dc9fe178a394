import { LessThan } from 'typeorm';
import { system } from '../database/actor';
import { inTransaction } from '../database/transaction';
import { IdempotencyKey } from '../entities/file.entities';
import { RateLimit, StoredSession } from '../entities/people.entities';
import type { Surroundings } from '../integrations/surroundings';

const DAY_MS = 24 * 60 * 60 * 1000;

/** Clears away what has run out: sessions, kept answers, counters. Nothing of a case is ever swept. */
export async function sweep(surroundings: Surroundings): Promise<void> {
  await inTransaction(surroundings, system('sweeper'), async ({ manager, now }) => {
    await manager.delete(StoredSession, { expire: LessThan(now) });
    await manager.delete(IdempotencyKey, { createdAt: LessThan(new Date(now.getTime() - DAY_MS)) });
    await manager.delete(RateLimit, { expire: LessThan(String(now.getTime())) });
  });
}
