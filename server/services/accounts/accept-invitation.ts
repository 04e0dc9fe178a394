import type { AcceptInvitationRequest } from '../../../shared/contracts/api.generated';
import { recordEvent } from '../../database/audit/record-event';
import type { Transaction } from '../../database/transaction';
import { Membership, User } from '../../entities/people.entities';
import type { Invitation } from '../../entities/people.entities';
import { Problem } from '../../errors/problem';
import { takeInvitation } from '../../repositories/invitation.repository';
import { emailKey, findUserByEmail } from '../../repositories/people.repository';
import { hashPassword, requireGoodPassword } from '../session/passwords';
import { hashToken } from './tokens';

/** The account of the invitation's own address; somebody who has one keeps name and password. */
async function accountFor(
  tx: Transaction,
  { email }: Invitation,
  name: string,
  password: string,
): Promise<string> {
  const known = await findUserByEmail(tx.manager, email);
  if (known) return known.id;
  requireGoodPassword(password, [email, name]);
  const user = {
    email,
    emailKey: emailKey(email),
    displayName: name,
    passwordHash: await hashPassword(password),
  };
  const made = await tx.manager.insert(User, { ...user, createdAt: tx.now });
  return String(made.identifiers[0]?.id);
}

/** Role and organisation come from the stored invitation, whatever else the request may say. */
export async function acceptInvitation(
  tx: Transaction,
  { token, name, password }: AcceptInvitationRequest,
): Promise<void> {
  const invitation = await takeInvitation(tx.manager, hashToken(token), tx.now);
  if (!invitation || invitation.orgId === null) throw new Problem('gone');
  const { orgId, role } = invitation;
  const userId = await accountFor(tx, invitation, name, password);
  await tx.manager
    .createQueryBuilder()
    .insert()
    .into(Membership)
    .values({ userId, orgId, role })
    .orIgnore()
    .execute();
  recordEvent(tx, { act: 'invitation.accepted', orgId, after: { userId, role } });
}
