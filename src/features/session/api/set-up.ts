import { useMutation, useQueryClient } from '@tanstack/react-query';
import type { SetUpRequest } from '#shared/contracts/api.generated';
import { call } from '../../../lib/api/call';
import { frontDoorQuery } from './get-front-door';

/** Names the grid owner and its first administrator, once. */
export function useSetUp() {
  const client = useQueryClient();
  return useMutation({
    mutationFn: (body: SetUpRequest) => call('setUp', { body }),
    onSuccess: () => client.invalidateQueries({ queryKey: frontDoorQuery().queryKey }),
  });
}
