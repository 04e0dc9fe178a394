import { currentCalendar } from '../../repositories/calendar.repository';
import { windowsOfRound } from '../../repositories/correspondence.repository';
import type { PutBackApplicationRequest } from '../../../shared/contracts/api.generated';
import { reviewDaysUsed } from '../../../shared/workflow/windows';
import type { Caller } from '../cases/caller';
import { filedRevision, holdCase, type CaseFile } from '../cases/case-file';
import { gatherFacts } from '../cases/gather-facts';
import { recordStep } from '../cases/record-step';
import { moveRound, requireStep, requireVersion } from '../cases/take-step';
import { spanOf } from '../windows/change-windows';

/** Puts a case back into the queue: a new take-up window, and the review days used are kept. */
export async function putBackApplication(
  caller: Caller,
  reference: string,
  request: PutBackApplicationRequest,
): Promise<void> {
  const file = await holdCase(caller, reference, 'review');
  const transition = requireStep(caller, 'put-back', await gatherFacts(caller, file));
  requireVersion(file, request.version);
  const used = await daysUsed(caller, file);
  await moveRound(caller, file, transition, { reviewerId: null, reviewDaysUsed: used });
  recordStep(caller.tx, file, 'application.put-back', {
    state: transition.to,
    reason: request.reason,
    reviewDaysUsed: used,
  });
}

async function daysUsed({ tx }: Caller, file: CaseFile): Promise<number> {
  const { calendar } = await currentCalendar(tx.manager);
  const windows = (await windowsOfRound(tx.manager, file.round.id)).map(spanOf);
  return reviewDaysUsed(windows, filedRevision(file).filedAt, tx.now, calendar);
}
