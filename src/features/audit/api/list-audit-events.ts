import { keepPreviousData, queryOptions, useQuery } from '@tanstack/react-query';
import type { ListAuditEventsRequest } from '#shared/contracts/api.generated';
import { call } from '../../../lib/api/call';
import { listQueryOf, type ListSpec, type ListView } from '../../../lib/list-view';

export const AUDIT_FILTERS = ['act', 'actor', 'application'] as const;
export type AuditFilter = (typeof AUDIT_FILTERS)[number];
/** The trail has one order: newest first. */
export const AUDIT_LIST: ListSpec<AuditFilter> = { filters: AUDIT_FILTERS, sort: 'newest' };

export const auditQuery = (view: ListView<AuditFilter>) => {
  const { sort: _one, ...asked } = listQueryOf(view);
  const query: ListAuditEventsRequest = { ...asked, limit: '50' };
  return queryOptions({
    queryKey: ['audit-events', query],
    queryFn: ({ signal }) => call('listAuditEvents', { query, signal }),
    placeholderData: keepPreviousData,
  });
};

/** A page of the audit trail. */
export const useAuditEvents = (view: ListView<AuditFilter>) => useQuery(auditQuery(view));
