import { createHash } from 'node:crypto';
import type { EntityManager } from 'typeorm';
import { AuditEvent } from '../../entities/record.entities';
import { canonicalText } from './canonical';

/** Held from the first entry of a transaction to its commit: one chain, whatever runs at once. */
const CHAIN_LOCK = 7_201_002;
export const FIRST_HASH = '0'.repeat(64);

export type ChainedEvent = Omit<AuditEvent, 'hash'>;

/** The hash of one entry: everything it says and the hash of the entry before. */
export function entryHash(event: ChainedEvent): string {
  const { seq, orgId, applicationId, actorId, actorRole, actorName, act, before, after, at, prevHash } =
    event;
  const content = { seq, orgId, applicationId, actorId, actorRole, actorName, act, before, after, prevHash };
  return createHash('sha256')
    .update(canonicalText({ ...content, at: at.toISOString() }))
    .digest('hex');
}

/** Appends entries in the order given. The last thing of a transaction: the lock is held until it commits. */
export async function appendToChain(
  manager: EntityManager,
  events: readonly Omit<ChainedEvent, 'seq' | 'prevHash'>[],
): Promise<void> {
  await manager.query('SELECT pg_advisory_xact_lock($1)', [CHAIN_LOCK]);
  const [last] = await manager.query<{ seq: string; hash: string }[]>(
    'SELECT seq, hash FROM audit_events ORDER BY seq DESC LIMIT 1',
  );
  let seq = BigInt(last?.seq ?? 0);
  let prevHash = last?.hash ?? FIRST_HASH;
  for (const event of events) {
    seq += 1n;
    const chained = { ...event, seq: String(seq), prevHash };
    prevHash = entryHash(chained);
    await manager.insert(AuditEvent, { ...chained, hash: prevHash } as never);
  }
}
