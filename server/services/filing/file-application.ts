import { recordEvent } from '../../database/audit/record-event';
import type { Revision } from '../../entities/filed.entities';
import { invalidContent } from '../../errors/problem';
import { touchApplication } from '../../repositories/application.repository';
import type { FileApplicationRequest } from '../../../shared/contracts/api.generated';
import type { Caller } from '../cases/caller';
import { holdCase, type CaseFile } from '../cases/case-file';
import { gatherFacts } from '../cases/gather-facts';
import { moveRound, requireStep, requireVersion } from '../cases/take-step';
import { lineKeyOf, readDraft, type ReadDraft } from '../drafts/read-draft';
import { mailReceipt } from '../letters/mail-receipt';
import { freezeRevision } from './freeze-revision';
import { queueRun } from './queue-run';

/** Files the draft: freezes the next revision, asks for its check, moves the case on and mails a receipt. */
export async function fileApplication(
  caller: Caller,
  reference: string,
  request: FileApplicationRequest,
): Promise<Revision> {
  const { tx } = caller;
  const file = await holdCase(caller, reference, 'file');
  requireVersion(file, request.version);
  const draft = await readDraft(tx, file);
  const facts = await gatherFacts(caller, file);
  if (draft.faults.length > 0 && facts.state !== 'filed') refuseFaults(draft);
  const transition = requireStep(caller, 'file', facts);
  const revision = await freezeRevision(caller, file, draft, request.note ?? null);
  await queueRun(tx, revision, { governing: true, requestedBy: null });
  await moveRound(caller, file, transition, { filedAt: file.round.filedAt ?? tx.now, reviewDaysUsed: 0 });
  await markFiled(caller, file);
  recordEvent(tx, {
    act: 'application.filed',
    orgId: revision.orgId,
    applicationId: revision.applicationId,
    before: { state: transition.from },
    after: { state: transition.to, revision: revision.letter, contentHash: revision.contentHash },
  });
  await mailReceipt(caller, file, revision);
  return revision;
}

/** The faults as they are, each with its pointer and the key of its line. */
function refuseFaults(draft: ReadDraft): never {
  const errors = draft.faults.map((fault) => {
    const lineKey = lineKeyOf(fault, draft.rows);
    return lineKey === undefined ? fault : { ...fault, lineKey };
  });
  throw invalidContent(errors, 'Some lines of the draft cannot be filed yet.');
}

async function markFiled({ tx }: Caller, { application }: CaseFile): Promise<void> {
  if (application.firstFiledAt !== null) return;
  await touchApplication(tx.manager, application.id, tx.now, { firstFiledAt: tx.now });
}
