import type { EntityManager } from 'typeorm';
import { Application } from '../entities/case.entities';
import { accessibleBy } from '../policies/accessible-by';
import type { AppAbility } from '../../shared/policies/subjects';
import type { State } from '../../shared/workflow/states';
import type { RunState } from '../../shared/workflow/case-facts';
import type { WindowKind } from '../../shared/workflow/windows';
import { filterSql, GRADE_RANK, type OverviewFilters } from './overview-filters';
import { Parameters, readPage, type Page, type PageQuery } from './paging';

/** An application with its round, revision, window, run and counts: one row of a list. */
export interface OverviewRow {
  id: string;
  number: string;
  title: string;
  orgId: string;
  applicant: string;
  connectionKind: string;
  capacityMw: number | null;
  pointOfConnection: string;
  createdAt: Date;
  updatedAt: Date;
  roundId: string;
  roundOrdinal: number;
  state: State;
  version: number;
  reviewerId: string | null;
  reviewer: string | null;
  revisionId: string | null;
  revision: string | null;
  revisionOrdinal: number;
  filedAt: Date | null;
  filedById: string | null;
  filedBy: string | null;
  windowKind: WindowKind | null;
  windowOpenedAt: Date | null;
  windowDays: number;
  dueAt: Date | null;
  runOrdinal: number | null;
  runStatus: RunState | null;
  runLines: number;
  runLinesDone: number;
  runStartedAt: Date | null;
  runFinishedAt: Date | null;
  runFailure: string | null;
  lineCount: number;
  totalKm: number;
  voltagesKv: number[];
  mustAnswer: number;
  explain: number;
  note: number;
  openDiscrepancies: number;
}

/** Which of an application's rounds counts: the owner's people see none that was never filed. */
export type Sight = 'drafts' | 'filed';

/** The statement behind every list of applications; `seen` holds the ids that the ability lets through. */
function overviewSql(seen: string, sight: Sight): string {
  const filedOnly = sight === 'filed' ? 'AND r.filed_at IS NOT NULL' : '';
  // what a reviewer has raised reaches the applicant with the letter
  const sentOnly =
    sight === 'drafts'
      ? 'AND EXISTS (SELECT 1 FROM letter_discrepancies s WHERE s.discrepancy_id = q.id)'
      : '';
  const draftLines =
    sight === 'drafts' ? '(SELECT count(*)::int FROM draft_lines d WHERE d.round_id = round.id)' : '0';
  // what the applicant changes for the next revision is a draft until it is filed
  const particular = (key: string, column: string, type: string) =>
    sight === 'drafts'
      ? `a.${column}`
      : `(CASE WHEN revision.id IS NULL THEN a.${column} ELSE (revision.particulars ->> '${key}')::${type} END)`;
  return `
    seen AS (${seen}),
    overview AS (
      SELECT a.id, a.number, ${particular('title', 'title', 'text')} AS title, a.org_id AS "orgId", org.name AS applicant,
        ${particular('connectionKind', 'connection_kind', 'text')} AS "connectionKind",
        ${particular('capacityMw', 'capacity_mw', 'double precision')} AS "capacityMw",
        ${particular('pointOfConnection', 'point_of_connection', 'text')} AS "pointOfConnection", a.created_at AS "createdAt", a.updated_at AS "updatedAt",
        round.id AS "roundId", round.ordinal AS "roundOrdinal", round.state, round.version,
        round.reviewer_id AS "reviewerId", reviewer.display_name AS reviewer,
        revision.id AS "revisionId", revision.letter AS revision, coalesce(revision.ordinal, 0) AS "revisionOrdinal",
        revision.filed_at AS "filedAt", revision.filed_by AS "filedById", filer.display_name AS "filedBy",
        span.kind AS "windowKind", span.opened_at AS "windowOpenedAt", coalesce(span.working_days, 0) AS "windowDays",
        span.due_at AS "dueAt",
        run.ordinal AS "runOrdinal", run.status AS "runStatus", coalesce(run.lines_total, 0) AS "runLines",
        coalesce(run.lines_done, 0) AS "runLinesDone", run.started_at AS "runStartedAt",
        run.finished_at AS "runFinishedAt", run.failure AS "runFailure",
        coalesce(filed.line_count, ${draftLines}) AS "lineCount", coalesce(filed.total_km, 0) AS "totalKm",
        coalesce(filed.voltages, '{}') AS "voltagesKv",
        coalesce(grades.must_answer, 0) AS "mustAnswer", coalesce(grades.explain, 0) AS explain,
        coalesce(grades.note, 0) AS note, coalesce(questions.open, 0) AS "openDiscrepancies"
      FROM seen
      JOIN applications a ON a.id = seen.id
      JOIN organisations org ON org.id = a.org_id
      JOIN LATERAL (SELECT * FROM rounds r WHERE r.application_id = a.id ${filedOnly}
                     ORDER BY r.ordinal DESC LIMIT 1) round ON true
      LEFT JOIN users reviewer ON reviewer.id = round.reviewer_id
      LEFT JOIN LATERAL (SELECT * FROM revisions v WHERE v.application_id = a.id
                          ORDER BY v.ordinal DESC LIMIT 1) revision ON true
      LEFT JOIN users filer ON filer.id = revision.filed_by
      LEFT JOIN windows span ON span.round_id = round.id AND span.closed_at IS NULL
      LEFT JOIN check_runs run ON run.revision_id = revision.id AND run.governing
      LEFT JOIN LATERAL (
        SELECT nullif(count(*), 0)::int AS line_count, sum(c.length_km) AS total_km,
          array_agg(DISTINCT c.nominal_voltage_kv ORDER BY c.nominal_voltage_kv DESC) AS voltages
        FROM revision_lines l JOIN line_versions c ON c.org_id = l.org_id AND c.hash = l.line_hash
        WHERE l.revision_id = revision.id) filed ON true
      LEFT JOIN LATERAL (
        SELECT count(*) FILTER (WHERE f.grade = 'must-answer')::int AS must_answer,
          count(*) FILTER (WHERE f.grade = 'explain')::int AS explain,
          count(*) FILTER (WHERE f.grade = 'note')::int AS note
        FROM findings f
        WHERE f.run_id = run.id AND f.follows IS NULL AND NOT EXISTS (
          SELECT 1 FROM dispositions p WHERE p.revision_id = revision.id AND p.line_key = f.line_key
            AND p.fingerprint = f.fingerprint AND p.revoked_at IS NULL)) grades ON true
      LEFT JOIN LATERAL (
        SELECT count(*)::int AS open FROM discrepancies q
        WHERE q.round_id = round.id AND q.state IN ('open', 'answered') ${sentOnly}) questions ON true
    )`;
}

