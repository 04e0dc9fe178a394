import type { Context } from '../../integrations/context';
import type { Transaction } from '../../database/transaction';
import { User } from '../../entities/people.entities';
import { Problem } from '../../errors/problem';
import type { SessionDoor, SessionState } from '../../integrations/session-door';
import {
  emailKey,
  findUserByEmail,
  hasSecondFactor,
  membershipsOf,
} from '../../repositories/people.repository';
import type { MembershipRow } from '../../repositories/people.repository';
import { passwordMatches } from './passwords';
import { signInLimits } from './sign-in-limits';

const OWNER_IDLE_MINUTES = 15;
const APPLICANT_IDLE_MINUTES = 30;

export const idleMinutes = ({ organisationKind }: Pick<MembershipRow, 'organisationKind'>) =>
  organisationKind === 'owner' ? OWNER_IDLE_MINUTES : APPLICANT_IDLE_MINUTES;

/** Unknown name, wrong password, disabled account and account without a role all look and take the same. */
function checkPassword(tx: Transaction) {
  return async (email: string, password: string) => {
    const user = await findUserByEmail(tx.manager, email);
    const matches = await passwordMatches(user?.passwordHash ?? null, password);
    return user && matches && user.status === 'active' ? user : null;
  };
}

export type NextStep = 'totp' | 'totp-enrolment' | null;

/** The second step that this person's sign-in takes: where a factor is in place, and where the role demands one. */
async function secondStep(
  tx: Transaction,
  userId: string,
  memberships: MembershipRow[],
  required: boolean,
): Promise<NextStep> {
  if (await hasSecondFactor(tx.manager, userId)) return 'totp';
  return required && memberships.some((row) => row.organisationKind === 'owner') ? 'totp-enrolment' : null;
}

export interface SignedIn {
  state: SessionState;
  next: NextStep;
}

/** Email and password in; a session that is whole, or half where a second step is to come. */
export async function signIn(
  tx: Transaction,
  { config, pool, log }: Context,
  door: SessionDoor,
  { email, address }: { email: string; address: string },
): Promise<SignedIn> {
  const limits = signInLimits(pool, config.sessionSecret);
  const key = emailKey(email);
  await limits.require(key, address);
  const user = await door.authenticate(checkPassword(tx));
  const memberships = user ? await membershipsOf(tx.manager, [user.id]) : [];
  const [first] = memberships;
  if (!user || !first) {
    await limits.failed(key, address);
    log.info({ event: 'sign-in-refused', address }, 'sign-in refused');
    throw new Problem('sign-in-refused');
  }
  await limits.succeeded(key, address);
  const next = await secondStep(tx, user.id, memberships, config.totpRequired);
  const stage = next ? 'half' : 'full';
  const state = await door.begin({
    userId: user.id,
    orgId: first.orgId,
    stage,
    idleMinutes: idleMinutes(first),
  });
  await tx.manager.update(User, { id: user.id }, { lastSignInAt: tx.now });
  log.info({ event: 'signed-in', userId: user.id, stage }, 'signed in');
  return { state, next };
}
