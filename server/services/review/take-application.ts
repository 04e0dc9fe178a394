import type { Caller } from '../cases/caller';
import { holdCase } from '../cases/case-file';
import { gatherFacts } from '../cases/gather-facts';
import { recordStep } from '../cases/record-step';
import { moveRound, requireStep, requireVersion } from '../cases/take-step';

/** Takes a filed case. Of many who try at once exactly one has it. */
export async function takeApplication(
  caller: Caller,
  reference: string,
  request: { version?: number },
): Promise<void> {
  const file = await holdCase(caller, reference, 'review');
  const transition = requireStep(caller, 'take', await gatherFacts(caller, file));
  requireVersion(file, request.version);
  await moveRound(caller, file, transition, { reviewerId: caller.actor.userId });
  recordStep(caller.tx, file, 'application.taken', { state: transition.to, reviewer: caller.actor.name });
}
