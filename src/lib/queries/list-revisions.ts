import { queryOptions, useSuspenseQuery } from '@tanstack/react-query';
import type { RevisionList } from '#shared/contracts/api.generated';
import { call } from '../api/call';
import { caseKey } from './case-key';

export const revisionsQuery = (number: string) =>
  queryOptions({
    queryKey: [...caseKey(number), 'revisions'],
    queryFn: ({ signal }): Promise<RevisionList> =>
      call('listRevisions', { params: { applicationId: number }, signal }),
  });

/** The revisions that were filed, newest first. */
export function useRevisions(number: string): RevisionList {
  return useSuspenseQuery(revisionsQuery(number)).data;
}
