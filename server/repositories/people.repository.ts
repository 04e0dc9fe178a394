import type { EntityManager } from 'typeorm';
import { Membership, Organisation, ReviewerBar, SecondFactor, User } from '../entities/people.entities';
import type { OrganisationKind, Role } from '../entities/people.entities';

/** One lookup key for an address, however it is typed. */
export const emailKey = (email: string): string => email.trim().toLowerCase();

export const findUser = (manager: EntityManager, id: string) => manager.findOneBy(User, { id });

export const findUserByEmail = (manager: EntityManager, email: string) =>
  manager.findOneBy(User, { emailKey: emailKey(email) });

export interface MembershipRow {
  userId: string;
  orgId: string;
  role: Role;
  organisationName: string;
  organisationKind: OrganisationKind;
}

/** The roles of people, with the organisations' names, in the names' order. */
export async function membershipsOf(
  manager: EntityManager,
  userIds: readonly string[],
): Promise<MembershipRow[]> {
  if (userIds.length === 0) return [];
  return manager
    .createQueryBuilder(Membership, 'membership')
    .innerJoin(Organisation, 'organisation', 'organisation.id = membership.orgId')
    .where('membership.userId IN (:...userIds) AND NOT organisation.disabled', { userIds })
    .select('membership.userId', 'userId')
    .addSelect('membership.orgId', 'orgId')
    .addSelect('membership.role', 'role')
    .addSelect('organisation.name', 'organisationName')
    .addSelect('organisation.kind', 'organisationKind')
    .orderBy('organisation.name')
    .getRawMany<MembershipRow>();
}

export interface BarRow {
  userId: string;
  orgId: string;
  organisationName: string;
  reason: string;
}

export async function barsOf(manager: EntityManager, userIds: readonly string[]): Promise<BarRow[]> {
  if (userIds.length === 0) return [];
  return manager
    .createQueryBuilder(ReviewerBar, 'bar')
    .innerJoin(Organisation, 'organisation', 'organisation.id = bar.orgId')
    .where('bar.userId IN (:...userIds)', { userIds })
    .select('bar.userId', 'userId')
    .addSelect('bar.orgId', 'orgId')
    .addSelect('bar.reason', 'reason')
    .addSelect('organisation.name', 'organisationName')
    .getRawMany<BarRow>();
}

export const findGridOwner = (manager: EntityManager) => manager.findOneBy(Organisation, { kind: 'owner' });

export async function hasSecondFactor(manager: EntityManager, userId: string): Promise<boolean> {
  const factor = await manager.findOneBy(SecondFactor, { userId });
  return factor !== null && factor.confirmedAt !== null;
}
