import { queryOptions, useSuspenseQuery } from '@tanstack/react-query';
import type { RevisionComparison } from '#shared/contracts/api.generated';
import { call } from '../api/call';
import { caseKey } from './case-key';

export const revisionComparisonQuery = (number: string, from: string, to: string) =>
  queryOptions({
    queryKey: [...caseKey(number), 'comparison', from, to],
    queryFn: ({ signal }): Promise<RevisionComparison> =>
      call('compareRevisions', { params: { applicationId: number }, query: { from, to }, signal }),
  });

/** What differs between two revisions, line by line. */
export function useRevisionComparison(number: string, from: string, to: string): RevisionComparison {
  return useSuspenseQuery(revisionComparisonQuery(number, from, to)).data;
}
