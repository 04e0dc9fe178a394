import type { SetPersonStatusRequest } from '#shared/contracts/api.generated';
import { call } from '../../../lib/api/call';
import { usePeopleWrite } from './use-people-write';

/** Disables an account, or lets it in again. */
export const useSetPersonStatus = () =>
  usePeopleWrite(({ id, ...body }: SetPersonStatusRequest & { id: string }, idempotencyKey) =>
    call('setPersonStatus', { params: { userId: id }, body, idempotencyKey }),
  );
