import type { Role } from '../entities/people.entities';

/** On whose behalf a transaction runs. Row security and the audit trail both take it from here. */
export type Actor =
  | { kind: 'user'; userId: string; name: string; orgId: string; role: Role }
  /** The product itself: jobs, sign-in before anybody is known, bootstrap. */
  | { kind: 'system'; name: string };

export const system = (name: string): Actor => ({ kind: 'system', name });

export function actorRole(actor: Actor): Role | 'system' {
  return actor.kind === 'user' ? actor.role : 'system';
}
