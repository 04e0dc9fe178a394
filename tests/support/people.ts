import { Membership, Organisation, User } from '#server/entities/people.entities';
import type { OrganisationKind, Role } from '#server/entities/people.entities';
import type { UserActor } from '#server/database/actor';
import type { Transaction } from '#server/database/transaction';

let counter = 0;
const next = () => ++counter;

export type { UserActor };

export async function anOrganisation(
  tx: Transaction,
  { name = `Company ${next()}`, kind = 'applicant' as OrganisationKind } = {},
): Promise<Organisation> {
  return tx.manager.save(Organisation, tx.manager.create(Organisation, { name, kind }));
}

export async function aUser(
  tx: Transaction,
  {
    email = `person${next()}@example.org`,
    displayName = `Person ${next()}`,
    passwordHash = null as string | null,
  } = {},
): Promise<User> {
  return tx.manager.save(
    User,
    tx.manager.create(User, { email, emailKey: email.toLowerCase(), displayName, passwordHash }),
  );
}

export async function aMembership(
  tx: Transaction,
  user: User,
  org: Organisation,
  role: Role,
): Promise<Membership> {
  return tx.manager.save(Membership, tx.manager.create(Membership, { userId: user.id, orgId: org.id, role }));
}

/** Somebody in a role of an organisation, ready to act. */
export async function aPerson(tx: Transaction, org: Organisation, role: Role): Promise<UserActor> {
  const user = await aUser(tx);
  await aMembership(tx, user, org, role);
  return { kind: 'user', userId: user.id, name: user.displayName, orgId: org.id, role, barredOrgIds: [] };
}
