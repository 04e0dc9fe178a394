import { MAX_FILE_BYTES } from '../files/read-filing-file';
import { deleteDraftLine, saveDraftLine } from '../services/drafts/save-draft-line';
import { IMPORT_FIELDS } from '../services/imports/import-fields';
import { getImport, readImport } from '../services/imports/read-import';
import { takeImport } from '../services/imports/take-import';
import { exportLines } from '../services/reads/export-lines';
import { getDraft, getDraftLine, readRow } from '../services/reads/get-draft';
import { route } from './route';

/** The draft of the next revision, by form and by file. */
export const draftRoutes = [
  route('getDraft', {
    summary: 'The draft with what stands in the way of filing',
    access: { can: 'read', on: 'Draft' },
    answers: { 200: 'draft' },
    handler: (call) => getDraft(call, call.params.applicationId),
  }),
  route('getDraftLine', {
    summary: 'A line of the draft',
    access: { can: 'read', on: 'Draft' },
    answers: { 200: 'draft-line' },
    handler: (call) => getDraftLine(call, call.params.applicationId, call.params.lineKey),
  }),
  route('saveDraftLine', {
    summary: 'Save a line of the draft, complete or not; version 0 makes a new one',
    access: { can: 'update', on: 'Draft' },
    answers: { 200: 'draft-line' },
    idempotent: true,
    versioned: true,
    handler: async (call) => {
      const { applicationId, lineKey } = call.params;
      return readRow(call, await saveDraftLine(call, applicationId, lineKey, call.body));
    },
  }),
  route('deleteDraftLine', {
    summary: 'Remove a line from the draft',
    access: { can: 'update', on: 'Draft' },
    answers: { 200: 'draft' },
    idempotent: true,
    handler: async (call) => {
      const { applicationId, lineKey } = call.params;
      const { version } = call.query;
      await deleteDraftLine(
        call,
        applicationId,
        lineKey,
        version === undefined ? undefined : Number(version),
      );
      return getDraft(call, applicationId);
    },
  }),
  route('importFile', {
    summary: 'Read a JSON or CSV file of lines; it is staged for the applicant’s word',
    access: { can: 'create', on: 'Import' },
    answers: { 201: 'import' },
    idempotent: true,
    upload: { maxBytes: MAX_FILE_BYTES, fields: IMPORT_FIELDS },
    handler: async (call) => {
      const { applicationId } = call.params;
      return getImport(call, applicationId, await readImport(call, applicationId, call.file, call.fields));
    },
  }),
  route('getImport', {
    summary: 'A file that was read, with its lines, faults and notices',
    access: { can: 'read', on: 'Import' },
    answers: { 200: 'import' },
    handler: (call) => getImport(call, call.params.applicationId, call.params.importId),
  }),
  route('takeImport', {
    summary: 'Take the lines of a file into the draft',
    access: { can: 'update', on: 'Import' },
    answers: { 200: 'import' },
    idempotent: true,
    handler: async (call) => {
      const { applicationId, importId } = call.params;
      await takeImport(call, applicationId, importId, call.body);
      return getImport(call, applicationId, importId);
    },
  }),
  route('exportLines', {
    summary: 'Lines of a revision or of the draft as a file',
    access: { can: 'read', on: 'Application' },
    answers: { 200: 'bytes' },
    handler: (call) => exportLines(call, call.params.applicationId, call.query),
  }),
];
