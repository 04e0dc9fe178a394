import type { GrantRoleRequest } from '#shared/contracts/api.generated';
import { call } from '../../../lib/api/call';
import { usePeopleWrite } from './use-people-write';

/** Gives somebody a role in an organisation. */
export const useGrantRole = () =>
  usePeopleWrite(
    (
      { id, organisationId, ...body }: GrantRoleRequest & { id: string; organisationId: string },
      idempotencyKey,
    ) => call('grantRole', { params: { userId: id, organisationId }, body, idempotencyKey }),
  );
