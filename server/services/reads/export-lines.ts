import { conflict, forbidden, invalidContent, notFound } from '../../errors/problem';
import { csvFile, jsonFile } from '../../files/write-filing-file';
import { findRevision, linesOfRevision } from '../../repositories/revision.repository';
import type { ExportLinesRequest } from '../../../shared/contracts/api.generated';
import type { LineSheet } from '../../../shared/filing/types';
import type { Caller } from '../cases/caller';
import { readCase, type CaseFile } from '../cases/case-file';
import { readDraft } from '../drafts/read-draft';

/** Lines of a revision, or of the applicant's draft, as a file in the filing format. */
export async function exportLines(caller: Caller, reference: string, query: ExportLinesRequest) {
  const file = await readCase(caller, reference);
  const sheets = await sheetsOf(caller, file, query.revision);
  const format = query.format ?? 'json';
  const written = format === 'csv' ? csvFile(sheets) : jsonFile(sheets);
  if (!written.ok) {
    throw invalidContent(
      written.reasons.map(({ line, message }) => ({
        value: line,
        expected: 'a line that CSV can hold',
        message,
      })),
    );
  }
  const { bytes, mediaType } = written;
  const letter = query.revision ?? (caller.actor.role === 'applicant' ? 'draft' : file.revision?.letter);
  return { bytes, mediaType, fileName: `${file.application.number}-${letter ?? 'draft'}.${format}` };
}

async function sheetsOf(caller: Caller, file: CaseFile, letter: string | undefined): Promise<LineSheet[]> {
  const { tx, ability, actor } = caller;
  if (letter === undefined && actor.role === 'applicant') {
    if (!ability.can('read', { kind: 'Draft', orgId: file.application.orgId })) throw forbidden();
    const draft = await readDraft(tx, file);
    if (draft.lines.length < draft.rows.length) {
      throw conflict('Lines of the draft that are not complete yet cannot be exported.');
    }
    return draft.lines.map((line) => line.sheet);
  }
  const revision =
    letter === undefined
      ? file.revision
      : await findRevision(tx.manager, ability, file.application.id, letter);
  if (revision === null) throw notFound();
  return (await linesOfRevision(tx.manager, revision.id)).map((line) => line.body as unknown as LineSheet);
}
