import { insertCountersign } from '../../repositories/disposition.repository';
import type { DeclineApplicationRequest } from '../../../shared/contracts/api.generated';
import type { Caller } from '../cases/caller';
import { filedRevision, holdCase } from '../cases/case-file';
import { gatherFacts } from '../cases/gather-facts';
import { recordStep } from '../cases/record-step';
import { requireRevision } from '../cases/revision-changes';
import { requireStep, requireVersion } from '../cases/take-step';

/** Proposes to decline; it takes effect with a second reviewer's countersign. */
export async function declineApplication(
  caller: Caller,
  reference: string,
  request: DeclineApplicationRequest,
): Promise<void> {
  const { tx, actor } = caller;
  const file = await holdCase(caller, reference, 'decide');
  const facts = await gatherFacts(caller, file);
  if (file.revision !== null) await requireRevision(caller, file, request.revision);
  requireStep(caller, 'decline', facts);
  requireVersion(file, request.version);
  await insertCountersign(tx.manager, {
    orgId: file.application.orgId,
    applicationId: file.application.id,
    revisionId: filedRevision(file).id,
    subject: 'decline',
    proposal: {} as never,
    reason: request.reason,
    proposedBy: actor.userId,
    proposedAt: tx.now,
  });
  recordStep(tx, file, 'decline.proposed', { reason: request.reason });
}
