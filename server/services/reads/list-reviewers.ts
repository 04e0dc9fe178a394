import { forbidden } from '../../errors/problem';
import { reviewersFor } from '../../repositories/people-names.repository';
import type * as Api from '../../../shared/contracts/api.generated';
import type { Caller } from '../cases/caller';
import { applicationRecord, readCase } from '../cases/case-file';

/** Reviewers who may have a case, for handing it over. */
export async function listReviewers(caller: Caller, reference: string): Promise<Api.ReviewerList> {
  const { application } = await readCase(caller, reference);
  if (!caller.ability.can('review', applicationRecord(application))) throw forbidden();
  return { items: await reviewersFor(caller.tx.manager, application.orgId) };
}
