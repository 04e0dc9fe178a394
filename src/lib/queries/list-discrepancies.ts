import { queryOptions, useSuspenseQuery } from '@tanstack/react-query';
import type { DiscrepancyList } from '#shared/contracts/api.generated';
import { call } from '../api/call';
import { caseKey } from './case-key';

export const discrepanciesQuery = (number: string) =>
  queryOptions({
    queryKey: [...caseKey(number), 'discrepancies'],
    queryFn: ({ signal }): Promise<DiscrepancyList> =>
      call('listDiscrepancies', { params: { applicationId: number }, signal }),
  });

/** What the reviewer raised, by number. */
export function useDiscrepancies(number: string): DiscrepancyList {
  return useSuspenseQuery(discrepanciesQuery(number)).data;
}
