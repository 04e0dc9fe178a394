import type { Discrepancy } from '../../entities/review.entities';
import { listDiscrepancies, sentDiscrepancies } from '../../repositories/discrepancy.repository';
import type { Caller } from '../cases/caller';

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
