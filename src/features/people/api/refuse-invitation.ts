import type { RefuseInvitationRequest } from '#shared/contracts/api.generated';
import { call } from '../../../lib/api/call';
import { usePeopleWrite } from './use-people-write';

/** Refuses an account that was asked for. */
export const useRefuseInvitation = () =>
  usePeopleWrite(({ id, ...body }: RefuseInvitationRequest & { id: string }, idempotencyKey) =>
    call('refuseInvitation', { params: { invitationId: id }, body, idempotencyKey }),
  );
