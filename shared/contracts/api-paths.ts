/**
 * Every call of the API: operationId → method and path.
 *
 * The server's route table, the OpenAPI document and the client read this one table. Parameters stand in braces.
 * `{applicationId}` takes the application's UUID or its number YY-NNNN.
 */

import { ACCOUNT_OPERATIONS } from './account-paths';

/** The part of an application that most paths start with. */
const CASE = '/api/applications/{applicationId}';

/** Methods that the API uses. */
export type HttpMethod = 'GET' | 'POST' | 'PUT' | 'PATCH' | 'DELETE';

/** Method and path of every operation of the case. */
export const CASE_OPERATIONS = {
  listApplications: { method: 'GET', path: '/api/applications' },
  createApplication: { method: 'POST', path: '/api/applications' },
  getApplication: { method: 'GET', path: CASE },
  updateApplication: { method: 'PATCH', path: CASE },
  getDraft: { method: 'GET', path: `${CASE}/draft` },
  getDraftLine: { method: 'GET', path: `${CASE}/draft/lines/{lineKey}` },
  saveDraftLine: { method: 'PUT', path: `${CASE}/draft/lines/{lineKey}` },
  deleteDraftLine: { method: 'DELETE', path: `${CASE}/draft/lines/{lineKey}` },
  importFile: { method: 'POST', path: `${CASE}/imports` },
  getImport: { method: 'GET', path: `${CASE}/imports/{importId}` },
  takeImport: { method: 'POST', path: `${CASE}/imports/{importId}/take` },
  exportLines: { method: 'GET', path: `${CASE}/export` },
  fileApplication: { method: 'POST', path: `${CASE}/file` },
  takeApplication: { method: 'POST', path: `${CASE}/take` },
  handOverApplication: { method: 'POST', path: `${CASE}/hand-over` },
  putBackApplication: { method: 'POST', path: `${CASE}/put-back` },
  returnApplication: { method: 'POST', path: `${CASE}/return` },
  acceptApplication: { method: 'POST', path: `${CASE}/accept` },
  declineApplication: { method: 'POST', path: `${CASE}/decline` },
  withdrawApplication: { method: 'POST', path: `${CASE}/withdraw` },
  amendApplication: { method: 'POST', path: `${CASE}/amend` },
  listDiscrepancies: { method: 'GET', path: `${CASE}/discrepancies` },
  raiseDiscrepancy: { method: 'POST', path: `${CASE}/discrepancies` },
  answerDiscrepancy: { method: 'POST', path: `${CASE}/discrepancies/{number}/answer` },
  settleDiscrepancy: { method: 'POST', path: `${CASE}/discrepancies/{number}/settle` },
  reopenDiscrepancy: { method: 'POST', path: `${CASE}/discrepancies/{number}/reopen` },
  remarkOnDiscrepancy: { method: 'POST', path: `${CASE}/discrepancies/{number}/remarks` },
  waiveFinding: { method: 'POST', path: `${CASE}/findings/{fingerprint}/waive` },
  setAsideFinding: { method: 'POST', path: `${CASE}/findings/{fingerprint}/set-aside` },
  listRevisions: { method: 'GET', path: `${CASE}/revisions` },
  compareRevisions: { method: 'GET', path: `${CASE}/revision-comparison` },
  getRevision: { method: 'GET', path: `${CASE}/revisions/{letter}` },
  getRevisionLine: { method: 'GET', path: `${CASE}/revisions/{letter}/lines/{lineKey}` },
  listRuns: { method: 'GET', path: `${CASE}/revisions/{letter}/runs` },
  checkAgain: { method: 'POST', path: `${CASE}/revisions/{letter}/runs` },
  adoptRun: { method: 'POST', path: `${CASE}/revisions/{letter}/runs/{run}/adopt` },
  compareRuns: { method: 'GET', path: `${CASE}/revisions/{letter}/run-comparison` },
  listAttachments: { method: 'GET', path: `${CASE}/attachments` },
  uploadAttachment: { method: 'POST', path: `${CASE}/attachments` },
  getAttachment: { method: 'GET', path: `${CASE}/attachments/{attachmentId}` },
  getLetter: { method: 'GET', path: `${CASE}/letters/{number}` },
  listApplicationLetters: { method: 'GET', path: `${CASE}/letters` },
  getTimeline: { method: 'GET', path: `${CASE}/timeline` },
  listReviewers: { method: 'GET', path: `${CASE}/reviewers` },
  listQueue: { method: 'GET', path: '/api/queue' },
  listLines: { method: 'GET', path: '/api/lines' },
  listLetters: { method: 'GET', path: '/api/letters' },
  listCountersigns: { method: 'GET', path: '/api/countersigns' },
  decideCountersign: { method: 'POST', path: '/api/countersigns/{countersignId}' },
  getRules: { method: 'GET', path: '/api/rules' },
  listConductors: { method: 'GET', path: '/api/conductors' },
  listDemoAccounts: { method: 'GET', path: '/api/demo/accounts' },
} as const satisfies Record<string, { method: HttpMethod; path: string }>;

/** Method and path of every operation. */
export const API_OPERATIONS = {
  ...ACCOUNT_OPERATIONS,
  ...CASE_OPERATIONS,
} as const;

/** Name of an operation. */
export type OperationId = keyof typeof API_OPERATIONS;

/** Names of the parameters in a path: `'/a/{b}/c'` → `'b'`. */
export type PathParameter<P extends string> = P extends `${string}{${infer Name}}${infer Rest}`
  ? Name | PathParameter<Rest>
  : never;

/**
 * Fills a path's parameters in.
 * @param path path with parameters in braces
 * @param params their values, encoded by this function
 * @returns the path of a request
 * @throws RangeError when a value is missing
 */
export function fillPath(path: string, params: Readonly<Record<string, string | number>>): string {
  return path.replace(/\{(\w+)\}/g, (_, name: string) => {
    const value = params[name];
    if (value === undefined) throw new RangeError(`path ${path} needs ${name}`);
    return encodeURIComponent(String(value));
  });
}
