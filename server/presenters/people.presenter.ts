import type {
  Invitation as InvitationAnswer,
  Organisation as OrganisationAnswer,
  PeopleEntry,
} from '../../shared/contracts/api.generated';
import type { DirectoryEntry, OrganisationRow } from '../repositories/directory.repository';
import type { InvitationRow } from '../repositories/invitation.repository';

const iso = (date: Date | null) => date?.toISOString() ?? null;

export function presentPerson({ user, hasSecondFactor, memberships, bars }: DirectoryEntry): PeopleEntry {
  return {
    id: user.id,
    name: user.displayName,
    email: user.email,
    status: user.status,
    hasSecondFactor,
    lastSignInAt: iso(user.lastSignInAt),
    memberships: memberships.map(({ orgId, organisationName, role }) => ({
      organisationId: orgId,
      organisationName,
      role,
    })),
    bars: bars.map(({ orgId, organisationName, reason }) => ({
      organisationId: orgId,
      organisationName,
      reason,
    })),
  };
}

export const presentOrganisation = ({
  id,
  name,
  kind,
  members,
  applications,
}: OrganisationRow): OrganisationAnswer => ({
  id,
  name,
  kind,
  members,
  applications,
});

export function presentInvitation(row: InvitationRow): InvitationAnswer {
  const {
    id,
    email,
    displayName,
    organisation,
    askedOrganisation,
    message,
    role,
    status,
    createdAt,
    expiresAt,
  } = row;
  return {
    id,
    email,
    name: displayName,
    organisation,
    askedOrganisation,
    message,
    role,
    status,
    createdAt: createdAt.toISOString(),
    expiresAt: iso(expiresAt),
  };
}
