import type { InvitePersonRequest } from '#shared/contracts/api.generated';
import { call } from '../../../lib/api/call';
import { usePeopleWrite } from './use-people-write';

/** Invites somebody by mail. */
export const useInvitePerson = () =>
  usePeopleWrite((body: InvitePersonRequest, idempotencyKey) =>
    call('invitePerson', { body, idempotencyKey }),
  );
