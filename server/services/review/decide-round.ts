import { canonicalText } from '../../database/audit/canonical';
import { insertDecision } from '../../repositories/correspondence.repository';
import { touchApplication } from '../../repositories/application.repository';
import { discrepanciesOfRound } from '../../repositories/discrepancy.repository';
import { standingDispositions } from '../../repositories/disposition.repository';
import { linesOfRevision } from '../../repositories/revision.repository';
import { currentCalendar } from '../../repositories/calendar.repository';
import { formatDate } from '../../../shared/format/dates';
import { STEP_RULES, type Transition } from '../../../shared/workflow/steps';
import type { Caller } from '../cases/caller';
import { filedRevision, type CaseFile } from '../cases/case-file';
import { recordStep } from '../cases/record-step';
import { moveRound } from '../cases/take-step';
import { sha256 } from '../filing/line-hash';
import { issueLetter } from '../letters/issue-letter';

export interface RoundDecision {
  kind: 'accepted' | 'declined';
  reason: string;
  conditions: string[];
  decidedBy: string;
  countersignId: string | null;
}

/** Decides a round: the decision with the hash of the whole record, the letter, the end of the windows. */
export async function decideRound(caller: Caller, file: CaseFile, decision: RoundDecision): Promise<void> {
  const { tx } = caller;
  const { application, round } = file;
  const revision = filedRevision(file);
  const recordHash = sha256(canonicalText(await recordOf(caller, file, decision)));
  await insertDecision(tx.manager, {
    orgId: application.orgId,
    applicationId: application.id,
    roundId: round.id,
    revisionId: revision.id,
    ...decision,
    recordHash,
    decidedAt: tx.now,
  });
  await moveRound(caller, file, transitionTo(decision.kind), { closedAt: tx.now });
  if (decision.kind === 'accepted') {
    await touchApplication(tx.manager, application.id, tx.now, { acceptedRevisionId: revision.id });
  }
  recordStep(tx, file, `application.${decision.kind}`, {
    reason: decision.reason,
    conditions: decision.conditions,
    recordHash,
  });
  await sendDecision(caller, file, decision, recordHash);
}

function transitionTo(kind: RoundDecision['kind']): Transition {
  const rule = STEP_RULES[kind === 'accepted' ? 'accept' : 'decline'];
  const [transition] = rule.transitions;
  if (transition === undefined) throw new Error(`${rule.words} leads nowhere`);
  return transition;
}

/** Everything that the decision rests on, so that its hash shows later whether anything was altered. */
async function recordOf({ tx }: Caller, file: CaseFile, decision: RoundDecision) {
  const { application, run } = file;
  const revision = filedRevision(file);
  const lines = await linesOfRevision(tx.manager, revision.id);
  const dispositions = await standingDispositions(tx.manager, revision.id);
  const discrepancies = await discrepanciesOfRound(tx.manager, file.round.id);
  return {
    number: application.number,
    revision: revision.letter,
    contentHash: revision.contentHash,
    lines: lines.map(({ lineKey, lineHash }) => ({ lineKey, lineHash })),
    run: run === null ? null : { id: run.id, engine: run.engineVersion, ruleSet: run.ruleSetId },
    dispositions: dispositions
      .map(({ lineKey, fingerprint, kind, reason }) => ({ lineKey, fingerprint, kind, reason }))
      .sort((a, b) => (`${a.lineKey} ${a.fingerprint}` < `${b.lineKey} ${b.fingerprint}` ? -1 : 1)),
    discrepancies: discrepancies.map(({ number, state }) => ({ number, state })),
    decision: { ...decision, decidedAt: tx.now.toISOString() },
  };
}

async function sendDecision(
  caller: Caller,
  file: CaseFile,
  decision: RoundDecision,
  recordHash: string,
): Promise<void> {
  const { tx } = caller;
  const revision = filedRevision(file);
  const { calendar } = await currentCalendar(tx.manager);
  const accepted = decision.kind === 'accepted';
  const heading = accepted ? 'The line data are accepted' : 'The application is declined';
  const filed = formatDate(revision.filedAt, calendar.timeZone);
  const says = accepted
    ? `We accept the line data of revision ${revision.letter} of application ${file.application.number}, filed on ${filed}.`
    : `We decline application ${file.application.number} on its revision ${revision.letter}, filed on ${filed}.`;
  await issueLetter(caller, file, {
    kind: 'decision',
    heading,
    subject: heading,
    intro: [says, ...(decision.reason === '' ? [] : [decision.reason])],
    items: decision.conditions.map((condition, i) => ({
      label: String(i + 1),
      grade: null,
      title: 'Condition',
      body: [condition],
      ask: null,
    })),
    closingHeading: 'The record',
    closing: [`What this decision rests on is kept under SHA-256 ${recordHash}.`],
    mail: [says, ...(decision.reason === '' ? [] : [decision.reason]), 'The letter is attached.'],
    dueAt: null,
    discrepancies: [],
    state: decision.kind,
  });
}
