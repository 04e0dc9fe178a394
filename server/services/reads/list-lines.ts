import { listFiledLines } from '../../repositories/filed-lines.repository';
import { decodeCursor, readLimit } from '../../repositories/paging';
import { worstOf } from '../../presenters/application.presenter';
import { presentLineHead } from '../../presenters/revision.presenter';
import type * as Api from '../../../shared/contracts/api.generated';
import { sightOf, type Caller } from '../cases/caller';
import { listOf } from './list-applications';

/** A page of the lines of all latest revisions that the caller may see. */
export async function listLines(caller: Caller, query: Api.ListLinesRequest): Promise<Api.LineList> {
  const { tx, ability, actor } = caller;
  const page = await listFiledLines(tx.manager, ability, {
    sight: sightOf(actor),
    search: query['filter[search]'] ?? null,
    applicant: query['filter[applicant]'] ?? null,
    voltagesKv: listOf(query['filter[voltage]']).map(Number),
    grades: listOf(query['filter[grade]']),
    states: listOf(query['filter[state]']),
    sort: query.sort ?? 'number',
    limit: readLimit(query.limit),
    cursor: decodeCursor(query.cursor),
  });
  return {
    ...page,
    items: page.items.map((line) => {
      const { mustAnswer, explain, note } = line;
      const grades = line.checked ? { mustAnswer, explain, note } : null;
      return {
        ...presentLineHead(line),
        applicationId: line.applicationId,
        applicationNumber: line.applicationNumber,
        applicationTitle: line.applicationTitle,
        applicant: { id: line.orgId, name: line.applicant },
        state: line.state,
        revision: line.revision,
        grades,
        worstGrade: worstOf(grades),
      };
    }),
  };
}
