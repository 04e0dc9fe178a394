import type { DataSource } from 'typeorm';
import { AuditEvent } from '../../entities/record.entities';
import { entryHash, FIRST_HASH } from './chain';

export type ChainVerdict =
  { whole: true; entries: number; lastHash: string } | { whole: false; seq: string; reason: string };

const PAGE = 1000;

function faultOf(event: AuditEvent, seq: bigint, prevHash: string): string | undefined {
  if (BigInt(event.seq) !== seq) return `entry ${seq} is missing`;
  if (event.prevHash !== prevHash) return 'it does not follow from the entry before';
  if (entryHash(event) !== event.hash) return 'its content does not match its hash';
  return undefined;
}

/** Walks the whole chain from the first entry and stops at the first that is broken. Needs the owner's connection. */
export async function verifyChain(owner: DataSource): Promise<ChainVerdict> {
  let seq = 0n;
  let prevHash = FIRST_HASH;
  for (;;) {
    const page = await owner.manager
      .createQueryBuilder(AuditEvent, 'event')
      .where('event.seq > :seq', { seq: String(seq) })
      .orderBy('event.seq')
      .limit(PAGE)
      .getMany();
    for (const event of page) {
      seq += 1n;
      const fault = faultOf(event, seq, prevHash);
      if (fault) return { whole: false, seq: event.seq, reason: fault };
      prevHash = event.hash;
    }
    if (page.length < PAGE) return { whole: true, entries: Number(seq), lastHash: prevHash };
  }
}
