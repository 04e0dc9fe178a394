import { useMutation } from '@tanstack/react-query';
import type { AcceptInvitationRequest } from '#shared/contracts/api.generated';
import { call } from '../../../lib/api/call';

/** Takes up the account of an invitation by the token of its mail. */
export const useAcceptInvitation = () =>
  useMutation({ mutationFn: (body: AcceptInvitationRequest) => call('acceptInvitation', { body }) });
