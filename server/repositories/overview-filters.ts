import { likePattern, type Parameters } from './paging';

/** Filters of a list of applications, read from the query; each narrows the list further. */
export interface OverviewFilters {
  states: readonly string[];
  applicant: string | null;
  voltagesKv: readonly number[];
  /** Worst grades; `none` is in balance. */
  grades: readonly string[];
  reviewer: { id: string } | 'nobody' | null;
  search: string | null;
  /** Number of the application, in part. */
  number: string | null;
  /** Instants of the due days: from (included) to (excluded), either open. */
  due: { from: Date | null; to: Date | null } | null;
}

const RANK: Readonly<Record<string, number>> = { none: 0, note: 1, explain: 2, 'must-answer': 3 };

/** Worst grade as a number: 3 must answer, 2 explain, 1 note, 0 in balance, −1 not checked. */
export const GRADE_RANK = `CASE WHEN "runStatus" IS DISTINCT FROM 'done' THEN -1 WHEN "mustAnswer" > 0 THEN 3
  WHEN explain > 0 THEN 2 WHEN note > 0 THEN 1 ELSE 0 END`;

/** The condition over the overview's columns; every value goes in as a parameter. */
export function filterSql(filters: OverviewFilters, parameters: Parameters): string {
  const parts: string[] = [];
  if (filters.states.length > 0) parts.push(`state = ANY(${parameters.add(filters.states)})`);
  if (filters.applicant !== null)
    parts.push(`applicant ILIKE ${parameters.add(likePattern(filters.applicant))}`);
  if (filters.voltagesKv.length > 0) {
    parts.push(`"voltagesKv" && ${parameters.add(filters.voltagesKv)}::double precision[]`);
  }
  if (filters.grades.length > 0) {
    const ranks = filters.grades.map((grade) => RANK[grade] ?? -1);
    parts.push(`(${GRADE_RANK}) = ANY(${parameters.add(ranks)}::int[])`);
  }
  if (filters.reviewer === 'nobody') parts.push('"reviewerId" IS NULL');
  else if (filters.reviewer !== null)
    parts.push(`"reviewerId" = ${parameters.add(filters.reviewer.id)}::uuid`);
  if (filters.search !== null) {
    const pattern = parameters.add(likePattern(filters.search));
    const columns = ['number', 'title', 'applicant', '"pointOfConnection"'];
    parts.push(`(${columns.map((column) => `${column} ILIKE ${pattern}`).join(' OR ')})`);
  }
  if (filters.number !== null) parts.push(`number ILIKE ${parameters.add(likePattern(filters.number))}`);
  if (filters.due?.from) parts.push(`"dueAt" >= ${parameters.add(filters.due.from)}`);
  if (filters.due?.to) parts.push(`"dueAt" < ${parameters.add(filters.due.to)}`);
  return parts.length === 0 ? 'true' : parts.join(' AND ');
}
