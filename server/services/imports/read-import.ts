import { forbidden, notFound } from '../../errors/problem';
import { fitToKeep } from '../../files/kept-text';
import { readFilingFile, type FilingFile } from '../../files/read-filing-file';
import { draftLines } from '../../repositories/draft.repository';
import { findImport, importRows, insertImport } from '../../repositories/import.repository';
import { presentImport } from '../../presenters/import.presenter';
import type * as Api from '../../../shared/contracts/api.generated';
import type { Fault } from '../../../shared/contracts/faults';
import { safeFileName } from '../attachments/file-kinds';
import type { UploadedBytes } from '../attachments/upload-attachment';
import type { Caller } from '../cases/caller';
import { holdCase, readCase } from '../cases/case-file';
import { MAX_LINES } from '../drafts/save-draft-line';
import { requireEditable } from '../drafts/update-application';
import { sha256 } from '../filing/line-hash';
import { readingContext } from '../rules/reading-context';
import { correctionsOf } from './import-fields';

/** Reads a JSON or CSV file of lines and stages what it holds; the applicant's word takes it into the draft. */
export async function readImport(
  caller: Caller,
  reference: string,
  upload: UploadedBytes,
  fields: Readonly<Record<string, string>> = {},
): Promise<string> {
  const { tx, actor, ability } = caller;
  const file = await holdCase(caller, reference, 'update');
  const { orgId, id: applicationId } = file.application;
  if (!ability.can('create', { kind: 'Import', orgId })) throw forbidden();
  requireEditable(file);
  const { library, owner } = await readingContext(tx.manager);
  const name = safeFileName(upload.name);
  const read = withinLimit(readFilingFile(upload.bytes, name, { library, owner, ...correctionsOf(fields) }));
  return insertImport(
    tx.manager,
    {
      orgId,
      applicationId,
      roundId: file.round.id,
      state: read.sound.lines.length === 0 ? 'refused' : 'staged',
      fileName: name,
      fileSha256: sha256(upload.bytes),
      dialect: { format: read.format, csv: read.dialect } as never,
      faults: fitToKeep(read.faults) as never,
      notices: fitToKeep(read.notices) as never,
      rowCount: read.rowCount,
      lineCount: read.sound.lines.length,
      createdBy: actor.userId,
      createdAt: tx.now,
    },
    rowsOf(read).map((row) => ({ ...row, orgId })),
  );
}

/** More lines than an application holds: none of them is staged, and the file says so. */
function withinLimit(read: FilingFile): FilingFile {
  const count = read.sound.lines.length;
  if (count <= MAX_LINES) return read;
  const place = read.format === 'json' ? { pointer: '/lines' } : { row: 1, column: '' };
  const expected = `at most ${MAX_LINES} lines`;
  const fault = { ...place, value: count, expected, message: `An application holds ${expected}.` } as Fault;
  return { ...read, filing: null, sound: { lines: [] }, faults: [fault, ...read.faults] };
}

function rowsOf(read: FilingFile) {
  return read.sound.lines.map((line, i) => ({
    ordinal: i + 1,
    row: null,
    body: { sheet: line.sheet, nominalVoltageKv: line.nominalVoltageKv, lengthKm: line.lengthKm } as never,
  }));
}

/** What an import holds, as the applicant is shown it. */
export async function getImport(caller: Caller, reference: string, id: string): Promise<Api.Import> {
  const { tx, ability } = caller;
  const file = await readCase(caller, reference);
  const staged = await findImport(tx.manager, ability, file.application.id, id);
  if (staged === null) throw notFound();
  const rows = await importRows(tx.manager, staged.id);
  const draft = await draftLines(tx.manager, file.round.id);
  return presentImport(staged, rows, draft);
}
