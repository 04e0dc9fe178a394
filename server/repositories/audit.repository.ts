import type { EntityManager } from 'typeorm';
import { Application } from '../entities/case.entities';
import { AuditEvent } from '../entities/record.entities';
import type { AppAbility } from '../../shared/policies/subjects';
import { accessibleBy } from '../policies/accessible-by';

export interface AuditFilter {
  act?: string;
  actorId?: string;
  applicationNumber?: string;
  /** Entries before this place in the chain. */
  before?: string;
  limit: number;
}

export interface AuditRow {
  event: AuditEvent;
  applicationNumber: string | null;
}

/** Newest first; one row more than a page tells whether there is another. */
export async function readAuditTrail(
  manager: EntityManager,
  ability: AppAbility,
  filter: AuditFilter,
): Promise<AuditRow[]> {
  const { act, actorId, applicationNumber, before, limit } = filter;
  const query = manager
    .createQueryBuilder(AuditEvent, 'event')
    .leftJoin(Application, 'application', 'application.id = event.applicationId')
    .addSelect('application.number', 'application_number')
    .orderBy('event.seq', 'DESC')
    .limit(limit);
  accessibleBy(query, ability, 'read', 'AuditEvent');
  if (act) query.andWhere('starts_with(event.act, :act)', { act });
  if (actorId) query.andWhere('event.actorId = :actorId', { actorId });
  if (applicationNumber) query.andWhere('application.number = :applicationNumber', { applicationNumber });
  if (before) query.andWhere('event.seq < :before', { before });
  const { entities, raw } = await query.getRawAndEntities<{ application_number: string | null }>();
  return entities.map((event, i) => ({ event, applicationNumber: raw[i]?.application_number ?? null }));
}
