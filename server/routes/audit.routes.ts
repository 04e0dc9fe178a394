import { route } from './route';
import { Problem } from '../errors/problem';
import { presentAuditEvent } from '../presenters/audit.presenter';
import { readAuditTrail } from '../repositories/audit.repository';

const PAGE = 50;

function placeOf(cursor: string | undefined): string | undefined {
  if (cursor !== undefined && !/^\d{1,18}$/.test(cursor)) {
    throw new Problem('invalid-request', { detail: 'The cursor is not one that this list gave.' });
  }
  return cursor;
}

/** The audit trail, for administrators. */
export const auditRoutes = [
  route('listAuditEvents', {
    summary: 'The audit trail, newest first',
    access: { can: 'read', on: 'AuditEvent' },
    answers: { 200: 'audit-event-list' },
    handler: async ({ tx, ability, query }) => {
      const limit = Number(query.limit ?? PAGE);
      const rows = await readAuditTrail(tx.manager, ability, {
        act: query['filter[act]'],
        actorId: query['filter[actor]'],
        applicationNumber: query['filter[application]'],
        before: placeOf(query.cursor),
        limit: limit + 1,
      });
      const items = rows.slice(0, limit).map(presentAuditEvent);
      return { items, next: rows.length > limit ? String(items.at(-1)?.seq) : null };
    },
  }),
];
