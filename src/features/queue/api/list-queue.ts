import { queryOptions, useQuery, useSuspenseQuery } from '@tanstack/react-query';
import { keepPreviousData } from '@tanstack/react-query';
import { call } from '../../../lib/api/call';
import { listQueryOf, type ListView } from '../../../lib/list-view';
import { queueKey } from '../../../lib/queries/case-key';
import type { QueueFilter } from '../model/queue-list';

const PAGE = '50';
/** Everything open at once, for the rule of due days and the lists of the filters. */
const OVERVIEW_LIMIT = '200';

export const queueQuery = (view: ListView<QueueFilter>) => {
  const query = { ...listQueryOf(view), limit: PAGE };
  return queryOptions({
    queryKey: [...queueKey(), 'page', query],
    queryFn: ({ signal }) => call('listQueue', { query, signal }),
    placeholderData: keepPreviousData,
    refetchInterval: 60_000,
  });
};

/** A page of the queue; while another page is on its way the last one stays. */
export const useQueue = (view: ListView<QueueFilter>) => useQuery(queueQuery(view));

export const queueOverviewQuery = () =>
  queryOptions({
    queryKey: [...queueKey(), 'overview'],
    queryFn: ({ signal }) => call('listQueue', { query: { limit: OVERVIEW_LIMIT, sort: 'due' }, signal }),
  });

/** The whole queue, whatever the filters. */
export const useQueueOverview = () => useSuspenseQuery(queueOverviewQuery()).data;
