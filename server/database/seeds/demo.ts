import { In } from 'typeorm';
import type { DataSource } from 'typeorm';
import { User } from '../../entities/people.entities';
import { emailKey } from '../../repositories/people.repository';
import { DEMO_ACCOUNTS } from '../../services/accounts/demo-accounts';
import { seedPeople } from './demo-people';
import { Stage } from './demo-stage';
import { playFellgate, playLintgarth, playSkerrow } from './demo-story';

/**
 * Fills an empty database with the demo scenario, by filing through the product's own services. Does nothing where
 * there is anybody already. Answers whether it did.
 */
export async function seedDemo(owner: DataSource, publicUrl: URL, now: Date): Promise<boolean> {
  if (await owner.manager.exists(User)) return false;
  const cast = await owner.transaction((manager) => seedPeople(manager, now));
  const stage = new Stage(owner, publicUrl, now);
  await playFellgate(stage, cast);
  await playSkerrow(stage, cast);
  await playLintgarth(stage, cast);
  return true;
}

/** Whether the people in the database are the demo's, rather than those of a real set-up. */
export function holdsDemo(owner: DataSource): Promise<boolean> {
  return owner.manager.existsBy(User, { emailKey: In(DEMO_ACCOUNTS.map(({ email }) => emailKey(email))) });
}
