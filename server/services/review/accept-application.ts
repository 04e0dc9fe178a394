import type { AcceptApplicationRequest } from '../../../shared/contracts/api.generated';
import type { Caller } from '../cases/caller';
import { holdCase } from '../cases/case-file';
import { gatherFacts } from '../cases/gather-facts';
import { requireRevision } from '../cases/revision-changes';
import { requireStep, requireVersion } from '../cases/take-step';
import { decideRound } from './decide-round';

/** Accepts the current revision. */
export async function acceptApplication(
  caller: Caller,
  reference: string,
  request: AcceptApplicationRequest,
): Promise<void> {
  const file = await holdCase(caller, reference, 'decide');
  await requireStepOn(caller, file, request);
  await decideRound(caller, file, {
    kind: 'accepted',
    reason: request.reason ?? '',
    conditions: request.conditions ?? [],
    decidedBy: caller.actor.userId,
    countersignId: null,
  });
}

async function requireStepOn(
  caller: Caller,
  file: Awaited<ReturnType<typeof holdCase>>,
  request: AcceptApplicationRequest,
): Promise<void> {
  const facts = await gatherFacts(caller, file);
  if (file.revision !== null) await requireRevision(caller, file, request.revision);
  requireStep(caller, 'accept', facts);
  requireVersion(file, request.version);
}
