import { queryOptions, useSuspenseQuery } from '@tanstack/react-query';
import type { Draft } from '#shared/contracts/api.generated';
import { call } from '../api/call';
import { caseKey } from './case-key';

export const draftQuery = (number: string) =>
  queryOptions({
    queryKey: [...caseKey(number), 'draft'],
    queryFn: ({ signal }): Promise<Draft> => call('getDraft', { params: { applicationId: number }, signal }),
  });

/** The draft of the next revision: its lines and what stands in the way of filing. */
export function useDraft(number: string): Draft {
  return useSuspenseQuery(draftQuery(number)).data;
}
