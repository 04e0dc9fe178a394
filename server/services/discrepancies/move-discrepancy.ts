import { conditionalUpdate } from '../../database/conditional-update';
import { Discrepancy, type DiscrepancyEntryKind } from '../../entities/review.entities';
import { conflict, forbidden, notFound, stale } from '../../errors/problem';
import { addEntry } from '../../repositories/discrepancy.repository';
import { checkDiscrepancyStep, type DiscrepancyStep } from '../../../shared/workflow/discrepancies';
import type { Caller } from '../cases/caller';
import { filedRevision, type CaseFile } from '../cases/case-file';
import { recordStep } from '../cases/record-step';
import { visibleDiscrepancies } from './visible-discrepancies';

/** The discrepancy of a number, as far as the caller may know of it, and what it becomes. */
export async function openForStep(
  caller: Caller,
  file: CaseFile,
  number: number,
  step: DiscrepancyStep,
  version: number | undefined,
): Promise<{ discrepancy: Discrepancy; to: Discrepancy['state'] }> {
  const all = await visibleDiscrepancies(caller, file.application.id);
  const discrepancy = all.find((d) => d.number === number);
  if (discrepancy === undefined) throw notFound();
  if (discrepancy.roundId !== file.round.id) {
    throw conflict(`D-${number} belongs to an earlier round, which is closed.`);
  }
  const answer = checkDiscrepancyStep(step, discrepancy, file.round, caller.actor.role);
  if (!answer.open) throw answer.refusal === 'role' ? forbidden(answer.reason) : conflict(answer.reason);
  requireVersion(discrepancy, version);
  return { discrepancy, to: answer.to };
}

function requireVersion(discrepancy: Discrepancy, version: number | undefined): void {
  if (version === undefined || version === discrepancy.version) return;
  throw stale(`D-${discrepancy.number} was changed by somebody else since you last saw it.`, {
    currentVersion: discrepancy.version,
    changed: [`D-${discrepancy.number} is ${discrepancy.state} now.`],
  });
}

/** Changes a discrepancy and adds what was said to its thread. */
export async function moveDiscrepancy(
  { tx, actor }: Caller,
  file: CaseFile,
  discrepancy: Discrepancy,
  changes: Partial<Pick<Discrepancy, 'state' | 'answeredBy' | 'draftAnswer'>>,
  entry: { kind: DiscrepancyEntryKind; text: string } | null,
): Promise<void> {
  await conditionalUpdate(
    tx.manager,
    Discrepancy,
    { id: discrepancy.id, version: discrepancy.version, state: discrepancy.state },
    changes,
  );
  if (entry === null) return;
  await addEntry(tx.manager, {
    orgId: discrepancy.orgId,
    discrepancyId: discrepancy.id,
    ...entry,
    revisionId: filedRevision(file).id,
    writtenBy: actor.userId,
    writtenAt: tx.now,
  });
  recordStep(
    tx,
    file,
    `discrepancy.${entry.kind}`,
    { number: discrepancy.number, state: changes.state ?? discrepancy.state, text: entry.text },
    { state: discrepancy.state },
  );
}
