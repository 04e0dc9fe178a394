import { keepPreviousData, queryOptions, useQuery } from '@tanstack/react-query';
import type { ListAuditEventsRequest } from '#shared/contracts/api.generated';
import { call } from '../../../lib/api/call';
import { listQueryOf, type ListSpec, type ListView } from '../../../lib/list-view';

export const AUDIT_FILTERS = ['act', 'actor', 'application'] as const;
export type AuditFilter = (typeof AUDIT_FILTERS)[number];
/** The trail has one order: newest first. */
export const AUDIT_LIST: ListSpec<AuditFilter> = { filters: AUDIT_FILTERS, sort: 'newest' };

const WHOLE_NUMBER = /^\d{2}-\d{4}$/;

/** What the server is asked: a number only once it is written out, and no order, since there is one. */
export function auditRequest(view: ListView<AuditFilter>): ListAuditEventsRequest {
  const { sort: _one, ...asked } = listQueryOf(view);
  const { 'filter[application]': number = '', ...others } = asked;
  return {
    ...others,
    ...(WHOLE_NUMBER.test(number) ? { 'filter[application]': number } : {}),
    limit: '50',
  };
}

export const auditQuery = (view: ListView<AuditFilter>) => {
  const query = auditRequest(view);
  return queryOptions({
    queryKey: ['audit-events', query],
    queryFn: ({ signal }) => call('listAuditEvents', { query, signal }),
    placeholderData: keepPreviousData,
  });
};

/** A page of the audit trail. */
export const useAuditEvents = (view: ListView<AuditFilter>) => useQuery(auditQuery(view));
