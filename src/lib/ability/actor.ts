import type { Actor } from '#shared/policies/subjects';
import type { Session } from '../api/session';

/** The session as the policies see it: client and server ask the same ability of the same actor. */
export function actorOf(session: Session): Actor {
  return {
    userId: session.user.id,
    role: session.role,
    orgId: session.organisation.id,
    barredOrgIds: session.barredOrganisationIds,
  };
}
