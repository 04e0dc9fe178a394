import type { AnswerDiscrepancyRequest } from '../../../shared/contracts/api.generated';
import type { Caller } from '../cases/caller';
import { holdCase } from '../cases/case-file';
import { moveDiscrepancy, openForStep } from './move-discrepancy';

/** Answers a discrepancy by a change or an explanation, or only keeps the words for later. */
export async function answerDiscrepancy(
  caller: Caller,
  reference: string,
  number: number,
  request: AnswerDiscrepancyRequest,
): Promise<void> {
  const file = await holdCase(caller, reference, 'answer');
  const { discrepancy, to } = await openForStep(caller, file, number, 'answer', request.version);
  if (request.draft === true) {
    await moveDiscrepancy(caller, file, discrepancy, { draftAnswer: request.text }, null);
    return;
  }
  await moveDiscrepancy(
    caller,
    file,
    discrepancy,
    { state: to, answeredBy: request.by, draftAnswer: null },
    { kind: 'answered', text: request.text },
  );
}
