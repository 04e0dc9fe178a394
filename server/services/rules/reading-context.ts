import type { EntityManager } from 'typeorm';
import { conductorLibrary } from '../../repositories/conductor.repository';
import { currentRuleSet } from '../../repositories/rule-set.repository';
import type { ReadContext } from '../../../shared/filing/read-filing';

/** What a filing is read with now: the library's current version and what the owner assumes where nothing is said. */
export async function readingContext(manager: EntityManager): Promise<ReadContext> {
  const { rules } = await currentRuleSet(manager);
  return { library: await conductorLibrary(manager), owner: rules.owner };
}
