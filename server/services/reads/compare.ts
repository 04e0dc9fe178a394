import { notFound } from '../../errors/problem';
import { namesOf } from '../../repositories/people-names.repository';
import { linesOfRevision, revisionLetters } from '../../repositories/revision.repository';
import { findRun, type RunHead } from '../../repositories/run.repository';
import { presentFinding, type FindingView } from '../../presenters/finding.presenter';
import { filedLineOf } from '../../presenters/revision.presenter';
import type * as Api from '../../../shared/contracts/api.generated';
import type { Caller } from '../cases/caller';
import { readCase } from '../cases/case-file';
import { lineChange } from '../cases/revision-changes';
import { findingViews } from '../findings/finding-views';
import { revisionOf } from '../review/check-again';
import { differences } from './differences';
import { presentOwnRun } from './get-revision';

/** What a later run of a revision found that an earlier one did not, and the reverse. */
export async function compareRuns(
  caller: Caller,
  reference: string,
  letter: string,
  query: Api.CompareRunsRequest,
): Promise<Api.RunComparison> {
  const { tx } = caller;
  const file = await readCase(caller, reference);
  const revision = await revisionOf(caller, file, letter);
  const names = {
    people: await namesOf(tx.manager, []),
    letters: await revisionLetters(tx.manager, file.application.id),
  };
  const views = async (ordinal: string): Promise<{ run: RunHead; views: FindingView[] }> => {
    const run = await findRun(tx.manager, revision.id, Number(ordinal));
    if (run === null || run.status !== 'done') throw notFound();
    return { run, views: await findingViews(caller, revision, run.id) };
  };
  const from = await views(query.from);
  const to = await views(query.to);
  const key = (view: FindingView) => `${view.finding.fingerprint} ${view.finding.grade}`;
  const missingIn = (one: FindingView[], other: FindingView[]) => {
    const known = new Set(other.map(key));
    return one.filter((view) => !known.has(key(view)));
  };
  const appeared = missingIn(to.views, from.views);
  return {
    revision: revision.letter,
    from: await presentOwnRun(caller, from.run, from.views, names.people),
    to: await presentOwnRun(caller, to.run, to.views, names.people),
    appeared: appeared.map((view) => presentFinding(view, names)),
    gone: missingIn(from.views, to.views).map((view) => presentFinding(view, names)),
    kept: to.views.length - appeared.length,
  };
}

/** Two revisions of an application, line by line and field by field. */
export async function compareRevisions(
  caller: Caller,
  reference: string,
  query: Api.CompareRevisionsRequest,
): Promise<Api.RevisionComparison> {
  const { tx } = caller;
  const file = await readCase(caller, reference);
  const from = await linesOfRevision(tx.manager, (await revisionOf(caller, file, query.from)).id);
  const to = await linesOfRevision(tx.manager, (await revisionOf(caller, file, query.to)).id);
  const lines: Api.RevisionComparison['lines'] = to.map((line) => {
    const before = from.find((l) => l.lineKey === line.lineKey);
    const change = lineChange(from, line);
    const found =
      before === undefined || change === 'same'
        ? { changes: [], limitReached: false }
        : differences(filedLineOf(before), filedLineOf(line));
    return { lineKey: line.lineKey, name: line.name, change: change === 'first' ? 'new' : change, ...found };
  });
  const removed = from
    .filter((line) => !to.some((l) => l.lineKey === line.lineKey))
    .map(({ lineKey, name }) => ({
      lineKey,
      name,
      change: 'removed' as const,
      changes: [],
      limitReached: false,
    }));
  return { from: query.from, to: query.to, lines: [...lines, ...removed] };
}
