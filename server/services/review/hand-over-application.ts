import { queueMail } from '../../database/outbox';
import { conflict, invalidContent } from '../../errors/problem';
import { addressOf, reviewersFor } from '../../repositories/people-names.repository';
import type { HandOverApplicationRequest } from '../../../shared/contracts/api.generated';
import type { Caller } from '../cases/caller';
import { holdCase } from '../cases/case-file';
import { gatherFacts } from '../cases/gather-facts';
import { recordStep } from '../cases/record-step';
import { moveRound, requireStep, requireVersion } from '../cases/take-step';
import { caseMail } from '../letters/mail-texts';

/** Gives a case to another reviewer; the windows go on. */
export async function handOverApplication(
  caller: Caller,
  reference: string,
  request: HandOverApplicationRequest,
): Promise<void> {
  const { tx, actor } = caller;
  const file = await holdCase(caller, reference, 'review');
  const facts = await gatherFacts(caller, file);
  const transition = requireStep(caller, 'hand-over', facts);
  requireVersion(file, request.version);
  if (request.to === file.round.reviewerId) throw conflict('That reviewer has the case already.');
  const { application } = file;
  const to = (await reviewersFor(tx.manager, application.orgId)).find((r) => r.id === request.to);
  if (to === undefined) {
    const expected = 'a reviewer who may see this applicant’s cases';
    throw invalidContent([
      { pointer: '/to', value: request.to, expected, message: 'This person cannot take the case.' },
    ]);
  }
  await moveRound(caller, file, transition, { reviewerId: to.id });
  recordStep(
    tx,
    file,
    'application.handed-over',
    { reviewer: to.name, reason: request.reason },
    { reviewer: facts.reviewerName },
  );
  const recipient = await addressOf(tx.manager, to.id);
  if (recipient === null || to.id === actor.userId) return;
  await queueMail(tx, {
    kind: 'handed-over',
    causeId: `${file.round.id} ${file.round.version}`,
    orgId: null,
    recipient,
    subject: `${application.number}: ${actor.name} has handed the case over to you`,
    body: caseMail(application, tx.tools.publicUrl, [`${actor.name}: ${request.reason}`]),
  });
}
