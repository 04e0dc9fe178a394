import { notFound } from '../../errors/problem';
import { namesOf } from '../../repositories/people-names.repository';
import { revisionLetters } from '../../repositories/revision.repository';
import { peopleInViews, presentFinding } from '../../presenters/finding.presenter';
import type * as Api from '../../../shared/contracts/api.generated';
import type { Caller } from '../cases/caller';
import { filedRevision, readCase } from '../cases/case-file';
import { findingViews } from '../findings/finding-views';

/** A finding of the current revision with what became of it. */
export async function getFinding(
  caller: Caller,
  reference: string,
  fingerprint: string,
): Promise<Api.Finding> {
  const file = await readCase(caller, reference);
  if (file.run === null) throw notFound();
  const views = await findingViews(caller, filedRevision(file), file.run.id);
  const view = views.find((v) => v.finding.fingerprint === fingerprint);
  if (view === undefined) throw notFound();
  const people = await namesOf(caller.tx.manager, peopleInViews([view]));
  const letters = await revisionLetters(caller.tx.manager, file.application.id);
  return presentFinding(view, { people, letters });
}
