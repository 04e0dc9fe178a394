import type { Discrepancy, DiscrepancyEntry } from '../../entities/review.entities';
import { lastLetterAt } from '../../repositories/correspondence.repository';
import { listDiscrepancies, sentDiscrepancies } from '../../repositories/discrepancy.repository';
import type { Caller } from '../cases/caller';
import type { CaseFile } from '../cases/case-file';

/** Discrepancies that the caller may know of: what a reviewer has raised reaches the applicant with the letter. */
export async function visibleDiscrepancies(
  { tx, ability, actor }: Caller,
  applicationId: string,
): Promise<Discrepancy[]> {
  const all = await listDiscrepancies(tx.manager, ability, applicationId);
  if (actor.role !== 'applicant' || all.length === 0) return all;
  const sent = await sentDiscrepancies(
    tx.manager,
    all.map((d) => d.id),
  );
  return all.filter((d) => sent.has(d.id));
}

/**
 * Entries that the caller may read. What a reviewer asks again waits for the next letter, so until then the applicant
 * sees the thread without it.
 */
export async function visibleEntries(
  { tx, actor }: Caller,
  { application, round }: CaseFile,
  entries: readonly DiscrepancyEntry[],
): Promise<DiscrepancyEntry[]> {
  if (actor.role !== 'applicant' || round.state !== 'in-review') return [...entries];
  const sentAt = await lastLetterAt(tx.manager, application.id, 'return');
  return entries.filter((e) => e.kind !== 'reopened' || (sentAt !== null && e.writtenAt <= sentAt));
}

/** The state that goes with the entries that are shown: one that was asked again in silence is still answered. */
export function shownState(
  discrepancy: Discrepancy,
  all: readonly DiscrepancyEntry[],
  shown: readonly DiscrepancyEntry[],
): Discrepancy['state'] {
  const isHidden = discrepancy.state === 'open' && shown.length < all.length;
  return isHidden ? 'answered' : discrepancy.state;
}
