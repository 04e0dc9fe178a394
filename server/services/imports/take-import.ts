import type { QueryDeepPartialEntity } from 'typeorm';
import { conditionalUpdate } from '../../database/conditional-update';
import { DraftLine } from '../../entities/case.entities';
import { FileImport } from '../../entities/file.entities';
import { conflict, notFound } from '../../errors/problem';
import {
  draftLines,
  highestLineKey,
  insertDraftLines,
  removeDraftLine,
} from '../../repositories/draft.repository';
import { findImport, importRows } from '../../repositories/import.repository';
import { draftLineNamed, type StagedLine } from '../../presenters/import.presenter';
import type { TakeImportRequest } from '../../../shared/contracts/api.generated';
import type { LineSheet } from '../../../shared/filing/types';
import type { Caller } from '../cases/caller';
import { holdCase, type CaseFile } from '../cases/case-file';
import { recordStep } from '../cases/record-step';
import { MAX_LINES } from '../drafts/save-draft-line';
import { requireEditable } from '../drafts/update-application';

/** Takes what a file held into the draft: lines of a known name replace, others are added. All of it or nothing. */
export async function takeImport(
  caller: Caller,
  reference: string,
  id: string,
  request: TakeImportRequest,
): Promise<void> {
  const { tx, ability } = caller;
  const file = await holdCase(caller, reference, 'update');
  requireEditable(file);
  const staged = await findImport(tx.manager, ability, file.application.id, id);
  if (staged === null) throw notFound();
  requireTakeable(file, staged, request);
  const lines = (await importRows(tx.manager, staged.id)).map((row) => row.body as StagedLine);
  await intoDraft(caller, file, lines, request.replaceAll === true);
  await conditionalUpdate(
    tx.manager,
    FileImport,
    { id: staged.id, version: staged.version, state: 'staged' },
    { state: 'imported', importedAt: tx.now },
  );
  recordStep(tx, file, 'lines.imported', {
    fileName: staged.fileName,
    sha256: staged.fileSha256,
    lines: lines.length,
    faults: staged.faults.length,
  });
}

function requireTakeable(file: CaseFile, staged: FileImport, request: TakeImportRequest): void {
  if (staged.state === 'imported') throw conflict('The file has been taken already.');
  if (staged.state === 'refused') throw conflict('Nothing in the file can be taken.');
  if (staged.roundId !== file.round.id) throw conflict('The file was read for an earlier round.');
  if (request.take === 'all' && staged.faults.length > 0) {
    throw conflict('The file has faults: mend them, or take only the lines without one.');
  }
}

async function intoDraft(
  caller: Caller,
  file: CaseFile,
  lines: readonly StagedLine[],
  replaceAll: boolean,
): Promise<void> {
  const { manager } = caller.tx;
  const draft = await draftLines(manager, file.round.id);
  const known = lines.map(({ sheet }) => draftLineNamed(draft, sheet.line.name));
  const others = draft.filter((row) => !known.includes(row));
  const kept = replaceAll ? 0 : others.length;
  if (kept + lines.length > MAX_LINES) throw conflict(`An application holds at most ${MAX_LINES} lines.`);
  if (replaceAll) for (const row of others) await removeDraftLine(manager, row);
  let key = await highestLineKey(manager, file.application.id);
  let ordinal = draft.at(-1)?.ordinal ?? 0;
  const added: QueryDeepPartialEntity<DraftLine>[] = [];
  for (const [i, { sheet }] of lines.entries()) {
    const row = known[i];
    if (row !== undefined) await replaceLine(caller, row, sheet);
    else added.push(newLine(caller, file, sheet, `L${++key}`, ++ordinal));
  }
  await insertDraftLines(manager, added);
}

/** Digits as they stood in the file go where those typed by hand do. */
function content({ line, written }: LineSheet) {
  const typed = Object.entries(written).map(([pointer, text]) => [pointer, { text }]);
  return { body: line as never, asTyped: Object.fromEntries(typed) as never };
}

function newLine(
  { tx, actor }: Caller,
  { application, round }: CaseFile,
  sheet: LineSheet,
  lineKey: string,
  ordinal: number,
): QueryDeepPartialEntity<DraftLine> {
  return {
    orgId: application.orgId,
    roundId: round.id,
    lineKey,
    ordinal,
    ...content(sheet),
    updatedAt: tx.now,
    updatedBy: actor.userId,
  };
}

async function replaceLine({ tx, actor }: Caller, row: DraftLine, sheet: LineSheet): Promise<void> {
  await conditionalUpdate(
    tx.manager,
    DraftLine,
    { id: row.id, version: row.version },
    { ...content(sheet), updatedAt: tx.now, updatedBy: actor.userId },
  );
}
