import type { AppAbility } from '../../../shared/policies/subjects';
import { recordEvent } from '../../database/audit/record-event';
import type { Transaction } from '../../database/transaction';
import { Membership, Organisation, ReviewerBar, User } from '../../entities/people.entities';
import type { OrganisationKind, Role, UserStatus } from '../../entities/people.entities';
import { conflict, invalidContent, notFound } from '../../errors/problem';
import { authorize } from '../../policies/authorize';
import { findUser } from '../../repositories/people.repository';
import { endSessionsOf } from '../session/end-sessions';

const NOT_ONESELF = 'Nobody changes the own rights; another administrator can.';

/** Roles of the owner's people are for the owner's organisation alone, and applicants' for all others. */
export function requireFittingRole(role: Role, kind: OrganisationKind): void {
  if ((role === 'applicant') === (kind === 'applicant')) return;
  throw invalidContent([
    {
      pointer: '/role',
      value: role,
      expected: kind === 'owner' ? 'reviewer or administrator' : 'applicant',
      message:
        kind === 'owner' ? 'The grid owner’s people review or administer.' : 'Applicants’ people apply.',
    },
  ]);
}

async function requirePerson(tx: Transaction, ability: AppAbility, userId: string): Promise<User> {
  const user = await findUser(tx.manager, userId);
  if (!user) throw notFound();
  authorize(ability, 'administer', { kind: 'Membership', userId }, NOT_ONESELF);
  return user;
}

export async function requireOrganisation(tx: Transaction, id: string): Promise<Organisation> {
  const organisation = await tx.manager.findOneBy(Organisation, { id });
  if (!organisation) throw notFound();
  return organisation;
}

/** Gives somebody a role, or another one; the new rights count from the next request on. */
export async function grantRole(
  tx: Transaction,
  ability: AppAbility,
  { userId, organisationId, role }: { userId: string; organisationId: string; role: Role },
): Promise<void> {
  await requirePerson(tx, ability, userId);
  const { kind } = await requireOrganisation(tx, organisationId);
  requireFittingRole(role, kind);
  const where = { userId, orgId: organisationId };
  const before = await tx.manager.findOneBy(Membership, where);
  if (before) await tx.manager.update(Membership, { id: before.id }, { role });
  else await tx.manager.insert(Membership, { ...where, role });
  await endSessionsOf(tx, userId);
  recordEvent(tx, {
    act: 'role.granted',
    before: before && { userId, organisationId, role: before.role },
    after: { userId, organisationId, role },
  });
}

export async function removeRole(
  tx: Transaction,
  ability: AppAbility,
  { userId, organisationId }: { userId: string; organisationId: string },
): Promise<void> {
  await requirePerson(tx, ability, userId);
  const membership = await tx.manager.findOneBy(Membership, { userId, orgId: organisationId });
  if (!membership) throw notFound();
  await tx.manager.delete(Membership, { id: membership.id });
  await endSessionsOf(tx, userId);
  recordEvent(tx, { act: 'role.removed', before: { userId, organisationId, role: membership.role } });
}

/** Shuts an account out or lets it in again; what the person did stays under the name. */
export async function setPersonStatus(
  tx: Transaction,
  ability: AppAbility,
  { userId, status, reason }: { userId: string; status: UserStatus; reason: string },
): Promise<void> {
  const user = await requirePerson(tx, ability, userId);
  if (user.status === status) throw conflict(`The account is ${status} already.`);
  await tx.manager.update(User, { id: userId }, { status });
  if (status === 'disabled') await endSessionsOf(tx, userId);
  recordEvent(tx, {
    act: status === 'disabled' ? 'person.disabled' : 'person.enabled',
    before: { userId, status: user.status },
    after: { userId, status, reason },
  });
}

/** Keeps a reviewer from an organisation's cases. */
export async function barReviewer(
  tx: Transaction,
  ability: AppAbility,
  { userId, organisationId, reason }: { userId: string; organisationId: string; reason: string },
): Promise<void> {
  await requirePerson(tx, ability, userId);
  await requireOrganisation(tx, organisationId);
  const bar = { userId, orgId: organisationId };
  if (await tx.manager.existsBy(ReviewerBar, bar)) throw conflict('This bar stands already.');
  await tx.manager.insert(ReviewerBar, { ...bar, reason, createdAt: tx.now });
  recordEvent(tx, { act: 'reviewer.barred', after: { userId, organisationId, reason } });
}
