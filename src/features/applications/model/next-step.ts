import type { Application, Discrepancy, Draft } from '#shared/contracts/api.generated';
import { formatDate } from '#shared/format/dates';

const open = (discrepancies: readonly Discrepancy[]): Discrepancy[] =>
  discrepancies.filter((d) => d.state === 'open');

const counted = (n: number, one: string, many = `${one}s`): string => `${n} ${n === 1 ? one : many}`;

function draftSentence(draft: Draft | null): string {
  if (!draft || draft.lines.length === 0)
    return 'Add the lines that you declare, by the form or from a file.';
  const incomplete = draft.lines.filter((l) => !l.complete).length;
  if (incomplete > 0)
    return `${counted(incomplete, 'line still lacks', 'lines still lack')} something before you can file.`;
  return 'Everything is there: file it, and the grid owner takes it up.';
}

function returnedSentence(application: Application, discrepancies: readonly Discrepancy[]): string {
  const { owner, revision, nextRevision, window } = application;
  const left = open(discrepancies).length;
  const on = window ? ` on ${formatDate(window.openedAt)}` : '';
  const asked = discrepancies.filter((d) => d.state === 'open' || d.state === 'answered').length;
  const what = counted(asked, 'discrepancy', 'discrepancies');
  const head = `${owner.name} returned revision ${revision ?? ''}${on} with ${what}.`;
  if (left === 0) return `${head} All are answered: file revision ${nextRevision}.`;
  if (left < asked)
    return `${head} ${left === 1 ? 'One is' : `${left} are`} left to answer, then file revision ${nextRevision}.`;
  return `${head} Answer ${left === 1 ? 'it' : left === 2 ? 'both' : `the ${left}`}, then file revision ${nextRevision}.`;
}

function filedSentence({ check, owner, revision }: Application): string {
  const head = `Revision ${revision ?? ''} is filed.`;
  if (check?.state === 'queued' || check?.state === 'running') return `${head} Its check is under way.`;
  if (check?.state === 'failed') return `${head} Its check could not be made; ${owner.name} sees that too.`;
  return `${head} ${owner.name} takes it up next.`;
}

/** One sentence on where the case stands and what is next for its applicant. */
export function nextStepSentence(
  application: Application,
  draft: Draft | null,
  discrepancies: readonly Discrepancy[],
): string {
  const { state, owner, revision, reviewer, decision, acceptedRevision } = application;
  // A round that ends without an acceptance leaves the accepted record as it was.
  const stands = acceptedRevision ? ` Revision ${acceptedRevision} stands as accepted.` : '';
  switch (state) {
    case 'draft':
      return draftSentence(draft);
    case 'filed':
      return filedSentence(application);
    case 'in-review':
      return `${reviewer?.name ?? owner.name} reviews revision ${revision ?? ''}. Nothing is asked of you now.`;
    case 'returned':
      return returnedSentence(application, discrepancies);
    case 'accepted':
      return `Revision ${decision?.revision ?? revision ?? ''} is accepted. To change its data later, amend it.`;
    case 'declined':
      return `${owner.name} declined revision ${decision?.revision ?? revision ?? ''}. The letter says why.${stands}`;
    case 'withdrawn':
      return stands === '' ? 'You withdrew this application.' : `You withdrew the amendment.${stands}`;
  }
}
