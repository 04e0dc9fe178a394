import { queryOptions, useSuspenseQuery } from '@tanstack/react-query';
import { call } from '../api/call';

/** The conductor library. */
export const conductorsQuery = () =>
  queryOptions({
    queryKey: ['conductors'],
    queryFn: ({ signal }) => call('listConductors', { signal }),
    staleTime: 5 * 60_000,
  });

export const useConductors = () => useSuspenseQuery(conductorsQuery()).data;
