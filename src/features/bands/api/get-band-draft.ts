import { queryOptions, useSuspenseQuery } from '@tanstack/react-query';
import { call } from '../../../lib/api/call';

export const bandDraftQuery = () =>
  queryOptions({
    queryKey: ['rules', 'draft'],
    queryFn: ({ signal }) => call('getBandDraft', { signal }),
  });

/** The draft of the next rule set: what an administrator works on. */
export const useBandDraft = () => useSuspenseQuery(bandDraftQuery()).data;
