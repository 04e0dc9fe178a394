import type { EntityManager } from 'typeorm';
import { Application } from '../entities/case.entities';
import { accessibleBy } from '../policies/accessible-by';
import type { AppAbility } from '../../shared/policies/subjects';
import { likePattern, Parameters, readPage, type Page, type PageQuery } from './paging';

/** A letter as lists show it. */
export interface ListedLetter {
  id: string;
  number: number;
  applicationId: string;
  applicationNumber: string;
  applicationTitle: string;
  kind: 'receipt' | 'return' | 'decision' | 'notice';
  subject: string;
  revision: string;
  sha256: string;
  byteLength: number;
  sentAt: Date;
  sentById: string | null;
  dueAt: Date | null;
}

export interface LettersQuery extends PageQuery {
  applicationId: string | null;
  kind: string | null;
  search: string | null;
}

const SORTS: Readonly<Record<string, string>> = {
  sent: 'extract(epoch FROM "sentAt")::double precision',
  number: '"applicationNumber"',
};

/** Letters of the applications that the ability lets through. */
export async function listLetters(
  manager: EntityManager,
  ability: AppAbility,
  query: LettersQuery,
): Promise<Page<ListedLetter>> {
  const scope = manager.createQueryBuilder(Application, 'application').select('application.id', 'id');
  const [seen, values] = accessibleBy(scope, ability, 'read', 'Application').getQueryAndParameters();
  const parameters = new Parameters(values);
  const parts = ['true'];
  if (query.applicationId !== null) parts.push(`"applicationId" = ${parameters.add(query.applicationId)}`);
  if (query.kind !== null) parts.push(`kind = ${parameters.add(query.kind)}`);
  if (query.search !== null) {
    const pattern = parameters.add(likePattern(query.search));
    parts.push(`("applicationNumber" ILIKE ${pattern} OR "applicationTitle" ILIKE ${pattern})`);
  }
  const withs = `WITH seen AS (${seen}), all_letters AS (
      SELECT l.id::text AS id, l.number, a.id AS "applicationId", a.number AS "applicationNumber",
        v.particulars ->> 'title' AS "applicationTitle", l.kind, l.subject, v.letter AS revision, l.sha256,
        octet_length(l.bytes) AS "byteLength", l.issued_at AS "sentAt", l.issued_by AS "sentById", l.due_at AS "dueAt"
      FROM seen JOIN applications a ON a.id = seen.id JOIN letters l ON l.application_id = a.id
      JOIN revisions v ON v.id = l.revision_id),
    fitting AS (SELECT * FROM all_letters WHERE ${parts.join(' AND ')})`;
  return readPage(manager, { withs, from: 'fitting', sorts: SORTS, parameters }, query);
}
