import { useMutation, useQueryClient } from '@tanstack/react-query';
import { useIntention } from '../../../lib/api/intention';

/** A write on people: safe to send twice; everything read of people is read again afterwards. */
export function usePeopleWrite<Input, Answer>(
  send: (input: Input, idempotencyKey: string) => Promise<Answer>,
) {
  const client = useQueryClient();
  const intention = useIntention();
  return useMutation({
    mutationFn: (input: Input) => send(input, intention.keyFor(input)),
    onSettled: async (_answer, error) => {
      intention.ended(error);
      await client.invalidateQueries({ queryKey: ['people'] });
    },
  });
}
