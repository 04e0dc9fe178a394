import { notFound } from '../../errors/problem';
import { namesOf } from '../../repositories/people-names.repository';
import type * as Api from '../../../shared/contracts/api.generated';
import type { Caller } from '../cases/caller';
import { findingViews } from '../findings/finding-views';
import { runsOf } from '../review/check-again';
import { presentOwnRun } from './get-revision';

/** Check runs of a revision, newest first, each with what it found that still stands. */
export async function listRuns(caller: Caller, reference: string, letter: string): Promise<Api.RunList> {
  const { revision, runs } = await runsOf(caller, reference, letter);
  const people = await namesOf(
    caller.tx.manager,
    runs.map((run) => run.requestedBy),
  );
  const items: Api.Run[] = [];
  for (const run of runs) {
    const views = run.status === 'done' ? await findingViews(caller, revision, run.id) : null;
    items.push(await presentOwnRun(caller, run, views, people));
  }
  return { items };
}

export async function getRun(
  caller: Caller,
  reference: string,
  letter: string,
  ordinal: number,
): Promise<Api.Run> {
  const { items } = await listRuns(caller, reference, letter);
  const run = items.find((item) => item.ordinal === ordinal);
  if (run === undefined) throw notFound();
  return run;
}
