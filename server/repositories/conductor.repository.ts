import { createHash } from 'node:crypto';
import type { EntityManager } from 'typeorm';
import type { ConductorLibrary, LibraryConductor } from '../../shared/library/types';

interface Row {
  data: LibraryConductor;
  retired: boolean;
  ordinal: number;
}

const VERSIONS = `SELECT v.data, v.retired, v.ordinal
  FROM conductors c JOIN LATERAL (
    SELECT * FROM conductor_versions x WHERE x.conductor_id = c.id ORDER BY x.ordinal DESC LIMIT 1) v ON true
  ORDER BY c.name`;

/** The library's conductors in their current versions, by name; retired ones too. */
export async function listConductors(manager: EntityManager): Promise<Row[]> {
  return manager.query<Row[]>(VERSIONS);
}

/** The library that may be chosen from. Its version names the rows that it holds. */
export async function conductorLibrary(manager: EntityManager): Promise<ConductorLibrary> {
  const rows = (await listConductors(manager)).filter((row) => !row.retired);
  return { version: libraryVersion(rows), conductors: rows.map((row) => row.data) };
}

export function libraryVersion(rows: readonly Row[]): string {
  const text = rows.map((row) => `${row.data.name} ${row.ordinal}`).join('\n');
  return createHash('sha256').update(text).digest('hex').slice(0, 12);
}
