import type { DraftLine } from '../entities/case.entities';
import type { FileImport, ImportRow } from '../entities/file.entities';
import type * as Api from '../../shared/contracts/api.generated';
import type { Fault } from '../../shared/contracts/faults';
import type { LineSheet, Notice } from '../../shared/filing/types';
import { instantOrNull } from './person.presenter';
import { circuitCount } from './revision.presenter';

/** A line that was read, as it is staged. */
export interface StagedLine {
  sheet: LineSheet;
  nominalVoltageKv: number;
  lengthKm: number;
}

/** The line of the draft that has a name; blanks and case at its ends make no other. */
export function draftLineNamed(draft: readonly DraftLine[], name: string): DraftLine | undefined {
  return draft.find((row) => comparable((row.body as { name?: unknown }).name) === comparable(name));
}

function comparable(name: unknown): string {
  return typeof name === 'string' ? name.normalize('NFKC').trim().replace(/\s+/g, ' ').toLowerCase() : '';
}

export function presentImport(
  file: FileImport,
  rows: readonly ImportRow[],
  draft: readonly DraftLine[],
): Api.Import {
  const { format, csv } = file.dialect as { format: Api.Import['format']; csv: Api.Import['dialect'] };
  return {
    id: file.id,
    applicationId: file.applicationId,
    state: file.state,
    fileName: file.fileName,
    sha256: file.fileSha256,
    format,
    dialect: csv,
    rowCount: file.rowCount,
    lines: rows.map((row) => presentStaged(row.body as StagedLine, draft)),
    faults: (file.faults as Fault[]).map((fault) => ({ ...fault })),
    notices: (file.notices as Notice[]).map(({ pointer, message }) =>
      pointer === undefined || pointer === '' ? { message } : { pointer, message },
    ),
    createdAt: file.createdAt.toISOString(),
    importedAt: instantOrNull(file.importedAt),
  };
}

function presentStaged(staged: StagedLine, draft: readonly DraftLine[]): Api.Import['lines'][number] {
  const { name } = staged.sheet.line;
  const known = draftLineNamed(draft, name);
  return {
    name,
    lineKey: known?.lineKey ?? null,
    lengthKm: staged.lengthKm,
    nominalVoltageKv: staged.nominalVoltageKv,
    circuitCount: circuitCount(staged.sheet.line),
    replaces: known !== undefined,
  };
}
