import type { UserActor } from '../../database/actor';
import { asSystem } from '../../database/transaction';
import type { Transaction } from '../../database/transaction';
import { notFound, Problem } from '../../errors/problem';
import type { SessionDoor, SessionState } from '../../integrations/session-door';
import { membershipsOf } from '../../repositories/people.repository';
import { idleMinutes } from './sign-in';

/** Acts for another of the own organisations from here on; the session gets a new id, since its rights change. */
export async function switchOrganisation(
  tx: Transaction,
  actor: UserActor,
  door: SessionDoor,
  organisationId: string,
): Promise<SessionState> {
  const memberships = await asSystem(tx, (manager) => membershipsOf(manager, [actor.userId]));
  const wanted = memberships.find((row) => row.orgId === organisationId);
  if (!wanted) throw notFound();
  const { state } = door;
  if (!state) throw new Problem('not-signed-in');
  return door.begin({ ...state, orgId: organisationId, idleMinutes: idleMinutes(wanted) });
}
