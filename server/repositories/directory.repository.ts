import { In, IsNull, Not } from 'typeorm';
import type { EntityManager } from 'typeorm';
import { SecondFactor, User } from '../entities/people.entities';
import type { OrganisationKind } from '../entities/people.entities';
import { barsOf, membershipsOf } from './people.repository';
import type { BarRow, MembershipRow } from './people.repository';

export interface DirectoryEntry {
  user: User;
  hasSecondFactor: boolean;
  memberships: MembershipRow[];
  bars: BarRow[];
}

/** People with their roles and bars; all of them, or those named. */
export async function readDirectory(
  manager: EntityManager,
  userIds?: readonly string[],
): Promise<DirectoryEntry[]> {
  const where = userIds ? { id: In([...userIds]) } : {};
  const users = await manager.find(User, { where, order: { displayName: 'ASC', id: 'ASC' }, take: 10_000 });
  const ids = users.map((user) => user.id);
  const memberships = await membershipsOf(manager, ids);
  const bars = await barsOf(manager, ids);
  const factors = await manager.findBy(SecondFactor, { userId: In(ids), confirmedAt: Not(IsNull()) });
  const withFactor = new Set(factors.map((factor) => factor.userId));
  return users.map((user) => ({
    user,
    hasSecondFactor: withFactor.has(user.id),
    memberships: memberships.filter((row) => row.userId === user.id),
    bars: bars.filter((row) => row.userId === user.id),
  }));
}

export interface OrganisationRow {
  id: string;
  name: string;
  kind: OrganisationKind;
  members: number;
  applications: number;
}

/** Organisations with their numbers of people and applications; all of them, or one. */
export function readOrganisations(
  manager: EntityManager,
  id: string | null = null,
): Promise<OrganisationRow[]> {
  return manager.query<OrganisationRow[]>(
    `SELECT o.id, o.name, o.kind,
       (SELECT count(*)::int FROM memberships m WHERE m.org_id = o.id) AS members,
       (SELECT count(*)::int FROM applications a WHERE a.org_id = o.id) AS applications
     FROM organisations o WHERE $1::uuid IS NULL OR o.id = $1
     ORDER BY o.kind DESC, o.name`,
    [id],
  );
}
