import { IsNull, type EntityManager, type QueryDeepPartialEntity } from 'typeorm';
import { CaseWindow, Letter, LetterDiscrepancy } from '../entities/correspondence.entities';
import { Decision } from '../entities/review.entities';
import { accessibleBy } from '../policies/accessible-by';
import type { AppAbility } from '../../shared/policies/subjects';

/** A letter without its bytes. */
export type LetterHead = Omit<Letter, 'bytes'>;

export async function windowsOfRound(manager: EntityManager, roundId: string): Promise<CaseWindow[]> {
  return manager.find(CaseWindow, { where: { roundId }, order: { openedAt: 'ASC' } });
}

export async function windowsOfApplication(
  manager: EntityManager,
  applicationId: string,
): Promise<CaseWindow[]> {
  return manager
    .createQueryBuilder(CaseWindow, 'span')
    .innerJoin('rounds', 'round', 'round.id = span.round_id')
    .where('round.application_id = :applicationId', { applicationId })
    .orderBy('span.openedAt')
    .getMany();
}

export async function closeWindows(manager: EntityManager, roundId: string, now: Date): Promise<void> {
  await manager.update(CaseWindow, { roundId, closedAt: IsNull() }, { closedAt: now });
}

export async function insertWindow(
  manager: EntityManager,
  values: QueryDeepPartialEntity<CaseWindow>,
): Promise<void> {
  await manager.insert(CaseWindow, values);
}

export async function decisionOfRound(manager: EntityManager, roundId: string): Promise<Decision | null> {
  return manager.findOneBy(Decision, { roundId });
}

export async function insertDecision(
  manager: EntityManager,
  values: QueryDeepPartialEntity<Decision>,
): Promise<string> {
  const result = await manager.insert(Decision, values);
  return result.identifiers[0]?.['id'] as string;
}

export async function nextLetterNumber(manager: EntityManager, applicationId: string): Promise<number> {
  return 1 + ((await manager.maximum(Letter, 'number', { applicationId })) ?? 0);
}

export async function insertLetter(
  manager: EntityManager,
  values: QueryDeepPartialEntity<Letter>,
  discrepancyIds: readonly string[],
): Promise<string> {
  const result = await manager.insert(Letter, values);
  const letterId = result.identifiers[0]?.['id'] as string;
  if (discrepancyIds.length > 0) {
    await manager.insert(
      LetterDiscrepancy,
      discrepancyIds.map((discrepancyId) => ({ letterId, discrepancyId, orgId: values.orgId as string })),
    );
  }
  return letterId;
}

/** Bytes of a letter, where the ability lets it be seen. */
export async function letterWithBytes(
  manager: EntityManager,
  ability: AppAbility,
  applicationId: string,
  number: number,
): Promise<Letter | null> {
  const query = manager
    .createQueryBuilder(Letter, 'letter')
    .addSelect('letter.bytes')
    .where('letter.applicationId = :applicationId AND letter.number = :number', { applicationId, number });
  return accessibleBy(query, ability, 'read', 'Letter').getOne();
}

/** Numbers of the discrepancies in letters, by letter id. */
export async function discrepanciesInLetters(
  manager: EntityManager,
  letterIds: readonly string[],
): Promise<Map<string, number[]>> {
  if (letterIds.length === 0) return new Map();
  const rows = await manager.query<{ letterId: string; numbers: number[] }[]>(
    `SELECT l.letter_id AS "letterId", array_agg(d.number ORDER BY d.number) AS numbers
       FROM letter_discrepancies l JOIN discrepancies d ON d.id = l.discrepancy_id
      WHERE l.letter_id = ANY($1) GROUP BY l.letter_id`,
    [letterIds],
  );
  return new Map(rows.map((row) => [row.letterId, row.numbers]));
}

/** When the last letter of a kind went out. */
export async function lastLetterAt(
  manager: EntityManager,
  applicationId: string,
  kind: Letter['kind'],
): Promise<Date | null> {
  const [last] = await manager.find(Letter, {
    where: { applicationId, kind },
    order: { number: 'DESC' },
    take: 1,
  });
  return last?.issuedAt ?? null;
}

/** An open window of a case, with whom it waits for. */
export interface OpenWindow {
  id: string;
  kind: CaseWindow['kind'];
  dueAt: Date;
  applicationId: string;
  orgId: string;
  number: string;
  title: string;
  reviewerId: string | null;
}

/** Open windows that end before an instant, the first to end first. */
export async function openWindowsUntil(manager: EntityManager, until: Date): Promise<OpenWindow[]> {
  return manager.query<OpenWindow[]>(
    `SELECT w.id, w.kind, w.due_at AS "dueAt", a.id AS "applicationId", a.org_id AS "orgId", a.number, a.title,
        r.reviewer_id AS "reviewerId"
       FROM windows w JOIN rounds r ON r.id = w.round_id JOIN applications a ON a.id = r.application_id
      WHERE w.closed_at IS NULL AND w.due_at < $1 ORDER BY w.due_at`,
    [until],
  );
}
