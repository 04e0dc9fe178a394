import type { EntityManager } from 'typeorm';
import { AuditEvent } from '../entities/record.entities';

/** The audit trail of one application, oldest first; one more than asked for tells that more happened. */
export async function eventsOf(
  manager: EntityManager,
  applicationId: string,
  limit: number,
): Promise<AuditEvent[]> {
  return manager.find(AuditEvent, { where: { applicationId }, order: { seq: 'ASC' }, take: limit });
}
