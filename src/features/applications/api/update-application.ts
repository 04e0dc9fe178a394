import { useMutation, useQueryClient } from '@tanstack/react-query';
import type { UpdateApplicationRequest } from '#shared/contracts/api.generated';
import { call } from '../../../lib/api/call';
import { caseChanged } from '../../../lib/queries/case-key';

/** Changes the head of an application on top of the version that was read. */
export function useUpdateApplication(number: string) {
  const client = useQueryClient();
  return useMutation({
    mutationFn: (body: UpdateApplicationRequest) =>
      call('updateApplication', { params: { applicationId: number }, body }),
    onSuccess: () => caseChanged(client, number),
  });
}
