import { queryOptions, useSuspenseQuery } from '@tanstack/react-query';
import { call } from '../../../lib/api/call';

export const peopleQuery = () =>
  queryOptions({
    queryKey: ['people', 'people'],
    queryFn: ({ signal }) => call('listPeople', { signal }),
  });

/** Everybody with an account. */
export const usePeople = () => useSuspenseQuery(peopleQuery()).data.items;
