import { In, IsNull, type EntityManager, type QueryDeepPartialEntity } from 'typeorm';
import { Countersign, Disposition } from '../entities/review.entities';
import { accessibleBy } from '../policies/accessible-by';
import type { AppAbility } from '../../shared/policies/subjects';

export async function standingDispositions(
  manager: EntityManager,
  revisionId: string,
): Promise<Disposition[]> {
  return manager.findBy(Disposition, { revisionId, revokedAt: IsNull() });
}

export async function insertDispositions(
  manager: EntityManager,
  dispositions: QueryDeepPartialEntity<Disposition>[],
): Promise<void> {
  if (dispositions.length > 0) await manager.insert(Disposition, dispositions);
}

/** Takes back what stands for a discrepancy's findings on a revision, as when it is reopened. */
export async function revokeDispositions(
  manager: EntityManager,
  revisionId: string,
  discrepancyId: string,
  now: Date,
): Promise<void> {
  await manager.update(Disposition, { revisionId, discrepancyId, revokedAt: IsNull() }, { revokedAt: now });
}

export async function revokeByIds(manager: EntityManager, ids: readonly string[], now: Date): Promise<void> {
  if (ids.length > 0) await manager.update(Disposition, { id: In([...ids]) }, { revokedAt: now });
}

/** Proposals that wait for a second reviewer on a revision. */
export async function pendingCountersigns(
  manager: EntityManager,
  revisionId: string,
): Promise<Countersign[]> {
  return manager.findBy(Countersign, { revisionId, outcome: 'pending' });
}

export async function findCountersign(
  manager: EntityManager,
  ability: AppAbility,
  id: string,
): Promise<Countersign | null> {
  const query = manager.createQueryBuilder(Countersign, 'countersign').where('countersign.id = :id', { id });
  return accessibleBy(query, ability, 'read', 'Countersign').getOne();
}

export async function listCountersigns(manager: EntityManager, ability: AppAbility): Promise<Countersign[]> {
  const query = manager
    .createQueryBuilder(Countersign, 'countersign')
    .orderBy('countersign.proposedAt', 'DESC')
    .limit(500);
  return accessibleBy(query, ability, 'read', 'Countersign').getMany();
}

export async function countersignsByIds(
  manager: EntityManager,
  ids: readonly string[],
): Promise<Map<string, Countersign>> {
  if (ids.length === 0) return new Map();
  const rows = await manager
    .createQueryBuilder(Countersign, 'countersign')
    .where('countersign.id IN (:...ids)', { ids })
    .getMany();
  return new Map(rows.map((row) => [row.id, row]));
}

export async function insertCountersign(
  manager: EntityManager,
  values: QueryDeepPartialEntity<Countersign>,
): Promise<string> {
  const result = await manager.insert(Countersign, values);
  return result.identifiers[0]?.['id'] as string;
}

/** Where a proposal stands: its application's number, its revision's letter, and whether both still hold. */
export interface CountersignPlace {
  number: string;
  letter: string;
  /** The revision is the current one and the case is in review. */
  current: boolean;
}

/** Places of proposals that have been read under the ability, by id. */
export async function countersignPlaces(
  manager: EntityManager,
  ids: readonly string[],
): Promise<ReadonlyMap<string, CountersignPlace>> {
  const rows = await manager.query<({ id: string } & CountersignPlace)[]>(
    `SELECT c.id, a.number, v.letter,
        r.state = 'in-review' AND v.ordinal = (SELECT max(w.ordinal) FROM revisions w WHERE w.application_id = a.id)
          AS current
       FROM countersigns c JOIN applications a ON a.id = c.application_id
       JOIN revisions v ON v.id = c.revision_id JOIN rounds r ON r.id = v.round_id
      WHERE c.id = ANY($1::uuid[])`,
    [ids],
  );
  return new Map(rows.map(({ id, ...place }) => [id, place]));
}
