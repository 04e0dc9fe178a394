import type { QueryClient } from '@tanstack/react-query';
import { pendingCountersignsQuery } from '../../features/countersigns/api/list-countersigns';
import { PendingCountersigns } from '../../features/countersigns/components/countersign-sheet';
import { queueOverviewQuery, queueQuery } from '../../features/queue/api/list-queue';
import { QueuePage } from '../../features/queue/components/queue-page';
import { QUEUE_LIST } from '../../features/queue/model/queue-list';
import { readListView } from '../../lib/list-view';
import { calendarQuery } from '../../lib/queries/get-calendar';

export function prefetch(client: QueryClient, _params: unknown, url: URL) {
  return Promise.all([
    client.prefetchQuery(queueOverviewQuery()),
    client.prefetchQuery(calendarQuery()),
    client.prefetchQuery(queueQuery(readListView(QUEUE_LIST, url.searchParams))),
    client.prefetchQuery(pendingCountersignsQuery()),
  ]);
}

export function Component() {
  return <QueuePage aside={<PendingCountersigns />} />;
}
