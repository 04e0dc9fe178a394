import type { Transaction } from '../../database/transaction';
import { QUEUES } from '../../integrations/queue-names';
import type { Revision } from '../../entities/filed.entities';
import { linesOfRevision } from '../../repositories/revision.repository';
import { currentRuleSet } from '../../repositories/rule-set.repository';
import { insertRun, listRuns } from '../../repositories/run.repository';

/** Asks for a check run of a revision, in the transaction that causes it. Answers the run's id. */
export async function queueRun(
  tx: Transaction,
  revision: Pick<Revision, 'id' | 'orgId'>,
  { governing, requestedBy }: { governing: boolean; requestedBy: string | null },
): Promise<string> {
  const { manager } = tx;
  const [latest] = await listRuns(manager, revision.id);
  const { id: ruleSetId } = await currentRuleSet(manager);
  const lines = await linesOfRevision(manager, revision.id);
  const runId = await insertRun(manager, {
    orgId: revision.orgId,
    revisionId: revision.id,
    ordinal: (latest?.ordinal ?? 0) + 1,
    ruleSetId,
    status: 'queued',
    governing,
    linesTotal: lines.length,
    requestedBy,
    queuedAt: tx.now,
  });
  await tx.tools.jobs.send(manager, QUEUES.checkRun, runId);
  return runId;
}