const instant = (column: string, missing: string) =>
  `coalesce(extract(epoch FROM ${column}), ${missing})::double precision`;

/** Sort key → expression, never null, so that a page can go on after any row. */
const SORTS: Readonly<Record<string, string>> = {
  number: 'number',
  title: 'lower(title)',
  applicant: 'lower(applicant)',
  state: `array_position(ARRAY['draft','filed','in-review','returned','accepted','declined','withdrawn'], state)`,
  voltage: `coalesce("voltagesKv"[1], 0)`,
  lines: '"lineCount"',
  grade: GRADE_RANK,
  due: instant('"dueAt"', '1e12'),
  age: instant('"filedAt"', '0'),
  filed: instant('"filedAt"', '0'),
  created: instant('"createdAt"', '0'),
  updated: instant('"updatedAt"', '0'),
  reviewer: `lower(coalesce(reviewer, ''))`,
};

export interface OverviewQuery extends PageQuery {
  sight: Sight;
  filters: OverviewFilters;
}

function seenSql(manager: EntityManager, ability: AppAbility): [string, unknown[]] {
  const query = manager.createQueryBuilder(Application, 'application').select('application.id', 'id');
  return accessibleBy(query, ability, 'read', 'Application').getQueryAndParameters();
}

/** A page of the applications that the ability lets through. */
export async function listOverview(
  manager: EntityManager,
  ability: AppAbility,
  query: OverviewQuery,
): Promise<Page<OverviewRow>> {
  const [seen, values] = seenSql(manager, ability);
  const parameters = new Parameters(values);
  const where = filterSql(query.filters, parameters);
  const withs = `WITH ${overviewSql(seen, query.sight)}, fitting AS (SELECT * FROM overview WHERE ${where})`;
  return readPage(manager, { withs, from: 'fitting', sorts: SORTS, parameters }, query);
}

/** The row of one application that has been read under the ability already. */
export async function overviewOf(
  manager: EntityManager,
  applicationId: string,
  sight: Sight,
): Promise<OverviewRow | null> {
  const rows = await manager.query<OverviewRow[]>(
    `WITH ${overviewSql('SELECT $1::uuid AS id', sight)} SELECT * FROM overview`,
    [applicationId],
  );
  return rows[0] ?? null;
}

/** Counts over all open applications, whatever the filters. */
export async function queueCounts(
  manager: EntityManager,
  ability: AppAbility,
  userId: string,
  now: Date,
): Promise<{ mine: number; everyone: number; nobody: number; overdue: number }> {
  const [seen, values] = seenSql(manager, ability);
  const parameters = new Parameters(values);
  const me = parameters.add(userId);
  const present = parameters.add(now);
  const [row] = await manager.query<{ mine: number; everyone: number; nobody: number; overdue: number }[]>(
    `WITH ${overviewSql(seen, 'filed')}
     SELECT count(*)::int AS everyone, count(*) FILTER (WHERE "reviewerId" = ${me})::int AS mine,
       count(*) FILTER (WHERE "reviewerId" IS NULL)::int AS nobody,
       count(*) FILTER (WHERE "dueAt" < ${present})::int AS overdue
     FROM overview WHERE state IN ('filed', 'in-review', 'returned')`,
    parameters.values,
  );
  return row ?? { mine: 0, everyone: 0, nobody: 0, overdue: 0 };
}
