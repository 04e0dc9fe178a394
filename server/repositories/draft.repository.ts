import type { EntityManager, QueryDeepPartialEntity } from 'typeorm';
import { DraftLine } from '../entities/case.entities';

/** Lines of a round's draft in filing order. */
export async function draftLines(manager: EntityManager, roundId: string): Promise<DraftLine[]> {
  return manager.find(DraftLine, { where: { roundId }, order: { ordinal: 'ASC', lineKey: 'ASC' } });
}

export async function findDraftLine(
  manager: EntityManager,
  roundId: string,
  lineKey: string,
): Promise<DraftLine | null> {
  return manager.findOneBy(DraftLine, { roundId, lineKey });
}

export async function insertDraftLines(
  manager: EntityManager,
  lines: QueryDeepPartialEntity<DraftLine>[],
): Promise<void> {
  if (lines.length > 0) await manager.insert(DraftLine, lines);
}

/** False when somebody else removed or changed it meanwhile. */
export async function removeDraftLine(
  manager: EntityManager,
  line: Pick<DraftLine, 'id' | 'version'>,
): Promise<boolean> {
  const result = await manager.delete(DraftLine, { id: line.id, version: line.version });
  return result.affected === 1;
}

/** The number behind the highest line key that the application ever had: keys are never given twice. */
export async function highestLineKey(manager: EntityManager, applicationId: string): Promise<number> {
  const [row] = await manager.query<{ highest: number | null }[]>(
    `SELECT max(substr(line_key, 2)::int) AS highest FROM (
       SELECT d.line_key FROM draft_lines d JOIN rounds r ON r.id = d.round_id WHERE r.application_id = $1
       UNION ALL
       SELECT l.line_key FROM revision_lines l JOIN revisions v ON v.id = l.revision_id WHERE v.application_id = $1
     ) keys`,
    [applicationId],
  );
  return row?.highest ?? 0;
}
