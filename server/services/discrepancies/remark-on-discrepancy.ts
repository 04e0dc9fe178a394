import { forbidden } from '../../errors/problem';
import type { Caller } from '../cases/caller';
import { applicationRecord, holdCase } from '../cases/case-file';
import { moveDiscrepancy, openForStep } from './move-discrepancy';

/** Adds words to a discrepancy's thread; its state stays. */
export async function remarkOnDiscrepancy(
  caller: Caller,
  reference: string,
  number: number,
  text: string,
): Promise<void> {
  const file = await holdCase(caller, reference, 'read');
  const record = applicationRecord(file.application);
  if (!caller.ability.can('answer', record) && !caller.ability.can('review', record)) throw forbidden();
  const { discrepancy } = await openForStep(caller, file, number, 'remark', undefined);
  await moveDiscrepancy(caller, file, discrepancy, {}, { kind: 'commented', text });
}
