import { queryOptions, useSuspenseQuery } from '@tanstack/react-query';
import { call } from '../api/call';

/** The bands, tolerances and assumptions in force: for the hints of the form and for its live check. */
export const rulesQuery = () =>
  queryOptions({
    queryKey: ['rules'],
    queryFn: ({ signal }) => call('getRules', { signal }),
    staleTime: 5 * 60_000,
  });

export const useRules = () => useSuspenseQuery(rulesQuery()).data;
