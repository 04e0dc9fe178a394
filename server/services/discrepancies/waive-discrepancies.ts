import { conditionalUpdate } from '../../database/conditional-update';
import { Discrepancy } from '../../entities/review.entities';
import { addEntry, discrepanciesOfRound, raisedFrom } from '../../repositories/discrepancy.repository';
import { standingDispositions } from '../../repositories/disposition.repository';
import { findingsOfRun } from '../../repositories/run.repository';
import type { Caller } from '../cases/caller';
import { filedRevision, type CaseFile } from '../cases/case-file';
import { recordStep } from '../cases/record-step';
import { findingsAbout } from '../findings/finding-views';

/** A discrepancy whose findings are all waived is waived with them. */
export async function waiveSettledDiscrepancies(caller: Caller, file: CaseFile): Promise<void> {
  const { tx, actor } = caller;
  if (file.run === null) return;
  const revision = filedRevision(file);
  const waived = new Set(
    (await standingDispositions(tx.manager, revision.id))
      .filter((d) => d.kind === 'waived')
      .map((d) => `${d.lineKey} ${d.fingerprint}`),
  );
  const findings = await findingsOfRun(tx.manager, file.run.id);
  const open = (await discrepanciesOfRound(tx.manager, file.round.id)).filter((d) =>
    ['open', 'answered'].includes(d.state),
  );
  const links = await raisedFrom(
    tx.manager,
    open.map((d) => d.id),
  );
  for (const discrepancy of open) {
    const own = findingsAbout(
      links.filter((l) => l.discrepancyId === discrepancy.id),
      findings,
    ).filter((f) => f.follows === null);
    if (own.length === 0 || !own.every((f) => waived.has(`${f.lineKey} ${f.fingerprint}`))) continue;
    await conditionalUpdate(
      tx.manager,
      Discrepancy,
      { id: discrepancy.id, version: discrepancy.version },
      { state: 'waived' },
    );
    await addEntry(tx.manager, {
      orgId: discrepancy.orgId,
      discrepancyId: discrepancy.id,
      kind: 'waived',
      text: 'Its findings are waived.',
      revisionId: revision.id,
      writtenBy: actor.userId,
      writtenAt: tx.now,
    });
    recordStep(tx, file, 'discrepancy.waived', { number: discrepancy.number });
  }
}
