import type { QueryClient } from '@tanstack/react-query';
import { AUDIT_LIST, auditQuery } from '../../features/audit/api/list-audit-events';
import { AuditPage } from '../../features/audit/components/audit-page';
import { readListView } from '../../lib/list-view';

export const prefetch = (client: QueryClient, _params: unknown, url: URL) =>
  client.prefetchQuery(auditQuery(readListView(AUDIT_LIST, url.searchParams)));

export const Component = AuditPage;
