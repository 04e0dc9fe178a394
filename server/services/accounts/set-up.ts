import { timingSafeEqual } from 'node:crypto';
import type { SetUpRequest } from '../../../shared/contracts/api.generated';
import { recordEvent } from '../../database/audit/record-event';
import type { Transaction } from '../../database/transaction';
import { Membership, Organisation, User } from '../../entities/people.entities';
import { Problem } from '../../errors/problem';
import type { Context } from '../../integrations/context';
import { emailKey } from '../../repositories/people.repository';
import { hashPassword, requireGoodPassword } from '../session/passwords';

function matches(given: string, wanted: string): boolean {
  const [a, b] = [Buffer.from(given), Buffer.from(wanted)];
  return a.length === b.length && timingSafeEqual(a, b);
}

/** The first start: the grid owner and its first administrator. Once there is anybody, this door is shut for good. */
export async function setUp(tx: Transaction, { setUpToken }: Context, request: SetUpRequest): Promise<void> {
  const { token, organisation, name, email, password } = request;
  if (setUpToken === null || !matches(token, setUpToken)) throw new Problem('gone');
  // Two at once: the second one waits here and then finds somebody.
  await tx.manager.query('SELECT pg_advisory_xact_lock(hashtext($1))', ['first-run set-up']);
  if (await tx.manager.exists(User)) throw new Problem('gone');
  requireGoodPassword(password, [email, name, organisation]);
  const owner = await tx.manager.insert(Organisation, {
    name: organisation,
    kind: 'owner',
    createdAt: tx.now,
  });
  const user = {
    email,
    emailKey: emailKey(email),
    displayName: name,
    passwordHash: await hashPassword(password),
  };
  const made = await tx.manager.insert(User, { ...user, createdAt: tx.now });
  const [orgId, userId] = [String(owner.identifiers[0]?.id), String(made.identifiers[0]?.id)];
  await tx.manager.insert(Membership, { userId, orgId, role: 'administrator' });
  recordEvent(tx, { act: 'set-up.completed', after: { organisation, administrator: userId } });
}
