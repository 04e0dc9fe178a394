import { queryOptions, useSuspenseQuery } from '@tanstack/react-query';
import { call } from '../../../lib/api/call';
import { countersignsKey } from '../../../lib/queries/case-key';

export const pendingCountersignsQuery = () =>
  queryOptions({
    queryKey: [...countersignsKey(), 'pending'],
    queryFn: ({ signal }) => call('listCountersigns', { query: { outcome: 'pending' }, signal }),
  });

/** Proposals that wait for a second reviewer. */
export const usePendingCountersigns = () => useSuspenseQuery(pendingCountersignsQuery()).data.items;
