import { queryOptions, useSuspenseQuery } from '@tanstack/react-query';
import { call } from '../../../lib/api/call';

export const invitationsQuery = () =>
  queryOptions({
    queryKey: ['people', 'invitations'],
    queryFn: ({ signal }) => call('listInvitations', { signal }),
  });

/** Accounts that were asked for, and invitations. */
export const useInvitations = () => useSuspenseQuery(invitationsQuery()).data.items;
