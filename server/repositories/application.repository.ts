import { randomInt } from 'node:crypto';
import type { EntityManager, QueryDeepPartialEntity } from 'typeorm';
import { Application, Round } from '../entities/case.entities';
import { accessibleBy } from '../policies/accessible-by';
import type { Action, AppAbility } from '../../shared/policies/subjects';
import { drawApplicationNumber, isApplicationNumber } from '../../shared/workflow/application-number';

const UUID = /^[0-9a-f]{8}-[0-9a-f]{4}-[0-9a-f]{4}-[0-9a-f]{4}-[0-9a-f]{12}$/i;
const DRAWS = 200;

/** The application of a UUID or a number, where the ability lets it be seen; else nothing, whatever the reason. */
export async function findApplication(
  manager: EntityManager,
  ability: AppAbility,
  reference: string,
  action: Action = 'read',
): Promise<Application | null> {
  const column = isApplicationNumber(reference) ? 'number' : 'id';
  if (column === 'id' && !UUID.test(reference)) return null;
  const query = manager
    .createQueryBuilder(Application, 'application')
    .where(`application.${column} = :reference`, { reference });
  return accessibleBy(query, ability, action, 'Application').getOne();
}

/** The round that counts: the newest one; for the owner's people the newest that was ever filed. */
export async function latestRound(
  manager: EntityManager,
  applicationId: string,
  sees: 'drafts' | 'filed',
): Promise<Round | null> {
  const query = manager
    .createQueryBuilder(Round, 'round')
    .where('round.applicationId = :applicationId', { applicationId })
    .orderBy('round.ordinal', 'DESC')
    .limit(1);
  if (sees === 'filed') query.andWhere('round.filedAt IS NOT NULL');
  return query.getOne();
}

/** Reads the round again and holds it until the transaction ends: steps of one case come one after the other. */
export async function lockRound(manager: EntityManager, roundId: string): Promise<Round> {
  return manager
    .createQueryBuilder(Round, 'round')
    .setLock('pessimistic_write')
    .where('round.id = :roundId', { roundId })
    .getOneOrFail();
}

export async function findRound(manager: EntityManager, roundId: string): Promise<Round | null> {
  return manager.findOneBy(Round, { id: roundId });
}

/** A number that nobody has. Needs the sight of the whole table. */
export async function drawFreeNumber(manager: EntityManager, year: number): Promise<string> {
  for (let draw = 0; draw < DRAWS; draw++) {
    const number = drawApplicationNumber(year, () => randomInt(2 ** 32) / 2 ** 32);
    if (!(await manager.existsBy(Application, { number }))) return number;
  }
  throw new Error(`no free number was found for ${year} in ${DRAWS} draws`);
}

export async function insertApplication(
  manager: EntityManager,
  values: QueryDeepPartialEntity<Application>,
): Promise<string> {
  const result = await manager.insert(Application, values);
  return result.identifiers[0]?.['id'] as string;
}

export async function insertRound(
  manager: EntityManager,
  values: QueryDeepPartialEntity<Round>,
): Promise<string> {
  const result = await manager.insert(Round, values);
  return result.identifiers[0]?.['id'] as string;
}

export async function touchApplication(
  manager: EntityManager,
  applicationId: string,
  now: Date,
  changes: QueryDeepPartialEntity<Application> = {},
): Promise<void> {
  await manager.update(Application, { id: applicationId }, { ...changes, updatedAt: now });
}
