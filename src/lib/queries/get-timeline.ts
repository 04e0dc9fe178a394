import { queryOptions, useSuspenseQuery } from '@tanstack/react-query';
import type { Timeline } from '#shared/contracts/api.generated';
import { call } from '../api/call';
import { caseKey } from './case-key';

export const timelineQuery = (number: string) =>
  queryOptions({
    queryKey: [...caseKey(number), 'timeline'],
    queryFn: ({ signal }): Promise<Timeline> =>
      call('getTimeline', { params: { applicationId: number }, signal }),
  });

/** The audit trail of an application, oldest first. */
export function useTimeline(number: string): Timeline {
  return useSuspenseQuery(timelineQuery(number)).data;
}
