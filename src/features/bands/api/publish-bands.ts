import { useMutation, useQueryClient } from '@tanstack/react-query';
import type { PublishBandsRequest } from '#shared/contracts/api.generated';
import { call } from '../../../lib/api/call';
import { useIntention } from '../../../lib/api/intention';

/** Publishes the draft: from then on filings are judged by it; what was judged before keeps its own rules. */
export function usePublishBands() {
  const client = useQueryClient();
  const intention = useIntention();
  return useMutation({
    mutationFn: (body: PublishBandsRequest) =>
      call('publishBands', { body, idempotencyKey: intention.keyFor(body) }),
    onSettled: async (_answer, error) => {
      intention.ended(error);
      await client.invalidateQueries({ queryKey: ['rules'] });
    },
  });
}
