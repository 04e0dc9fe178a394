import { In } from 'typeorm';
import type { EntityManager } from 'typeorm';
import { Invitation, Organisation, PasswordReset } from '../entities/people.entities';

export interface InvitationRow extends Invitation {
  organisation: { id: string; name: string } | null;
}

/** Newest first, with the organisations' names. */
export async function listInvitations(manager: EntityManager): Promise<InvitationRow[]> {
  const invitations = await manager.find(Invitation, { order: { createdAt: 'DESC', id: 'ASC' }, take: 1000 });
  const ids = invitations.map((invitation) => invitation.orgId).filter((id) => id !== null);
  const organisations = await manager.findBy(Organisation, { id: In(ids) });
  const byId = new Map(organisations.map(({ id, name }) => [id, { id, name }]));
  return invitations.map((invitation) => ({
    ...invitation,
    organisation: (invitation.orgId === null ? null : byId.get(invitation.orgId)) ?? null,
  }));
}

export async function withOrganisation(
  manager: EntityManager,
  invitation: Invitation,
): Promise<InvitationRow> {
  const organisation =
    invitation.orgId === null ? null : await manager.findOneBy(Organisation, { id: invitation.orgId });
  return {
    ...invitation,
    organisation: organisation ? { id: organisation.id, name: organisation.name } : null,
  };
}

/** Uses an invitation's token up; nothing when it was used, is unknown or has run out. One of two at once wins. */
export async function takeInvitation(
  manager: EntityManager,
  tokenHash: string,
  now: Date,
): Promise<Invitation | null> {
  const taken = await manager
    .createQueryBuilder()
    .update(Invitation)
    .set({ status: 'accepted', tokenHash: null, decidedAt: now })
    .where(`token_hash = :tokenHash AND status = 'sent' AND expires_at > :now`, { tokenHash, now })
    .returning('id')
    .execute();
  const [row] = taken.raw as { id: string }[];
  return row ? manager.findOneBy(Invitation, { id: row.id }) : null;
}

/** Uses a reset's token up, likewise; answers whose password it is. */
export async function takeReset(
  manager: EntityManager,
  tokenHash: string,
  now: Date,
): Promise<string | null> {
  const taken = await manager
    .createQueryBuilder()
    .update(PasswordReset)
    .set({ usedAt: now })
    .where('token_hash = :tokenHash AND used_at IS NULL AND expires_at > :now', { tokenHash, now })
    .returning('user_id')
    .execute();
  const [row] = taken.raw as { user_id: string }[];
  return row?.user_id ?? null;
}
