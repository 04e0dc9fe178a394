import type { Context } from '../../integrations/context';
import type { Transaction } from '../../database/transaction';
import { Problem } from '../../errors/problem';
import type { SessionDoor, SessionState } from '../../integrations/session-door';
import { findUser } from '../../repositories/people.repository';
import { enrolSecondFactor, takeCode } from './second-factor';
import { signInLimits } from './sign-in-limits';

function halfState(door: SessionDoor): SessionState {
  const { state } = door;
  if (!state) throw new Problem('not-signed-in');
  return state;
}

/** The second step of sign-in: a right code makes the half session a whole one, under a new id. */
export async function verifyTotp(
  tx: Transaction,
  { config, pool }: Context,
  door: SessionDoor,
  { code, address }: { code: string; address: string },
): Promise<SessionState> {
  const { userId, orgId, idleMinutes, signedInAt } = halfState(door);
  const limits = signInLimits(pool, config.sessionSecret);
  const key = `totp ${userId}`;
  await limits.require(key, address);
  try {
    await takeCode(tx, userId, code, config.sessionSecret);
  } catch (error) {
    await limits.failed(key, address);
    throw error;
  }
  await limits.succeeded(key, address);
  return door.begin({ userId, orgId, idleMinutes, signedInAt, stage: 'full' });
}

/** A first second factor, for somebody who is signed in or on the way there. */
export async function enrolTotp(tx: Transaction, { config }: Context, door: SessionDoor) {
  const user = await findUser(tx.manager, halfState(door).userId);
  if (!user) throw new Problem('not-signed-in');
  return enrolSecondFactor(tx, user, config.sessionSecret);
}
