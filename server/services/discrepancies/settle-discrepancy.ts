import type { Discrepancy } from '../../entities/review.entities';
import { raisedFrom } from '../../repositories/discrepancy.repository';
import {
  insertDispositions,
  revokeDispositions,
  standingDispositions,
} from '../../repositories/disposition.repository';
import { findingsOfRun } from '../../repositories/run.repository';
import type {
  ReopenDiscrepancyRequest,
  SettleDiscrepancyRequest,
} from '../../../shared/contracts/api.generated';
import type { Caller } from '../cases/caller';
import { filedRevision, holdCase, type CaseFile } from '../cases/case-file';
import { gatherFacts } from '../cases/gather-facts';
import { requireRevision } from '../cases/revision-changes';
import { requireStep } from '../cases/take-step';
import { findingsAbout } from '../findings/finding-views';
import { moveDiscrepancy, openForStep } from './move-discrepancy';

/** Settles a discrepancy, and with it the findings of the current revision that it is about. */
export async function settleDiscrepancy(
  caller: Caller,
  reference: string,
  number: number,
  request: SettleDiscrepancyRequest,
): Promise<void> {
  const file = await holdCase(caller, reference, 'review');
  await requireRevision(caller, file, request.revision);
  requireStep(caller, 'settle', await gatherFacts(caller, file));
  const { discrepancy, to } = await openForStep(caller, file, number, 'settle', request.version);
  const text = request.text ?? '';
  await moveDiscrepancy(caller, file, discrepancy, { state: to }, { kind: 'settled', text });
  await settleFindings(caller, file, discrepancy, text);
}

async function settleFindings(
  { tx, actor }: Caller,
  file: CaseFile,
  discrepancy: Discrepancy,
  text: string,
): Promise<void> {
  if (file.run === null) return;
  const revision = filedRevision(file);
  const links = await raisedFrom(tx.manager, [discrepancy.id]);
  const done = new Set(
    (await standingDispositions(tx.manager, revision.id)).map((d) => `${d.lineKey} ${d.fingerprint}`),
  );
  const findings = findingsAbout(links, await findingsOfRun(tx.manager, file.run.id));
  await insertDispositions(
    tx.manager,
    findings
      .filter((f) => !done.has(`${f.lineKey} ${f.fingerprint}`))
      .map(({ lineKey, fingerprint }) => ({
        orgId: discrepancy.orgId,
        revisionId: revision.id,
        lineKey,
        fingerprint,
        kind: 'settled' as const,
        reason: text === '' ? `D-${discrepancy.number} is settled.` : text,
        decidedBy: actor.userId,
        decidedAt: tx.now,
        discrepancyId: discrepancy.id,
      })),
  );
}

/** Asks again: the discrepancy is open, and what it had settled stands no more. */
export async function reopenDiscrepancy(
  caller: Caller,
  reference: string,
  number: number,
  request: ReopenDiscrepancyRequest,
): Promise<void> {
  const file = await holdCase(caller, reference, 'review');
  const revision = await requireRevision(caller, file, request.revision);
  requireStep(caller, 'settle', await gatherFacts(caller, file));
  const { discrepancy, to } = await openForStep(caller, file, number, 'reopen', request.version);
  await moveDiscrepancy(
    caller,
    file,
    discrepancy,
    { state: to, answeredBy: null },
    { kind: 'reopened', text: request.text },
  );
  await revokeDispositions(caller.tx.manager, revision.id, discrepancy.id, caller.tx.now);
}
