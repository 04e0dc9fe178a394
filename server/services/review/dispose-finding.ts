import { conflict, notFound } from '../../errors/problem';
import type { Finding } from '../../entities/verdict.entities';
import {
  insertCountersign,
  insertDispositions,
  pendingCountersigns,
  standingDispositions,
} from '../../repositories/disposition.repository';
import { findingsOfRun } from '../../repositories/run.repository';
import type { WaiverProposal } from '../../presenters/finding.presenter';
import { needsCountersign, refuseDisposition } from '../../../shared/workflow/dispositions';
import type { Caller } from '../cases/caller';
import { filedRevision, holdCase, type CaseFile } from '../cases/case-file';
import { gatherFacts } from '../cases/gather-facts';
import { recordStep } from '../cases/record-step';
import { requireRevision } from '../cases/revision-changes';
import { requireStep } from '../cases/take-step';
import { waiveSettledDiscrepancies } from '../discrepancies/waive-discrepancies';
import { findingName } from '../findings/finding-names';

/** Waives a finding, or sets one aside. A Must answer's waiver waits for a second reviewer. */
export async function disposeFinding(
  caller: Caller,
  reference: string,
  fingerprint: string,
  kind: 'waived' | 'set-aside',
  request: { revision: string; reason: string },
): Promise<void> {
  const { tx } = caller;
  const file = await holdCase(caller, reference, 'review');
  await requireRevision(caller, file, request.revision);
  requireStep(caller, 'waive', await gatherFacts(caller, file));
  const finding = await findingOf(caller, file, fingerprint);
  await refuseTwice(caller, file, finding, kind);
  const proposed = needsCountersign(kind, finding.grade);
  if (proposed) await propose(caller, file, finding, request.reason);
  else await dispose(caller, file, finding, kind, request.reason);
  const act = kind === 'waived' ? 'finding.waived' : 'finding.set-aside';
  recordStep(tx, file, proposed ? 'waiver.proposed' : act, {
    finding: findingName(finding),
    fingerprint,
    reason: request.reason,
  });
  if (!proposed) await waiveSettledDiscrepancies(caller, file);
}

async function findingOf({ tx }: Caller, file: CaseFile, fingerprint: string): Promise<Finding> {
  if (file.run === null) throw notFound();
  const finding = (await findingsOfRun(tx.manager, file.run.id)).find((f) => f.fingerprint === fingerprint);
  if (finding === undefined) throw notFound();
  return finding;
}

async function refuseTwice(
  { tx }: Caller,
  file: CaseFile,
  finding: Finding,
  kind: 'waived' | 'set-aside',
): Promise<void> {
  const { id } = filedRevision(file);
  const same = (d: { lineKey: string; fingerprint: string }) =>
    d.lineKey === finding.lineKey && d.fingerprint === finding.fingerprint;
  const standing = (await standingDispositions(tx.manager, id)).find(same);
  const refusal = refuseDisposition(kind, finding.grade, standing?.kind ?? null);
  if (refusal !== null) throw conflict(refusal);
  const waiting = await pendingCountersigns(tx.manager, id);
  if (waiting.some((p) => p.subject === 'waive' && same(p.proposal as WaiverProposal))) {
    throw conflict('Its waiver waits for a second reviewer already.');
  }
}

async function propose(
  { tx, actor }: Caller,
  file: CaseFile,
  finding: Finding,
  reason: string,
): Promise<void> {
  const { lineKey, fingerprint, message } = finding;
  await insertCountersign(tx.manager, {
    orgId: file.application.orgId,
    applicationId: file.application.id,
    revisionId: filedRevision(file).id,
    subject: 'waive',
    proposal: { lineKey, fingerprint, message } as never,
    reason,
    proposedBy: actor.userId,
    proposedAt: tx.now,
  });
}

async function dispose(
  { tx, actor }: Caller,
  file: CaseFile,
  finding: Finding,
  kind: 'waived' | 'set-aside',
  reason: string,
): Promise<void> {
  await insertDispositions(tx.manager, [
    {
      orgId: file.application.orgId,
      revisionId: filedRevision(file).id,
      lineKey: finding.lineKey,
      fingerprint: finding.fingerprint,
      kind,
      reason,
      decidedBy: actor.userId,
      decidedAt: tx.now,
    },
  ]);
}
