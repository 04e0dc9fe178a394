import { recordEvent } from '../../database/audit/record-event';
import type { Transaction } from '../../database/transaction';
import type { CaseFile } from './case-file';

/** Notes a step of a case in the trail. */
export function recordStep(
  tx: Transaction,
  file: CaseFile,
  act: string,
  after: Record<string, unknown>,
  before: Record<string, unknown> | null = null,
): void {
  const { application, revision } = file;
  recordEvent(tx, {
    act,
    orgId: application.orgId,
    applicationId: application.id,
    before,
    after: { ...(revision === null ? {} : { revision: revision.letter }), ...after },
  });
}
