import { call } from '../../../lib/api/call';
import { usePeopleWrite } from './use-people-write';

/** Takes somebody's role in an organisation away. */
export const useRemoveRole = () =>
  usePeopleWrite(({ id, organisationId }: { id: string; organisationId: string }, idempotencyKey) =>
    call('removeRole', { params: { userId: id, organisationId }, idempotencyKey }),
  );
