import { useMutation, useQueryClient } from '@tanstack/react-query';
import type { TakeImportRequest } from '#shared/contracts/api.generated';
import { call } from '../../../lib/api/call';
import { caseChanged } from '../../../lib/queries/case-key';

/** Takes the lines of a file that was read into the draft. */
export function useTakeImport(number: string) {
  const client = useQueryClient();
  return useMutation({
    mutationFn: ({ importId, body }: { importId: string; body: TakeImportRequest }) =>
      call('takeImport', { params: { applicationId: number, importId }, body }),
    onSuccess: () => caseChanged(client, number),
  });
}
