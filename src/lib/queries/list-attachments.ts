import { queryOptions, useSuspenseQuery } from '@tanstack/react-query';
import type { AttachmentList } from '#shared/contracts/api.generated';
import { call } from '../api/call';
import { caseKey } from './case-key';

export const attachmentsQuery = (number: string) =>
  queryOptions({
    queryKey: [...caseKey(number), 'attachments'],
    queryFn: ({ signal }): Promise<AttachmentList> =>
      call('listAttachments', { params: { applicationId: number }, signal }),
  });

/** The files kept with a case, newest first. */
export function useAttachments(number: string): AttachmentList {
  return useSuspenseQuery(attachmentsQuery(number)).data;
}
