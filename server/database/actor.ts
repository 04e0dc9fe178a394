import type { Role } from '../entities/people.entities';

/** Somebody signed in, in the organisation that is active in the session. */
export interface UserActor {
  kind: 'user';
  userId: string;
  name: string;
  orgId: string;
  role: Role;
  /** Organisations whose cases this reviewer must not see. */
  barredOrgIds: readonly string[];
}

/** On whose behalf a transaction runs. Row security and the audit trail both take it from here. */
export type Actor =
  | UserActor
  /** The product itself: jobs, sign-in before anybody is known, bootstrap. */
  | { kind: 'system'; name: string };

export const system = (name: string): Actor => ({ kind: 'system', name });

export function actorRole(actor: Actor): Role | 'system' {
  return actor.kind === 'user' ? actor.role : 'system';
}
