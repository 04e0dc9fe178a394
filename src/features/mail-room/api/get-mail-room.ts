import { queryOptions, useSuspenseQuery } from '@tanstack/react-query';
import { call } from '../../../lib/api/call';

/** The mails that the demo's own mail server took in, newest first; looked into again every few seconds. */
export const mailRoomQuery = () =>
  queryOptions({
    queryKey: ['mail-room'],
    queryFn: ({ signal }) => call('getMailRoom', { signal }),
    refetchInterval: 5000,
  });

export const useMailRoom = () => useSuspenseQuery(mailRoomQuery()).data.items;
