import type { UserActor } from '../../database/actor';
import { recordEvent } from '../../database/audit/record-event';
import type { Transaction } from '../../database/transaction';
import { User } from '../../entities/people.entities';
import { invalidContent, Problem } from '../../errors/problem';
import type { SessionDoor, SessionState } from '../../integrations/session-door';
import { findUser } from '../../repositories/people.repository';
import { endSessionsOf } from './end-sessions';
import { hashPassword, passwordMatches, requireGoodPassword } from './passwords';

/** A new password for the own account; all other sessions end, this one gets a new id. */
export async function changePassword(
  tx: Transaction,
  actor: UserActor,
  door: SessionDoor,
  { present, password }: { present: string; password: string },
): Promise<SessionState> {
  const user = await findUser(tx.manager, actor.userId);
  const { state } = door;
  if (!user || !state) throw new Problem('not-signed-in');
  if (!(await passwordMatches(user.passwordHash, present))) {
    throw invalidContent([
      {
        pointer: '/present',
        value: null,
        expected: 'the present password',
        message: 'This is not the present password.',
      },
    ]);
  }
  requireGoodPassword(password, [user.email, user.displayName]);
  await tx.manager.update(User, { id: user.id }, { passwordHash: await hashPassword(password) });
  await endSessionsOf(tx, user.id, door.id);
  recordEvent(tx, { act: 'password.changed', after: { userId: user.id } });
  return door.begin(state);
}
