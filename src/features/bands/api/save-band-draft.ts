import { useMutation, useQueryClient } from '@tanstack/react-query';
import type { SaveBandDraftRequest } from '#shared/contracts/api.generated';
import { call } from '../../../lib/api/call';

/** Saves the draft of the rules; nothing is judged by it before it is published. */
export function useSaveBandDraft() {
  const client = useQueryClient();
  return useMutation({
    mutationFn: (body: SaveBandDraftRequest) => call('saveBandDraft', { body }),
    onSettled: () => client.invalidateQueries({ queryKey: ['rules', 'draft'] }),
  });
}
