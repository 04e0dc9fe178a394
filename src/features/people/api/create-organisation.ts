import type { CreateOrganisationRequest } from '#shared/contracts/api.generated';
import { call } from '../../../lib/api/call';
import { usePeopleWrite } from './use-people-write';

/** Adds an applicant organisation. */
export const useCreateOrganisation = () =>
  usePeopleWrite((body: CreateOrganisationRequest, idempotencyKey) =>
    call('createOrganisation', { body, idempotencyKey }),
  );
