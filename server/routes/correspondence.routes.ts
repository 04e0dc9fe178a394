import { getAttachment } from '../services/attachments/get-attachment';
import { MAX_ATTACHMENT_BYTES } from '../services/attachments/file-kinds';
import { attachmentsOf, uploadAttachment } from '../services/attachments/upload-attachment';
import { getLetter, listApplicationLetters, listLetters } from '../services/reads/list-letters';
import { route } from './route';

/** Files that people add to a case, and letters that its steps send. */
export const correspondenceRoutes = [
  route('listAttachments', {
    summary: 'Attachments of an application',
    access: { can: 'read', on: 'Attachment' },
    answers: { 200: 'attachment-list' },
    handler: (call) => attachmentsOf(call, call.params.applicationId),
  }),
  route('uploadAttachment', {
    summary: 'Attach a PDF, PNG or JPEG to the application, a line or a discrepancy',
    access: { can: 'create', on: 'Attachment' },
    answers: { 201: 'attachment' },
    idempotent: true,
    upload: { maxBytes: MAX_ATTACHMENT_BYTES, fields: ['subject', 'ref'] },
    handler: (call) => uploadAttachment(call, call.params.applicationId, call.file, call.fields),
  }),
  route('getAttachment', {
    summary: 'The bytes of an attachment',
    access: { can: 'read', on: 'Attachment' },
    answers: { 200: 'bytes' },
    handler: (call) => getAttachment(call, call.params.applicationId, call.params.attachmentId),
  }),
  route('listApplicationLetters', {
    summary: 'Letters of an application',
    access: { can: 'read', on: 'Letter' },
    answers: { 200: 'letter-list' },
    handler: (call) => listApplicationLetters(call, call.params.applicationId),
  }),
  route('getLetter', {
    summary: 'A letter as it was sent, as PDF',
    access: { can: 'read', on: 'Letter' },
    answers: { 200: 'bytes' },
    handler: (call) => getLetter(call, call.params.applicationId, Number(call.params.number)),
  }),
  route('listLetters', {
    summary: 'Letters of all cases, a page',
    access: { can: 'read', on: 'Letter' },
    answers: { 200: 'letter-list' },
    handler: (call) => listLetters(call, call.query),
  }),
];
