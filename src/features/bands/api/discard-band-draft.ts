import { useMutation, useQueryClient } from '@tanstack/react-query';
import { call } from '../../../lib/api/call';

/** Throws the draft away: the rules in force stand as before. */
export function useDiscardBandDraft() {
  const client = useQueryClient();
  return useMutation({
    mutationFn: (version: number) => call('discardBandDraft', { query: { version: String(version) } }),
    onSettled: () => client.invalidateQueries({ queryKey: ['rules'] }),
  });
}
