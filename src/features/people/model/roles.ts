import type { Organisation } from '#shared/contracts/api.generated';
import type { Role } from '../../../lib/api/session';

export const ROLE_WORDS: Readonly<Record<Role, string>> = {
  applicant: 'Applicant',
  reviewer: 'Reviewer',
  administrator: 'Administrator',
};

/** Applicants belong to applicant organisations, reviewers and administrators to the grid owner. */
export function rolesIn(organisation: Pick<Organisation, 'kind'> | undefined): Role[] {
  if (!organisation) return [];
  return organisation.kind === 'owner' ? ['reviewer', 'administrator'] : ['applicant'];
}
