import { discrepanciesOfRound } from '../../repositories/discrepancy.repository';
import { pendingCountersigns, standingDispositions } from '../../repositories/disposition.repository';
import { namesOf, reviewersFor } from '../../repositories/people-names.repository';
import { findingsOfRun } from '../../repositories/run.repository';
import type { Finding } from '../../entities/verdict.entities';
import type { CaseFacts } from '../../../shared/workflow/case-facts';
import { isDraftEditable, isOpen } from '../../../shared/workflow/states';
import { faultyLines, readDraft } from '../drafts/read-draft';
import { findingName } from '../findings/finding-names';
import type { Caller } from './caller';
import type { CaseFile } from './case-file';

/** Everything that the workflow's rules have to know of a case. */
export async function gatherFacts(caller: Caller, file: CaseFile): Promise<CaseFacts> {
  const { manager } = caller.tx;
  const { round, run } = file;
  const [discrepancies, names, pending, open, draft] = [
    await discrepanciesOfRound(manager, round.id),
    await namesOf(manager, [round.reviewerId]),
    file.revision === null ? [] : await pendingCountersigns(manager, file.revision.id),
    await openMustAnswers(caller, file),
    await draftFacts(caller, file),
  ];
  return {
    state: round.state,
    isRoundOpen: isOpen(round.state),
    hasAcceptedRecord: file.application.acceptedRevisionId !== null,
    reviewerId: round.reviewerId,
    reviewerName: names.get(round.reviewerId ?? '')?.name ?? null,
    isReviewerGone: await isReviewerGone(caller, file),
    draft,
    run: run === null ? null : { state: run.status, linesChecked: run.linesDone, lineCount: run.linesTotal },
    discrepancies: discrepancies.map(({ number, state, answeredBy }) => ({ number, state, answeredBy })),
    openMustAnswers: open.map(findingName),
    pendingCountersigns: pending.map(({ subject }) => ({ subject })),
  };
}

async function openMustAnswers({ tx }: Caller, { run, revision }: CaseFile): Promise<Finding[]> {
  if (run?.status !== 'done' || revision === null) return [];
  const done = new Set(
    (await standingDispositions(tx.manager, revision.id)).map((d) => `${d.lineKey} ${d.fingerprint}`),
  );
  const findings = await findingsOfRun(tx.manager, run.id);
  return findings.filter((f) => f.grade === 'must-answer' && !done.has(`${f.lineKey} ${f.fingerprint}`));
}

async function isReviewerGone({ tx, actor }: Caller, { application, round }: CaseFile): Promise<boolean> {
  if (actor.role !== 'reviewer' || round.reviewerId === null || round.reviewerId === actor.userId)
    return false;
  return (await reviewersFor(tx.manager, application.orgId)).every((r) => r.id !== round.reviewerId);
}

/** The draft matters to the applicant, and only while it can be filed. */
async function draftFacts(caller: Caller, file: CaseFile): Promise<CaseFacts['draft']> {
  const matters = caller.actor.role === 'applicant' && isDraftEditable(file.round.state);
  if (!matters) return { lineCount: 0, faultyLines: [], unchanged: false };
  const draft = await readDraft(caller.tx, file);
  return { lineCount: draft.rows.length, faultyLines: faultyLines(draft), unchanged: draft.unchanged };
}
