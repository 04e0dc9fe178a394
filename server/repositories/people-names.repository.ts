import type { EntityManager } from 'typeorm';
import { Organisation, ReviewerBar, User } from '../entities/people.entities';

/** A person as others see one. */
export interface PersonName {
  id: string;
  name: string;
}

export type PeopleById = ReadonlyMap<string, PersonName>;

/** Names of people by id; ids that are null are left out. */
export async function namesOf(
  manager: EntityManager,
  ids: Iterable<string | null | undefined>,
): Promise<PeopleById> {
  const wanted = [...new Set([...ids].filter((id) => id !== null && id !== undefined))];
  if (wanted.length === 0) return new Map();
  const users = await manager
    .createQueryBuilder(User, 'user')
    .select(['user.id', 'user.displayName'])
    .where('user.id IN (:...wanted)', { wanted })
    .getMany();
  return new Map(users.map((user) => [user.id, { id: user.id, name: user.displayName }]));
}

export async function organisationNames(
  manager: EntityManager,
  ids: Iterable<string>,
): Promise<ReadonlyMap<string, PersonName>> {
  const wanted = [...new Set(ids)];
  if (wanted.length === 0) return new Map();
  const rows = await manager
    .createQueryBuilder(Organisation, 'organisation')
    .where('organisation.id IN (:...wanted)', { wanted })
    .getMany();
  return new Map(rows.map(({ id, name }) => [id, { id, name }]));
}

/** The grid owner; there is one. */
export async function gridOwner(manager: EntityManager): Promise<PersonName> {
  const { id, name } = await manager.findOneByOrFail(Organisation, { kind: 'owner' });
  return { id, name };
}

/** Active reviewers who are not barred from an organisation, with the cases that they have in hand. */
export async function reviewersFor(
  manager: EntityManager,
  orgId: string,
): Promise<{ id: string; name: string; openCases: number }[]> {
  return manager.query(
    `SELECT u.id, u.display_name AS name,
            (SELECT count(*)::int FROM rounds r WHERE r.reviewer_id = u.id AND r.state IN ('in-review', 'returned'))
              AS "openCases"
       FROM users u JOIN memberships m ON m.user_id = u.id
      WHERE m.role = 'reviewer' AND u.status = 'active'
        AND NOT EXISTS (SELECT 1 FROM reviewer_bars b WHERE b.user_id = u.id AND b.org_id = $1)
      GROUP BY u.id ORDER BY u.display_name`,
    [orgId],
  );
}

export async function barredOrganisations(manager: EntityManager, userId: string): Promise<string[]> {
  const bars = await manager.findBy(ReviewerBar, { userId });
  return bars.map((bar) => bar.orgId);
}

/** Addresses of an organisation's active members, for mail about its cases. */
export async function memberAddresses(manager: EntityManager, orgId: string): Promise<string[]> {
  const rows = await manager.query<{ email: string }[]>(
    `SELECT DISTINCT u.email FROM users u JOIN memberships m ON m.user_id = u.id
      WHERE m.org_id = $1 AND u.status = 'active' ORDER BY u.email`,
    [orgId],
  );
  return rows.map((row) => row.email);
}

export async function addressOf(manager: EntityManager, userId: string): Promise<string | null> {
  const user = await manager.findOneBy(User, { id: userId, status: 'active' });
  return user?.email ?? null;
}

/** Which of these people belong to an organisation. Needs the product's own sight. */
export async function membersAmong(
  manager: EntityManager,
  orgId: string,
  ids: readonly string[],
): Promise<ReadonlySet<string>> {
  const rows = await manager.query<{ id: string }[]>(
    'SELECT DISTINCT user_id AS id FROM memberships WHERE org_id = $1 AND user_id = ANY($2::uuid[])',
    [orgId, ids],
  );
  return new Set(rows.map((row) => row.id));
}
