import type { EntityManager } from 'typeorm';
import type { UserActor } from '../actor';
import { Membership, Organisation, User } from '../../entities/people.entities';
import { APPLICANTS, DEMO_ACCOUNTS, DEMO_PASSWORD, GRID_OWNER } from '../../services/accounts/demo-accounts';
import { hashPassword } from '../../services/session/passwords';

/** The demo's people by the first part of their address and their organisation. */
export type Cast = (person: string, organisation?: string) => UserActor;

/** Makes the organisations and their people. */
export async function seedPeople(manager: EntityManager, now: Date): Promise<Cast> {
  const organisations = new Map<string, string>();
  for (const name of [GRID_OWNER, ...APPLICANTS]) {
    const kind = name === GRID_OWNER ? 'owner' : 'applicant';
    const inserted = await manager.insert(Organisation, { name, kind, createdAt: now });
    organisations.set(name, inserted.identifiers[0]?.['id'] as string);
  }
  // one password for all of them, so one hash does
  const passwordHash = await hashPassword(DEMO_PASSWORD);
  const actors = new Map<string, UserActor>();
  for (const { email, name, role, organisations: own } of DEMO_ACCOUNTS) {
    const user = { email, emailKey: email, displayName: name, passwordHash, createdAt: now };
    const inserted = await manager.insert(User, user);
    const userId = inserted.identifiers[0]?.['id'] as string;
    for (const organisation of own) {
      const orgId = organisations.get(organisation) ?? '';
      await manager.insert(Membership, { userId, orgId, role, createdAt: now });
      const actor: UserActor = { kind: 'user', userId, name, orgId, role, barredOrgIds: [] };
      actors.set(`${email.split('@')[0]} ${organisation}`, actor);
    }
  }
  return (person, organisation = GRID_OWNER) => {
    const actor = actors.get(`${person} ${organisation}`);
    if (actor === undefined) throw new Error(`nobody is called ${person} at ${organisation}`);
    return actor;
  };
}
