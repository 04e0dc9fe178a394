import { useMutation, useQueryClient } from '@tanstack/react-query';
import type { ChangePasswordRequest } from '#shared/contracts/api.generated';
import { call } from '../../../lib/api/call';
import { sessionQuery } from '../../../lib/api/session';

/** Changes one's own password; every other session of the account ends, and this one gets a new token. */
export function useChangePassword() {
  const client = useQueryClient();
  return useMutation({
    mutationFn: (body: ChangePasswordRequest) => call('changePassword', { body }),
    onSuccess: () => client.invalidateQueries({ queryKey: sessionQuery().queryKey }),
  });
}
