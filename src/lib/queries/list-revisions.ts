import { queryOptions, useQuery } from '@tanstack/react-query';
import { call } from '../api/call';
import { caseKey } from './case-key';

/** The revisions that were filed, newest first. */
export const revisionsQuery = (number: string) =>
  queryOptions({
    queryKey: [...caseKey(number), 'revisions'],
    queryFn: ({ signal }) => call('listRevisions', { params: { applicationId: number }, signal }),
  });

export const useRevisions = (number: string) => useQuery(revisionsQuery(number));
