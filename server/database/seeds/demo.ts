import type { DataSource } from 'typeorm';
import { User } from '../../entities/people.entities';
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
