import type { AuditEvent as AuditAnswer } from '../../shared/contracts/api.generated';
import type { AuditRow } from '../repositories/audit.repository';

export function presentAuditEvent({ event, applicationNumber }: AuditRow): AuditAnswer {
  const { seq, at, act, actorName, actorRole, before, after, hash } = event;
  return {
    seq: Number(seq),
    at: at.toISOString(),
    act,
    actor: actorName,
    actorRole,
    applicationNumber,
    before,
    after,
    hash,
  };
}
