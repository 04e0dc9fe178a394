import type { EntityManager, QueryDeepPartialEntity } from 'typeorm';
import { FileImport, ImportRow } from '../entities/file.entities';
import { accessibleBy } from '../policies/accessible-by';
import type { AppAbility } from '../../shared/policies/subjects';

export async function findImport(
  manager: EntityManager,
  ability: AppAbility,
  applicationId: string,
  id: string,
): Promise<FileImport | null> {
  const query = manager
    .createQueryBuilder(FileImport, 'file')
    .where('file.applicationId = :applicationId AND file.id = :id', { applicationId, id });
  return accessibleBy(query, ability, 'read', 'Import').getOne();
}

export async function importRows(manager: EntityManager, importId: string): Promise<ImportRow[]> {
  return manager.find(ImportRow, { where: { importId }, order: { ordinal: 'ASC' } });
}

export async function insertImport(
  manager: EntityManager,
  values: QueryDeepPartialEntity<FileImport>,
  rows: readonly Omit<QueryDeepPartialEntity<ImportRow>, 'importId'>[],
): Promise<string> {
  const result = await manager.insert(FileImport, values);
  const importId = result.identifiers[0]?.['id'] as string;
  if (rows.length > 0)
    await manager.insert(
      ImportRow,
      rows.map((row) => ({ ...row, importId })),
    );
  return importId;
}
