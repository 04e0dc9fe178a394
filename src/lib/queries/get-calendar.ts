import { queryOptions, useSuspenseQuery } from '@tanstack/react-query';
import type { Calendar } from '#shared/contracts/api.generated';
import { call } from '../api/call';

export const calendarQuery = () =>
  queryOptions({
    queryKey: ['calendar'],
    queryFn: ({ signal }): Promise<Calendar> => call('getCalendar', { signal }),
    staleTime: 5 * 60_000,
  });

/** The owner's working days: time zone, weekend, holidays. */
export function useCalendar(): Calendar {
  return useSuspenseQuery(calendarQuery()).data;
}
