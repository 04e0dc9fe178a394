import { forbidden, notFound } from '../../errors/problem';
import type { DraftLine } from '../../entities/case.entities';
import { findDraftLine, highestLineKey } from '../../repositories/draft.repository';
import { presentDraftLine, presentFault } from '../../presenters/draft.presenter';
import type * as Api from '../../../shared/contracts/api.generated';
import type { PointerFault } from '../../../shared/contracts/faults';
import type { Caller } from '../cases/caller';
import { readCase, type CaseFile } from '../cases/case-file';
import { lineKeyOf, readDraft, readDraftLine } from '../drafts/read-draft';
import { readingContext } from '../rules/reading-context';

const LISTED_FAULTS = 2000;

/** A case whose draft the caller may see: the applicant's own. */
async function draftCase(caller: Caller, reference: string): Promise<CaseFile> {
  const file = await readCase(caller, reference);
  if (!caller.ability.can('read', { kind: 'Draft', orgId: file.application.orgId })) throw forbidden();
  return file;
}

/** The draft of the next revision with what stands in the way of filing. */
export async function getDraft(caller: Caller, reference: string): Promise<Api.Draft> {
  const { tx } = caller;
  const file = await draftCase(caller, reference);
  const draft = await readDraft(tx, file);
  const lines = new Map(draft.lines.map((line) => [line.pointer, line]));
  return {
    applicationId: file.application.id,
    version: file.round.version,
    nextLineKey: `L${(await highestLineKey(tx.manager, file.application.id)) + 1}`,
    lines: draft.rows.map((row, i) =>
      presentDraftLine({
        row,
        line: lines.get(`/lines/${i}`) ?? null,
        faults: faultsWithin(draft.faults, `/lines/${i}`),
      }),
    ),
    ready: draft.rows.length > 0 && draft.faults.length === 0,
    faults: draft.faults.slice(0, LISTED_FAULTS).map((fault) => withLineKey(fault, draft.rows)),
  };
}

/** Faults of one line, with pointers that count from it. */
function faultsWithin(faults: readonly PointerFault[], pointer: string): PointerFault[] {
  return faults
    .filter((fault) => fault.pointer === pointer || fault.pointer.startsWith(`${pointer}/`))
    .map((fault) => ({ ...fault, pointer: fault.pointer.slice(pointer.length) }));
}

function withLineKey(fault: PointerFault, rows: readonly DraftLine[]): Api.Fault {
  const lineKey = lineKeyOf(fault, rows);
  return { ...presentFault(fault), ...(lineKey === undefined ? {} : { lineKey }) };
}

export async function getDraftLine(
  caller: Caller,
  reference: string,
  lineKey: string,
): Promise<Api.DraftLine> {
  const file = await draftCase(caller, reference);
  const row = await findDraftLine(caller.tx.manager, file.round.id, lineKey);
  if (row === null) throw notFound();
  return readRow(caller, row);
}

/** A line of the draft as it stands, with its own faults. */
export async function readRow({ tx }: Caller, row: DraftLine): Promise<Api.DraftLine> {
  return presentDraftLine({ row, ...readDraftLine(row, await readingContext(tx.manager)) });
}
