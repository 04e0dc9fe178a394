import { useMutation } from '@tanstack/react-query';
import type { Countersign, DecideCountersignRequest } from '#shared/contracts/api.generated';
import { call } from '../../../lib/api/call';
import { useIntention } from '../../../lib/api/intention';
import { useInvalidateCase } from '../../../lib/queries/case-key';

/** The second reviewer's word on a proposal. */
export function useDecideCountersign(countersign: Pick<Countersign, 'id' | 'number'>) {
  const invalidate = useInvalidateCase();
  const intention = useIntention();
  return useMutation({
    mutationFn: (body: DecideCountersignRequest) =>
      call('decideCountersign', {
        params: { countersignId: countersign.id },
        body,
        idempotencyKey: intention.keyFor([countersign.id, body]),
      }),
    onSettled: async (_answer, error) => {
      intention.ended(error);
      await invalidate(countersign.number);
    },
  });
}
