import { recordEvent } from '../../database/audit/record-event';
import type { UserActor } from '../../database/actor';
import type { Transaction } from '../../database/transaction';
import { Invitation, Organisation } from '../../entities/people.entities';
import type { Role } from '../../entities/people.entities';
import { conflict, notFound } from '../../errors/problem';
import { withOrganisation } from '../../repositories/invitation.repository';
import type { InvitationRow } from '../../repositories/invitation.repository';
import { mailInvitation, mailRefusal } from '../accounts/account-mails';
import { makeToken } from '../accounts/tokens';
import { requireFittingRole, requireOrganisation } from './manage-roles';

async function reread(tx: Transaction, id: string): Promise<InvitationRow> {
  return withOrganisation(tx.manager, await tx.manager.findOneByOrFail(Invitation, { id }));
}

/** Invites somebody by mail into one organisation, in one role. */
export async function invitePerson(
  tx: Transaction,
  actor: UserActor,
  { email, name, organisationId, role }: { email: string; name: string; organisationId: string; role: Role },
): Promise<InvitationRow> {
  const organisation = await requireOrganisation(tx, organisationId);
  requireFittingRole(role, organisation.kind);
  const made = makeToken(tx.now);
  const inserted = await tx.manager.insert(Invitation, {
    orgId: organisationId,
    email,
    displayName: name,
    role,
    status: 'sent',
    tokenHash: made.tokenHash,
    expiresAt: made.expiresAt,
    decidedBy: actor.userId,
    createdAt: tx.now,
  });
  const id = String(inserted.identifiers[0]?.id);
  await mailInvitation(tx, { id, email, name }, organisation.name, made);
  recordEvent(tx, { act: 'person.invited', after: { email, organisationId, role } });
  return reread(tx, id);
}

/** Grants an account that was asked for, or sends a link that has run out again. */
export async function approveInvitation(
  tx: Transaction,
  actor: UserActor,
  { invitationId, organisationId, role }: { invitationId: string; organisationId: string; role: Role },
): Promise<InvitationRow> {
  const invitation = await tx.manager.findOneBy(Invitation, { id: invitationId });
  if (!invitation) throw notFound();
  if (invitation.status !== 'asked' && invitation.status !== 'sent')
    throw conflict('This has been decided already.');
  const organisation = await requireOrganisation(tx, organisationId);
  requireFittingRole(role, organisation.kind);
  const made = makeToken(tx.now);
  const { tokenHash, expiresAt } = made;
  const changed = await tx.manager.update(
    Invitation,
    { id: invitationId, status: invitation.status },
    {
      orgId: organisationId,
      role,
      status: 'sent',
      tokenHash,
      expiresAt,
      decidedBy: actor.userId,
      decidedAt: tx.now,
    },
  );
  if (changed.affected !== 1) throw conflict('Somebody else has just decided this.');
  const { email, displayName: name } = invitation;
  await mailInvitation(tx, { id: invitationId, email, name }, organisation.name, made);
  recordEvent(tx, { act: 'account.approved', after: { email, organisationId, role } });
  return reread(tx, invitationId);
}

/** Refuses an account that was asked for, or takes an invitation back that nobody has taken up. */
export async function refuseInvitation(
  tx: Transaction,
  actor: UserActor,
  { invitationId, reason }: { invitationId: string; reason: string },
): Promise<InvitationRow> {
  const invitation = await tx.manager.findOneBy(Invitation, { id: invitationId });
  if (!invitation) throw notFound();
  const { status: from } = invitation;
  if (from !== 'asked' && from !== 'sent') throw conflict('This has been decided already.');
  const status = from === 'asked' ? 'refused' : 'revoked';
  const changed = await tx.manager.update(
    Invitation,
    { id: invitationId, status: from },
    { status, tokenHash: null, decidedBy: actor.userId, decidedAt: tx.now },
  );
  if (changed.affected !== 1) throw conflict('Somebody else has just decided this.');
  const { email, displayName: name } = invitation;
  if (status === 'refused') await mailRefusal(tx, { id: invitationId, email, name }, reason);
  recordEvent(tx, { act: `invitation.${status}`, after: { email, reason } });
  return reread(tx, invitationId);
}

export async function createOrganisation(tx: Transaction, name: string): Promise<Organisation> {
  if (await tx.manager.existsBy(Organisation, { name }))
    throw conflict('There is an organisation of that name already.');
  const made = await tx.manager.insert(Organisation, { name, kind: 'applicant', createdAt: tx.now });
  const id = String(made.identifiers[0]?.id);
  recordEvent(tx, { act: 'organisation.created', orgId: id, after: { name } });
  return tx.manager.findOneByOrFail(Organisation, { id });
}
