import type { QueryClient } from '@tanstack/react-query';
import type { ListApplicationsRequest } from '#shared/contracts/api.generated';
import { applicationsQuery } from '../../features/applications/api/list-applications';
import { ApplicationsPage } from '../../features/applications/components/applications-page';
import { APPLICATIONS_LIST } from '../../features/applications/model/applications-list';
import { useSession } from '../../lib/api/session';
import { listQueryOf, readListView } from '../../lib/list-view';

export function prefetch(client: QueryClient, _: unknown, url: URL) {
  const query = listQueryOf(readListView(APPLICATIONS_LIST, url.searchParams)) as ListApplicationsRequest;
  return client.prefetchQuery(applicationsQuery(query));
}

export function Component() {
  const session = useSession();
  return session && <ApplicationsPage role={session.role} organisation={session.organisation.name} />;
}
