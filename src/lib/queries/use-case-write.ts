import { useMutation } from '@tanstack/react-query';
import type { ApiTypes } from '#shared/contracts/api-types';
import type { OperationId } from '#shared/contracts/api-paths';
import { call, type CallAnswer, type CallInput } from '../api/call';
import { useIntention } from '../api/intention';
import { useInvalidateCase } from './case-key';

/** Writes on one application: the operations whose path begins with it. */
type CaseWrite = {
  [Id in OperationId & keyof ApiTypes]: 'applicationId' extends keyof ApiTypes[Id]['params'] ? Id : never;
}[OperationId & keyof ApiTypes];

/** What a write is told: the rest of the path beside the application, and the body. */
export type CaseWriteInput<Id extends CaseWrite> = {
  params?: Omit<ApiTypes[Id]['params'], 'applicationId'>;
  body?: ApiTypes[Id]['body'] | FormData;
};

/**
 * A write on an application. It is safe to send twice, shows nothing before the server has answered, and has
 * everything of the application read again afterwards, also when the server refused (something has changed then).
 */
export function useCaseWrite<Id extends CaseWrite>(id: Id, number: string) {
  const invalidate = useInvalidateCase();
  const intention = useIntention();
  return useMutation<CallAnswer<Id>, Error, CaseWriteInput<Id>>({
    mutationFn: ({ params, body }) => {
      const input = {
        params: { ...params, applicationId: number },
        body,
        idempotencyKey: intention.keyFor([params, body]),
      };
      return call(id, input as unknown as CallInput<Id>);
    },
    onSettled: async (_answer, error) => {
      intention.ended(error);
      await invalidate(number);
    },
  });
}
