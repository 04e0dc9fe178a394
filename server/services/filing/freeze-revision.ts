import type { Revision } from '../../entities/filed.entities';
import { insertRevision, insertRevisionLines, type FiledLine } from '../../repositories/revision.repository';
import { canonicalFilingText } from '../../../shared/filing/canonical';
import { revisionLetter } from '../../../shared/workflow/revision-letters';
import type { Caller } from '../cases/caller';
import type { CaseFile } from '../cases/case-file';
import type { ReadDraft } from '../drafts/read-draft';
import { lineHash, sha256 } from './line-hash';

/** Freezes the draft as the next revision, with everything that it holds. */
export async function freezeRevision(
  { tx, actor }: Caller,
  { application, round, revision: before }: CaseFile,
  draft: ReadDraft,
  note: string | null,
): Promise<Revision> {
  const ordinal = (before?.ordinal ?? 0) + 1;
  const revision = await insertRevision(tx.manager, {
    orgId: application.orgId,
    applicationId: application.id,
    roundId: round.id,
    ordinal,
    letter: revisionLetter(ordinal),
    contentHash: sha256(canonicalFilingText({ lines: draft.lines })),
    particulars: {
      title: application.title,
      connectionKind: application.connectionKind,
      capacityMw: application.capacityMw,
      pointOfConnection: application.pointOfConnection,
      contactName: application.contactName,
      contactEmail: application.contactEmail,
      contactPhone: application.contactPhone,
      note,
    } as never,
    filedBy: actor.userId,
    filedAt: tx.now,
  });
  await insertRevisionLines(tx.manager, revision, filedLines(draft));
  return revision;
}

function filedLines(draft: ReadDraft): FiledLine[] {
  return draft.lines.map((line, i) => {
    const row = draft.rows[i];
    if (row === undefined) throw new Error('a line of the draft has no row');
    return {
      lineKey: row.lineKey,
      ordinal: i + 1,
      lineHash: lineHash(line),
      name: line.name,
      nominalVoltageKv: line.nominalVoltageKv,
      frequencyHz: line.frequencyHz,
      lengthKm: line.lengthKm,
      body: { ...line.sheet },
    };
  });
}
