import { actorRole } from '../actor';
import type { Transaction } from '../transaction';

export interface AuditEntry {
  /** `application.filed`, `bands.published` …: noun and past participle. */
  act: string;
  /** The organisation whose case it concerns; leave out for what concerns the owner alone. */
  orgId?: string | null;
  applicationId?: string | null;
  before?: unknown;
  after?: unknown;
}

const plain = (value: unknown): unknown => (value === undefined ? null : JSON.parse(JSON.stringify(value)));

/** Notes what happened; it is written to the chain when the transaction commits, or not at all. */
export function recordEvent(tx: Transaction, entry: AuditEntry): void {
  const { actor } = tx;
  tx.events.push({
    orgId: entry.orgId ?? null,
    applicationId: entry.applicationId ?? null,
    actorId: actor.kind === 'user' ? actor.userId : null,
    actorRole: actorRole(actor),
    actorName: actor.name,
    act: entry.act,
    before: plain(entry.before),
    after: plain(entry.after),
    at: tx.now,
  });
}
