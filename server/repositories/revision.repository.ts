import type { EntityManager, QueryDeepPartialEntity } from 'typeorm';
import { LineVersion, Revision, RevisionLine } from '../entities/filed.entities';
import { accessibleBy } from '../policies/accessible-by';
import type { AppAbility } from '../../shared/policies/subjects';

/** A line of a revision with its content. */
export interface FiledLine {
  lineKey: string;
  ordinal: number;
  lineHash: string;
  name: string;
  nominalVoltageKv: number;
  frequencyHz: number;
  lengthKm: number;
  body: Record<string, unknown>;
}

export async function latestRevision(
  manager: EntityManager,
  applicationId: string,
): Promise<Revision | null> {
  return manager.findOne(Revision, { where: { applicationId }, order: { ordinal: 'DESC' } });
}

export async function listRevisions(
  manager: EntityManager,
  ability: AppAbility,
  applicationId: string,
): Promise<Revision[]> {
  const query = manager
    .createQueryBuilder(Revision, 'revision')
    .where('revision.applicationId = :applicationId', { applicationId })
    .orderBy('revision.ordinal', 'DESC');
  return accessibleBy(query, ability, 'read', 'Revision').getMany();
}

export async function findRevision(
  manager: EntityManager,
  ability: AppAbility,
  applicationId: string,
  letter: string,
): Promise<Revision | null> {
  const query = manager
    .createQueryBuilder(Revision, 'revision')
    .where('revision.applicationId = :applicationId AND revision.letter = :letter', {
      applicationId,
      letter,
    });
  return accessibleBy(query, ability, 'read', 'Revision').getOne();
}

export async function revisionBefore(manager: EntityManager, revision: Revision): Promise<Revision | null> {
  if (revision.ordinal === 1) return null;
  return manager.findOneBy(Revision, {
    applicationId: revision.applicationId,
    ordinal: revision.ordinal - 1,
  });
}

/** Letters of revisions by id. */
export async function revisionLetters(
  manager: EntityManager,
  applicationId: string,
): Promise<Map<string, string>> {
  const rows = await manager.find(Revision, { where: { applicationId }, select: { id: true, letter: true } });
  return new Map(rows.map((row) => [row.id, row.letter]));
}

/** Lines of revisions, by revision id, in filing order. */
export async function linesOfRevisions(
  manager: EntityManager,
  revisionIds: readonly string[],
): Promise<Map<string, FiledLine[]>> {
  const lines = new Map<string, FiledLine[]>(revisionIds.map((id) => [id, []]));
  if (revisionIds.length === 0) return lines;
  const rows = await manager
    .createQueryBuilder(RevisionLine, 'line')
    .innerJoin(LineVersion, 'content', 'content.orgId = line.orgId AND content.hash = line.lineHash')
    .select('line.revision_id', 'revisionId')
    .addSelect('line.line_key', 'lineKey')
    .addSelect('line.ordinal', 'ordinal')
    .addSelect('line.line_hash', 'lineHash')
    .addSelect('content.name', 'name')
    .addSelect('content.nominal_voltage_kv', 'nominalVoltageKv')
    .addSelect('content.frequency_hz', 'frequencyHz')
    .addSelect('content.length_km', 'lengthKm')
    .addSelect('content.body', 'body')
    .where('line.revisionId IN (:...revisionIds)', { revisionIds })
    .orderBy('line.ordinal')
    .getRawMany<FiledLine & { revisionId: string }>();
  for (const { revisionId, ...line } of rows) lines.get(revisionId)?.push(line);
  return lines;
}

export async function linesOfRevision(manager: EntityManager, revisionId: string): Promise<FiledLine[]> {
  return (await linesOfRevisions(manager, [revisionId])).get(revisionId) ?? [];
}

export async function insertRevision(
  manager: EntityManager,
  values: QueryDeepPartialEntity<Revision>,
): Promise<Revision> {
  const result = await manager.insert(Revision, values);
  return manager.findOneByOrFail(Revision, { id: result.identifiers[0]?.['id'] as string });
}

/** Keeps each content once for an organisation; equal lines of other revisions are there already. */
export async function insertRevisionLines(
  manager: EntityManager,
  revision: Pick<Revision, 'id' | 'orgId'>,
  lines: readonly FiledLine[],
): Promise<void> {
  const { orgId } = revision;
  await manager
    .createQueryBuilder()
    .insert()
    .into(LineVersion)
    .values(
      lines.map(({ lineHash, body, name, nominalVoltageKv, frequencyHz, lengthKm }) => ({
        orgId,
        hash: lineHash,
        body: body as never,
        name,
        nominalVoltageKv,
        frequencyHz,
        lengthKm,
      })),
    )
    .orIgnore()
    .updateEntity(false)
    .execute();
  await manager.insert(
    RevisionLine,
    lines.map(({ lineKey, ordinal, lineHash }) => ({
      revisionId: revision.id,
      lineKey,
      orgId,
      ordinal,
      lineHash,
    })),
  );
}
