import { useMutation, useQueryClient } from '@tanstack/react-query';
import { call } from '../../../lib/api/call';
import { caseChanged } from '../../../lib/queries/case-key';

/** Takes a line out of the draft, on top of the version that was read. */
export function useDeleteDraftLine(number: string) {
  const client = useQueryClient();
  return useMutation({
    mutationFn: ({ lineKey, version }: { lineKey: string; version: number }) =>
      call('deleteDraftLine', {
        params: { applicationId: number, lineKey },
        query: { version: String(version) },
      }),
    onSettled: () => caseChanged(client, number),
  });
}
