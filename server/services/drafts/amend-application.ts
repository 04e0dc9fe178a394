import { Revision } from '../../entities/filed.entities';
import { insertDraftLines } from '../../repositories/draft.repository';
import { insertRound, touchApplication } from '../../repositories/application.repository';
import { linesOfRevision } from '../../repositories/revision.repository';
import type { AmendApplicationRequest } from '../../../shared/contracts/api.generated';
import type { LineSheet } from '../../../shared/filing/types';
import type { Caller } from '../cases/caller';
import { holdCase, type CaseFile } from '../cases/case-file';
import { gatherFacts } from '../cases/gather-facts';
import { recordStep } from '../cases/record-step';
import { requireStep, requireVersion } from '../cases/take-step';

/** Opens an amendment: a new round in Draft that begins with the accepted lines. */
export async function amendApplication(
  caller: Caller,
  reference: string,
  request: AmendApplicationRequest,
): Promise<void> {
  const { tx } = caller;
  const file = await holdCase(caller, reference, 'amend');
  requireStep(caller, 'amend', await gatherFacts(caller, file));
  requireVersion(file, request.version);
  const { application, round } = file;
  const roundId = await insertRound(tx.manager, {
    orgId: application.orgId,
    applicationId: application.id,
    ordinal: round.ordinal + 1,
    kind: 'amendment',
    state: 'draft',
    reason: request.reason,
    openedAt: tx.now,
  });
  await copyAccepted(caller, file, roundId);
  await touchApplication(tx.manager, application.id, tx.now);
  recordStep(tx, file, 'application.amended', { round: round.ordinal + 1, reason: request.reason });
}

async function copyAccepted({ tx, actor }: Caller, file: CaseFile, roundId: string): Promise<void> {
  const { application } = file;
  const accepted = await tx.manager.findOneByOrFail(Revision, { id: application.acceptedRevisionId ?? '' });
  const lines = await linesOfRevision(tx.manager, accepted.id);
  await insertDraftLines(
    tx.manager,
    lines.map(({ lineKey, ordinal, body }) => {
      const { line, written } = body as unknown as LineSheet;
      const typed = Object.entries(written).map(([pointer, text]) => [pointer, { text }]);
      return {
        orgId: application.orgId,
        roundId,
        lineKey,
        ordinal,
        body: line as never,
        asTyped: Object.fromEntries(typed) as never,
        updatedAt: tx.now,
        updatedBy: actor.userId,
      };
    }),
  );
}
