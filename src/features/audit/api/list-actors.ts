import { queryOptions, useQuery } from '@tanstack/react-query';
import { call } from '../../../lib/api/call';

export const actorsQuery = () =>
  queryOptions({
    queryKey: ['people', 'people'],
    queryFn: ({ signal }) => call('listPeople', { signal }),
    staleTime: 60_000,
  });

/** Everybody who may have done something, for the filter's list. */
export const useActors = () => useQuery(actorsQuery()).data?.items ?? [];
