import { recordEvent } from '../../database/audit/record-event';
import type { Transaction } from '../../database/transaction';
import { PasswordReset, User } from '../../entities/people.entities';
import { Problem } from '../../errors/problem';
import type { Context } from '../../integrations/context';
import { takeReset } from '../../repositories/invitation.repository';
import { emailKey, findUser, findUserByEmail } from '../../repositories/people.repository';
import { endSessionsOf } from '../session/end-sessions';
import { hashPassword, requireGoodPassword } from '../session/passwords';
import { signInLimits } from '../session/sign-in-limits';
import { mailReset } from './account-mails';
import { hashToken, makeToken } from './tokens';

/** Mails a link to an account's own address; for an unknown one nothing happens, and the answer is the same. */
export async function askForReset(
  tx: Transaction,
  { pool, config }: Context,
  email: string,
  address: string,
): Promise<void> {
  const limits = signInLimits(pool, config.sessionSecret);
  await limits.require(`reset ${emailKey(email)}`, address);
  await limits.failed(`reset ${emailKey(email)}`, address);
  const user = await findUserByEmail(tx.manager, email);
  if (!user || user.status !== 'active') return;
  const made = makeToken(tx.now);
  const { tokenHash, expiresAt } = made;
  // A newer link makes the older ones worthless.
  await tx.manager.update(PasswordReset, { userId: user.id }, { usedAt: tx.now });
  await tx.manager.insert(PasswordReset, { userId: user.id, tokenHash, expiresAt });
  await mailReset(tx, { id: user.id, email: user.email, name: user.displayName }, made);
}

export async function resetPassword(
  tx: Transaction,
  { token, password }: { token: string; password: string },
): Promise<void> {
  const userId = await takeReset(tx.manager, hashToken(token), tx.now);
  const user = userId === null ? null : await findUser(tx.manager, userId);
  if (!user || user.status !== 'active') throw new Problem('gone');
  requireGoodPassword(password, [user.email, user.displayName]);
  await tx.manager.update(User, { id: user.id }, { passwordHash: await hashPassword(password) });
  await endSessionsOf(tx, user.id);
  recordEvent(tx, { act: 'password.reset', after: { userId: user.id } });
}
