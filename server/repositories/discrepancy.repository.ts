import type { EntityManager, QueryDeepPartialEntity } from 'typeorm';
import { Discrepancy, DiscrepancyEntry, DiscrepancyFinding } from '../entities/review.entities';
import { Finding } from '../entities/verdict.entities';
import { accessibleBy } from '../policies/accessible-by';
import type { AppAbility } from '../../shared/policies/subjects';

/** The finding that a discrepancy was raised from: what names the matter in later revisions too. */
export interface RaisedFrom {
  discrepancyId: string;
  lineKey: string;
  fingerprint: string;
  code: string;
  circuit: number | null;
  section: number | null;
  position: number | null;
  grade: Finding['grade'];
}

export async function listDiscrepancies(
  manager: EntityManager,
  ability: AppAbility,
  applicationId: string,
): Promise<Discrepancy[]> {
  const query = manager
    .createQueryBuilder(Discrepancy, 'discrepancy')
    .where('discrepancy.applicationId = :applicationId', { applicationId })
    .orderBy('discrepancy.number');
  return accessibleBy(query, ability, 'read', 'Discrepancy').getMany();
}

export async function discrepanciesOfRound(manager: EntityManager, roundId: string): Promise<Discrepancy[]> {
  return manager.find(Discrepancy, { where: { roundId }, order: { number: 'ASC' } });
}

export async function findDiscrepancy(
  manager: EntityManager,
  ability: AppAbility,
  applicationId: string,
  number: number,
): Promise<Discrepancy | null> {
  const query = manager
    .createQueryBuilder(Discrepancy, 'discrepancy')
    .where('discrepancy.applicationId = :applicationId AND discrepancy.number = :number', {
      applicationId,
      number,
    });
  return accessibleBy(query, ability, 'read', 'Discrepancy').getOne();
}

export async function nextDiscrepancyNumber(manager: EntityManager, applicationId: string): Promise<number> {
  return 1 + ((await manager.maximum(Discrepancy, 'number', { applicationId })) ?? 0);
}

export async function insertDiscrepancy(
  manager: EntityManager,
  values: QueryDeepPartialEntity<Discrepancy>,
  findings: readonly Finding[],
): Promise<string> {
  const result = await manager.insert(Discrepancy, values);
  const discrepancyId = result.identifiers[0]?.['id'] as string;
  if (findings.length > 0) {
    await manager.insert(
      DiscrepancyFinding,
      findings.map(({ id, orgId, lineKey, fingerprint }) => ({
        discrepancyId,
        findingId: id,
        orgId,
        lineKey,
        fingerprint,
      })),
    );
  }
  return discrepancyId;
}

/** Threads by discrepancy id, oldest entry first. */
export async function entriesOf(
  manager: EntityManager,
  discrepancyIds: readonly string[],
): Promise<DiscrepancyEntry[]> {
  if (discrepancyIds.length === 0) return [];
  return manager
    .createQueryBuilder(DiscrepancyEntry, 'entry')
    .where('entry.discrepancyId IN (:...discrepancyIds)', { discrepancyIds })
    .orderBy('entry.ordinal')
    .getMany();
}

/** Adds to a thread; the round is held, so that no two entries take one place. */
export async function addEntry(
  manager: EntityManager,
  entry: Omit<QueryDeepPartialEntity<DiscrepancyEntry>, 'ordinal'> & { discrepancyId: string },
): Promise<void> {
  const last = await manager.maximum(DiscrepancyEntry, 'ordinal', { discrepancyId: entry.discrepancyId });
  await manager.insert(DiscrepancyEntry, { ...entry, ordinal: (last ?? 0) + 1 });
}

export async function raisedFrom(
  manager: EntityManager,
  discrepancyIds: readonly string[],
): Promise<RaisedFrom[]> {
  if (discrepancyIds.length === 0) return [];
  return manager
    .createQueryBuilder(DiscrepancyFinding, 'link')
    .innerJoin(Finding, 'finding', 'finding.id = link.findingId')
    .select('link.discrepancy_id', 'discrepancyId')
    .addSelect('link.line_key', 'lineKey')
    .addSelect('link.fingerprint', 'fingerprint')
    .addSelect('finding.code', 'code')
    .addSelect('finding.circuit', 'circuit')
    .addSelect('finding.section', 'section')
    .addSelect('finding.position', 'position')
    .addSelect('finding.grade', 'grade')
    .where('link.discrepancyId IN (:...discrepancyIds)', { discrepancyIds })
    .orderBy('finding.ordinal')
    .getRawMany<RaisedFrom>();
}

/** Which of these discrepancies have gone out in a letter. */
export async function sentDiscrepancies(
  manager: EntityManager,
  discrepancyIds: readonly string[],
): Promise<ReadonlySet<string>> {
  const rows = await manager.query<{ id: string }[]>(
    'SELECT DISTINCT discrepancy_id AS id FROM letter_discrepancies WHERE discrepancy_id = ANY($1)',
    [discrepancyIds],
  );
  return new Set(rows.map((row) => row.id));
}
