import { queryOptions, useSuspenseQuery } from '@tanstack/react-query';
import { call } from '../../../lib/api/call';

/** What may be known before anybody is signed in: whose product this is, whether it is set up, whether it is the demo. */
export const frontDoorQuery = () =>
  queryOptions({
    queryKey: ['front-door'],
    queryFn: ({ signal }) => call('getSession', { signal }),
    select: ({ gridOwner, demo, setUpNeeded }) => ({ gridOwner, demo, setUpNeeded }),
    staleTime: 60_000,
  });

export const useFrontDoor = () => useSuspenseQuery(frontDoorQuery()).data;
