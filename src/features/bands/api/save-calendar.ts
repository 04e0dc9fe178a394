import { useMutation, useQueryClient } from '@tanstack/react-query';
import type { SaveCalendarRequest } from '#shared/contracts/api.generated';
import { call } from '../../../lib/api/call';
import { calendarQuery } from '../../../lib/queries/get-calendar';

/** Working days from now on; windows that are open keep the calendar that they were opened with. */
export function useSaveCalendar() {
  const client = useQueryClient();
  return useMutation({
    mutationFn: (body: SaveCalendarRequest) => call('saveCalendar', { body }),
    onSettled: () => client.invalidateQueries({ queryKey: calendarQuery().queryKey }),
  });
}
