import type { AttachmentLink } from '../../entities/file.entities';
import { forbidden, invalidContent, Problem } from '../../errors/problem';
import { insertAttachment, insertLink, listAttachments } from '../../repositories/attachment.repository';
import { findDraftLine } from '../../repositories/draft.repository';
import { namesOf } from '../../repositories/people-names.repository';
import { linesOfRevision } from '../../repositories/revision.repository';
import { presentAttachment } from '../../presenters/attachment.presenter';
import type * as Api from '../../../shared/contracts/api.generated';
import type { Caller } from '../cases/caller';
import { holdCase, readCase, type CaseFile } from '../cases/case-file';
import { recordStep } from '../cases/record-step';
import { visibleDiscrepancies } from '../discrepancies/visible-discrepancies';
import { sha256 } from '../filing/line-hash';
import { mediaTypeOf, safeFileName, TAKEN_FILES } from './file-kinds';

export interface UploadedBytes {
  name: string;
  mediaType: string;
  bytes: Buffer;
}

/** Keeps a file with the case, on the application, one of its lines or a discrepancy. */
export async function uploadAttachment(
  caller: Caller,
  reference: string,
  file: UploadedBytes,
  fields: Readonly<Record<string, string>>,
): Promise<Api.Attachment> {
  const { tx, ability, actor } = caller;
  const held = await holdCase(caller, reference, 'read');
  const { orgId, id: applicationId } = held.application;
  if (!ability.can('create', { kind: 'Attachment', orgId })) throw forbidden();
  const subject = await subjectOf(caller, held, fields['subject'] ?? 'application', fields['ref']);
  const mediaType = await checkBytes(caller, file);
  const name = safeFileName(file.name);
  const attachmentId = await insertAttachment(
    tx.manager,
    {
      orgId,
      sha256: sha256(file.bytes),
      name,
      mediaType,
      byteLength: file.bytes.length,
      scan: 'clean',
      uploadedBy: actor.userId,
      uploadedAt: tx.now,
    },
    file.bytes,
  );
  await insertLink(tx.manager, { orgId, attachmentId, applicationId, ...subject, linkedAt: tx.now });
  recordStep(tx, held, 'attachment.added', { fileName: name, sha256: sha256(file.bytes), ...subject });
  const all = await attachmentsOf(caller, reference);
  const added = all.items.find((item) => item.id === attachmentId);
  if (added === undefined) throw new Error('an attachment that was added is not among the application’s');
  return added;
}

async function checkBytes({ tx }: Caller, { name, mediaType, bytes }: UploadedBytes): Promise<string> {
  const message = `The file’s ending, its type and its content do not agree on ${TAKEN_FILES}.`;
  if (bytes.length === 0) {
    throw invalidContent([
      { pointer: '/file', value: '0 bytes', expected: TAKEN_FILES, message: 'The file is empty.' },
    ]);
  }
  const found = mediaTypeOf(name, mediaType, bytes);
  if (found === null) throw new Problem('unsupported-media-type', { detail: message });
  if ((await tx.tools.virusScan.scan(bytes)) === 'refused') {
    const refused = 'The file was refused by the virus scan.';
    throw invalidContent([
      { pointer: '/file', value: name, expected: 'a file without a virus', message: refused },
    ]);
  }
  return found;
}

type Subject = Pick<AttachmentLink, 'subject' | 'lineKey' | 'discrepancyId'>;

async function subjectOf(
  caller: Caller,
  file: CaseFile,
  subject: string,
  reference: string | undefined,
): Promise<Subject> {
  if (subject === 'application') return { subject, lineKey: null, discrepancyId: null };
  if (subject === 'line' && (await hasLine(caller, file, reference ?? ''))) {
    return { subject, lineKey: reference ?? '', discrepancyId: null };
  }
  if (subject === 'discrepancy') {
    const all = await visibleDiscrepancies(caller, file.application.id);
    const discrepancy = all.find((d) => String(d.number) === reference);
    if (discrepancy !== undefined) return { subject, lineKey: null, discrepancyId: discrepancy.id };
  }
  const pointer = ['line', 'discrepancy'].includes(subject) ? '/ref' : '/subject';
  const value = pointer === '/ref' ? (reference ?? null) : subject;
  const expected =
    pointer === '/ref' ? `a ${subject} of this application` : 'application, line or discrepancy';
  const message = `The file can hang on ${expected}.`;
  throw invalidContent([{ pointer, value, expected, message }]);
}

async function hasLine({ tx, actor }: Caller, file: CaseFile, lineKey: string): Promise<boolean> {
  if (file.revision !== null) {
    const lines = await linesOfRevision(tx.manager, file.revision.id);
    if (lines.some((line) => line.lineKey === lineKey)) return true;
  }
  return actor.role === 'applicant' && (await findDraftLine(tx.manager, file.round.id, lineKey)) !== null;
}

/** Attachments of an application, as far as the caller may know what they hang on. */
export async function attachmentsOf(caller: Caller, reference: string): Promise<Api.AttachmentList> {
  const { tx, ability } = caller;
  const { application } = await readCase(caller, reference);
  const all = await listAttachments(tx.manager, ability, application.id);
  const discrepancies = await visibleDiscrepancies(caller, application.id);
  const numbers = new Map(discrepancies.map((d) => [d.id, d.number]));
  const visible = all.filter(({ link }) => link.discrepancyId === null || numbers.has(link.discrepancyId));
  const people = await namesOf(
    tx.manager,
    visible.map(({ attachment }) => attachment.uploadedBy),
  );
  return { items: visible.map((linked) => presentAttachment(linked, application, { people, numbers })) };
}
