import type { EntityManager } from 'typeorm';
import { Application } from '../entities/case.entities';
import { accessibleBy } from '../policies/accessible-by';
import type { AppAbility } from '../../shared/policies/subjects';
import type { State } from '../../shared/workflow/states';
import type { Sight } from './overview.repository';
import { likePattern, Parameters, readPage, type Page, type PageQuery } from './paging';

/** A line of an application's latest revision, as the list of lines shows it. */
export interface ListedLine {
  id: string;
  lineKey: string;
  ordinal: number;
  name: string;
  nominalVoltageKv: number;
  frequencyHz: number;
  lengthKm: number;
  body: Record<string, unknown>;
  applicationId: string;
  applicationNumber: string;
  applicationTitle: string;
  orgId: string;
  applicant: string;
  state: State;
  revision: string;
  checked: boolean;
  mustAnswer: number;
  explain: number;
  note: number;
}

export interface LinesQuery extends PageQuery {
  sight: Sight;
  search: string | null;
  applicant: string | null;
  voltagesKv: readonly number[];
  grades: readonly string[];
  states: readonly string[];
}

const RANK = `CASE WHEN NOT checked THEN -1 WHEN "mustAnswer" > 0 THEN 3 WHEN explain > 0 THEN 2
  WHEN note > 0 THEN 1 ELSE 0 END`;
const RANKS: Readonly<Record<string, number>> = { none: 0, note: 1, explain: 2, 'must-answer': 3 };

const SORTS: Readonly<Record<string, string>> = {
  name: 'lower(name)',
  number: '"applicationNumber"',
  voltage: '"nominalVoltageKv"',
  length: '"lengthKm"',
  grade: RANK,
};

function linesSql(seen: string, sight: Sight): string {
  const filedOnly = sight === 'filed' ? 'AND r.filed_at IS NOT NULL' : '';
  return `
    seen AS (${seen}),
    lines AS (
      SELECT revision.id::text || ' ' || l.line_key AS id, l.line_key AS "lineKey", l.ordinal, c.name,
        c.nominal_voltage_kv AS "nominalVoltageKv", c.frequency_hz AS "frequencyHz", c.length_km AS "lengthKm", c.body,
        a.id AS "applicationId", a.number AS "applicationNumber", revision.title AS "applicationTitle", a.org_id AS "orgId",
        org.name AS applicant, round.state, revision.letter AS revision, coalesce(run.status = 'done', false) AS checked,
        coalesce(grades.must_answer, 0) AS "mustAnswer", coalesce(grades.explain, 0) AS explain,
        coalesce(grades.note, 0) AS note
      FROM seen
      JOIN applications a ON a.id = seen.id
      JOIN organisations org ON org.id = a.org_id
      JOIN LATERAL (SELECT r.state FROM rounds r WHERE r.application_id = a.id ${filedOnly}
                     ORDER BY r.ordinal DESC LIMIT 1) round ON true
      JOIN LATERAL (SELECT v.id, v.letter, v.particulars ->> 'title' AS title FROM revisions v WHERE v.application_id = a.id
                     ORDER BY v.ordinal DESC LIMIT 1) revision ON true
      JOIN revision_lines l ON l.revision_id = revision.id
      JOIN line_versions c ON c.org_id = l.org_id AND c.hash = l.line_hash
      LEFT JOIN check_runs run ON run.revision_id = revision.id AND run.governing
      LEFT JOIN LATERAL (
        SELECT count(*) FILTER (WHERE f.grade = 'must-answer')::int AS must_answer,
          count(*) FILTER (WHERE f.grade = 'explain')::int AS explain,
          count(*) FILTER (WHERE f.grade = 'note')::int AS note
        FROM findings f
        WHERE f.run_id = run.id AND f.line_key = l.line_key AND f.follows IS NULL AND NOT EXISTS (
          SELECT 1 FROM dispositions p WHERE p.revision_id = revision.id AND p.line_key = f.line_key
            AND p.fingerprint = f.fingerprint AND p.revoked_at IS NULL)) grades ON true
    )`;
}

function linesWhere(query: LinesQuery, parameters: Parameters): string {
  const parts: string[] = [];
  if (query.search !== null) {
    const pattern = parameters.add(likePattern(query.search));
    const columns = ['name', `body->>'from'`, `body->>'to'`, '"applicationNumber"', '"applicationTitle"'];
    parts.push(`(${columns.map((column) => `${column} ILIKE ${pattern}`).join(' OR ')})`);
  }
  if (query.applicant !== null) parts.push(`applicant ILIKE ${parameters.add(likePattern(query.applicant))}`);
  if (query.voltagesKv.length > 0) {
    parts.push(`"nominalVoltageKv" = ANY(${parameters.add(query.voltagesKv)}::double precision[])`);
  }
  if (query.states.length > 0) parts.push(`state = ANY(${parameters.add(query.states)})`);
  if (query.grades.length > 0) {
    parts.push(`(${RANK}) = ANY(${parameters.add(query.grades.map((g) => RANKS[g] ?? -1))}::int[])`);
  }
  return parts.length === 0 ? 'true' : parts.join(' AND ');
}

/** Lines of the latest revisions of the applications that the ability lets through. */
export async function listFiledLines(
  manager: EntityManager,
  ability: AppAbility,
  query: LinesQuery,
): Promise<Page<ListedLine>> {
  const scope = manager.createQueryBuilder(Application, 'application').select('application.id', 'id');
  const [seen, values] = accessibleBy(scope, ability, 'read', 'Application').getQueryAndParameters();
  const parameters = new Parameters(values);
  const where = linesWhere(query, parameters);
  const withs = `WITH ${linesSql(seen, query.sight)}, fitting AS (SELECT * FROM lines WHERE ${where})`;
  return readPage(manager, { withs, from: 'fitting', sorts: SORTS, parameters }, query);
}
