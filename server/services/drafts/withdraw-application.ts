import type { WithdrawApplicationRequest } from '../../../shared/contracts/api.generated';
import type { Caller } from '../cases/caller';
import { holdCase } from '../cases/case-file';
import { gatherFacts } from '../cases/gather-facts';
import { recordStep } from '../cases/record-step';
import { moveRound, requireStep, requireVersion } from '../cases/take-step';

/** Withdraws the open round; an accepted record stands on. */
export async function withdrawApplication(
  caller: Caller,
  reference: string,
  request: WithdrawApplicationRequest,
): Promise<void> {
  const file = await holdCase(caller, reference, 'withdraw');
  const transition = requireStep(caller, 'withdraw', await gatherFacts(caller, file));
  requireVersion(file, request.version);
  await moveRound(caller, file, transition, { closedAt: caller.tx.now });
  recordStep(
    caller.tx,
    file,
    'application.withdrawn',
    { state: transition.to, reason: request.reason ?? null },
    { state: transition.from },
  );
}
