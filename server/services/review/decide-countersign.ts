import { conditionalUpdate } from '../../database/conditional-update';
import { Countersign } from '../../entities/review.entities';
import { conflict, forbidden, notFound, stale } from '../../errors/problem';
import { findCountersign, insertDispositions } from '../../repositories/disposition.repository';
import type { WaiverProposal } from '../../presenters/finding.presenter';
import type { DecideCountersignRequest } from '../../../shared/contracts/api.generated';
import { refuseCountersign } from '../../../shared/workflow/dispositions';
import type { Caller } from '../cases/caller';
import { filedRevision, holdCase, type CaseFile } from '../cases/case-file';
import { recordStep } from '../cases/record-step';
import { waiveSettledDiscrepancies } from '../discrepancies/waive-discrepancies';
import { decideRound } from './decide-round';

/** The second reviewer's word on a proposal. Granted, it takes effect at once. */
export async function decideCountersign(
  caller: Caller,
  id: string,
  request: DecideCountersignRequest,
): Promise<void> {
  const { tx, ability, actor } = caller;
  const known = await findCountersign(tx.manager, ability, id);
  if (known === null) throw notFound();
  const file = await holdCase(caller, known.applicationId, 'review');
  const countersign = (await findCountersign(tx.manager, ability, id)) ?? known;
  const refusal = refuseCountersign(countersign.proposedBy, actor.userId);
  if (refusal !== null) throw forbidden(refusal);
  requirePending(file, countersign);
  await conditionalUpdate(
    tx.manager,
    Countersign,
    { id, version: countersign.version, outcome: 'pending' },
    { outcome: request.outcome, decidedBy: actor.userId, decidedAt: tx.now, remark: request.remark ?? null },
  );
  recordStep(tx, file, `countersign.${request.outcome}`, {
    subject: countersign.subject,
    remark: request.remark ?? null,
  });
  if (request.outcome === 'granted') await carryOut(caller, file, countersign);
}

function requirePending(file: CaseFile, countersign: Countersign): void {
  if (countersign.outcome !== 'pending') throw conflict('It has been decided on already.');
  const current = filedRevision(file);
  if (countersign.revisionId !== current.id) {
    throw stale(`It was proposed on an older revision; revision ${current.letter} is the current one.`, {
      currentRevision: current.letter,
      changed: [`Revision ${current.letter} was filed since.`],
    });
  }
  if (file.round.state !== 'in-review') throw conflict('The case is not in review any more.');
}

async function carryOut(caller: Caller, file: CaseFile, countersign: Countersign): Promise<void> {
  const { tx } = caller;
  if (countersign.subject === 'decline') {
    await decideRound(caller, file, {
      kind: 'declined',
      reason: countersign.reason,
      conditions: [],
      decidedBy: countersign.proposedBy,
      countersignId: countersign.id,
    });
    return;
  }
  const { lineKey, fingerprint } = countersign.proposal as WaiverProposal;
  await insertDispositions(tx.manager, [
    {
      orgId: countersign.orgId,
      revisionId: countersign.revisionId,
      lineKey,
      fingerprint,
      kind: 'waived',
      reason: countersign.reason,
      decidedBy: countersign.proposedBy,
      decidedAt: tx.now,
      countersignId: countersign.id,
    },
  ]);
  await waiveSettledDiscrepancies(caller, file);
}
