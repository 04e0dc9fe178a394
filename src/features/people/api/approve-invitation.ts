import type { ApproveInvitationRequest } from '#shared/contracts/api.generated';
import { call } from '../../../lib/api/call';
import { usePeopleWrite } from './use-people-write';

/** Grants an account that was asked for. */
export const useApproveInvitation = () =>
  usePeopleWrite(({ id, ...body }: ApproveInvitationRequest & { id: string }, idempotencyKey) =>
    call('approveInvitation', { params: { invitationId: id }, body, idempotencyKey }),
  );
