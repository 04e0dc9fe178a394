import type { EntityManager, QueryDeepPartialEntity } from 'typeorm';
import { CheckRun, Finding, RunValue } from '../entities/verdict.entities';
import type { LineReport } from '../../shared/checks/types';

/** A run without its report, which is large and wanted by few. */
export type RunHead = Omit<CheckRun, 'report'>;

const HEAD = {
  id: true,
  orgId: true,
  revisionId: true,
  ordinal: true,
  ruleSetId: true,
  status: true,
  governing: true,
  engineVersion: true,
  linesTotal: true,
  linesDone: true,
  failure: true,
  requestedBy: true,
  queuedAt: true,
  startedAt: true,
  finishedAt: true,
} as const;

export async function governingRun(manager: EntityManager, revisionId: string): Promise<RunHead | null> {
  return manager.findOne(CheckRun, { where: { revisionId, governing: true }, select: HEAD });
}

export async function listRuns(manager: EntityManager, revisionId: string): Promise<RunHead[]> {
  return manager.find(CheckRun, { where: { revisionId }, select: HEAD, order: { ordinal: 'DESC' } });
}

export async function findRun(
  manager: EntityManager,
  revisionId: string,
  ordinal: number,
): Promise<RunHead | null> {
  return manager.findOne(CheckRun, { where: { revisionId, ordinal }, select: HEAD });
}

export async function findRunById(manager: EntityManager, id: string): Promise<RunHead | null> {
  return manager.findOne(CheckRun, { where: { id }, select: HEAD });
}

/** Holds the run until the transaction ends, so that it is worked on once. */
export async function lockRun(manager: EntityManager, id: string): Promise<RunHead | null> {
  return manager
    .createQueryBuilder(CheckRun, 'run')
    .setLock('pessimistic_write')
    .where('run.id = :id', { id })
    .getOne();
}

/** One line's part of a run's report. */
export async function lineReport(
  manager: EntityManager,
  runId: string,
  index: number,
): Promise<LineReport | null> {
  const [row] = await manager.query<{ line: LineReport | null }[]>(
    `SELECT report -> 'lines' -> $2::int AS line FROM check_runs WHERE id = $1`,
    [runId, index],
  );
  return row?.line ?? null;
}

export async function insertRun(
  manager: EntityManager,
  values: QueryDeepPartialEntity<CheckRun>,
): Promise<string> {
  const result = await manager.insert(CheckRun, values);
  return result.identifiers[0]?.['id'] as string;
}

export async function updateRun(
  manager: EntityManager,
  id: string,
  changes: QueryDeepPartialEntity<CheckRun>,
): Promise<void> {
  await manager.update(CheckRun, { id }, changes);
}

const BATCH = 500;

async function insertInBatches<T extends object>(
  rows: readonly T[],
  insert: (part: T[]) => Promise<unknown>,
): Promise<void> {
  // PostgreSQL takes 65,535 parameters a statement
  for (let from = 0; from < rows.length; from += BATCH) await insert(rows.slice(from, from + BATCH));
}

export async function insertResults(
  manager: EntityManager,
  findings: readonly Omit<Finding, 'id'>[],
  values: readonly RunValue[],
): Promise<void> {
  await insertInBatches(findings, (part) => manager.insert(Finding, part as never));
  await insertInBatches(values, (part) => manager.insert(RunValue, part));
}

export async function findingsOfRun(
  manager: EntityManager,
  runId: string,
  lineKey?: string,
): Promise<Finding[]> {
  return manager.find(Finding, {
    where: lineKey === undefined ? { runId } : { runId, lineKey },
    order: { ordinal: 'ASC' },
  });
}

export async function valuesOfRun(
  manager: EntityManager,
  runId: string,
  lineKey: string,
): Promise<RunValue[]> {
  return manager.findBy(RunValue, { runId, lineKey });
}
