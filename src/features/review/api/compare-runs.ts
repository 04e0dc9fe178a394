import { queryOptions, useQuery } from '@tanstack/react-query';
import { call } from '../../../lib/api/call';
import { caseKey } from '../../../lib/queries/case-key';

export const runComparisonQuery = (number: string, letter: string, from: number, to: number) =>
  queryOptions({
    queryKey: [...caseKey(number), 'revision', letter, 'run-comparison', from, to],
    queryFn: ({ signal }) =>
      call('compareRuns', {
        params: { applicationId: number, letter },
        query: { from: String(from), to: String(to) },
        signal,
      }),
  });

/** What one run found that the other did not. */
export const useRunComparison = (number: string, letter: string, from: number, to: number) =>
  useQuery(runComparisonQuery(number, letter, from, to));
