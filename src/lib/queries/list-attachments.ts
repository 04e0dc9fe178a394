import { queryOptions, useQuery } from '@tanstack/react-query';
import { call } from '../api/call';
import { caseKey } from './case-key';

/** The files kept with a case, newest first. */
export const attachmentsQuery = (number: string) =>
  queryOptions({
    queryKey: [...caseKey(number), 'attachments'],
    queryFn: ({ signal }) => call('listAttachments', { params: { applicationId: number }, signal }),
  });

export const useAttachments = (number: string) => useQuery(attachmentsQuery(number));
