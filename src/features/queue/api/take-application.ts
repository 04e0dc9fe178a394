import { useMutation } from '@tanstack/react-query';
import type { ApplicationSummary } from '#shared/contracts/api.generated';
import { call } from '../../../lib/api/call';
import { useIntention } from '../../../lib/api/intention';
import { useInvalidateCase } from '../../../lib/queries/case-key';

/** Takes a filed application. Of many who try at once the server lets one have it. */
export function useTakeApplication() {
  const invalidate = useInvalidateCase();
  const intention = useIntention();
  return useMutation({
    mutationFn: ({ number, version }: Pick<ApplicationSummary, 'number' | 'version'>) =>
      call('takeApplication', {
        params: { applicationId: number },
        body: { version },
        idempotencyKey: intention.keyFor([number, version]),
      }),
    onSettled: async (_answer, error, { number }) => {
      intention.ended(error);
      await invalidate(number);
    },
  });
}
