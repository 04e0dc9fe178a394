import { queryOptions, useQuery } from '@tanstack/react-query';
import { call } from '../api/call';
import { caseKey } from './case-key';

/** What the reviewer raised, by number. */
export const discrepanciesQuery = (number: string) =>
  queryOptions({
    queryKey: [...caseKey(number), 'discrepancies'],
    queryFn: ({ signal }) => call('listDiscrepancies', { params: { applicationId: number }, signal }),
  });

export const useDiscrepancies = (number: string) => useQuery(discrepanciesQuery(number));
