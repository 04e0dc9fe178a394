import { useMemo } from 'react';
import { defineAbility } from '#shared/policies/ability';
import type { Actor, AppAbility } from '#shared/policies/subjects';
import { useSession, type Session } from '../api/session';

/** The session as the policies see it. */
export function actorOf(session: Session | null): Actor | null {
  if (!session) return null;
  return {
    userId: session.user.id,
    role: session.role,
    orgId: session.organisation.id,
    barredOrgIds: session.barredOrganisationIds,
  };
}

/**
 * What the person at the screen may do, by the server's own rules. It decides what is offered; what is
 * allowed the server decides again.
 */
export function useAbility(): AppAbility {
  const session = useSession();
  return useMemo(() => defineAbility(actorOf(session)), [session]);
}
