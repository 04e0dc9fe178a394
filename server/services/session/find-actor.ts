import type { EntityManager } from 'typeorm';
import type { UserActor } from '../../database/actor';
import { Problem } from '../../errors/problem';
import type { SessionState } from '../../integrations/session-door';
import { barsOf, findUser, membershipsOf } from '../../repositories/people.repository';

/** Who the session stands for, with the rights of this moment: a role taken away counts from the next request on. */
export async function findActor(
  manager: EntityManager,
  { userId, orgId }: Pick<SessionState, 'userId' | 'orgId'>,
): Promise<UserActor> {
  const user = await findUser(manager, userId);
  const memberships = await membershipsOf(manager, [userId]);
  const membership = memberships.find((row) => row.orgId === orgId);
  if (!user || user.status !== 'active' || !membership) throw new Problem('not-signed-in');
  const bars = membership.role === 'reviewer' ? await barsOf(manager, [userId]) : [];
  return {
    kind: 'user',
    userId,
    name: user.displayName,
    orgId,
    role: membership.role,
    barredOrgIds: bars.map((bar) => bar.orgId),
  };
}
