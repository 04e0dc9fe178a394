/** What goes in and what comes out of every operation of the case: types of query, body and answer. */
import type * as Api from './api.generated';
import type { ACCOUNT_OPERATIONS } from './account-paths';
import type { AccountExchanges } from './account-types';
import type { CASE_OPERATIONS, PathParameter } from './api-paths';

/** A file sent as multipart/form-data: field `file`, and the text fields named. */
export interface FileForm {
  /** Other fields of the form. */
  fields: Readonly<Record<string, string>>;
}

/** Bytes of a file, with its own media type. */
export type FileBytes = { readonly bytes: Uint8Array };

interface Exchanges {
  listApplications: { query: Api.ListApplicationsRequest; response: Api.ApplicationList };
  createApplication: { body: Api.CreateApplicationRequest; response: Api.Application };
  getApplication: { response: Api.Application };
  updateApplication: { body: Api.UpdateApplicationRequest; response: Api.Application };
  getDraft: { response: Api.Draft };
  getDraftLine: { response: Api.DraftLine };
  saveDraftLine: { body: Api.SaveDraftLineRequest; response: Api.DraftLine };
  deleteDraftLine: { query: Api.DeleteDraftLineRequest; response: Api.Draft };
  importFile: { body: FileForm; response: Api.Import };
  getImport: { response: Api.Import };
  takeImport: { body: Api.TakeImportRequest; response: Api.Import };
  exportLines: { query: Api.ExportLinesRequest; response: FileBytes };
  fileApplication: { body: Api.FileApplicationRequest; response: Api.Application };
  takeApplication: { body: Api.TakeApplicationRequest; response: Api.Application };
  handOverApplication: { body: Api.HandOverApplicationRequest; response: Api.Application };
  putBackApplication: { body: Api.PutBackApplicationRequest; response: Api.Application };
  returnApplication: { body: Api.ReturnApplicationRequest; response: Api.Application };
  acceptApplication: { body: Api.AcceptApplicationRequest; response: Api.Application };
  declineApplication: { body: Api.DeclineApplicationRequest; response: Api.Application };
  withdrawApplication: { body: Api.WithdrawApplicationRequest; response: Api.Application };
  amendApplication: { body: Api.AmendApplicationRequest; response: Api.Application };
  listDiscrepancies: { response: Api.DiscrepancyList };
  raiseDiscrepancy: { body: Api.RaiseDiscrepancyRequest; response: Api.Discrepancy };
  answerDiscrepancy: { body: Api.AnswerDiscrepancyRequest; response: Api.Discrepancy };
  settleDiscrepancy: { body: Api.SettleDiscrepancyRequest; response: Api.Discrepancy };
  reopenDiscrepancy: { body: Api.ReopenDiscrepancyRequest; response: Api.Discrepancy };
  remarkOnDiscrepancy: { body: Api.RemarkOnDiscrepancyRequest; response: Api.Discrepancy };
  waiveFinding: { body: Api.WaiveFindingRequest; response: Api.Finding };
  setAsideFinding: { body: Api.SetAsideFindingRequest; response: Api.Finding };
  listRevisions: { response: Api.RevisionList };
  compareRevisions: { query: Api.CompareRevisionsRequest; response: Api.RevisionComparison };
  getRevision: { response: Api.Revision };
  getRevisionLine: { response: Api.RevisionLine };
  listRuns: { response: Api.RunList };
  checkAgain: { body: Api.CheckAgainRequest; response: Api.Run };
  adoptRun: { body: Api.AdoptRunRequest; response: Api.Run };
  compareRuns: { query: Api.CompareRunsRequest; response: Api.RunComparison };
  listAttachments: { response: Api.AttachmentList };
  uploadAttachment: { body: FileForm; response: Api.Attachment };
  getAttachment: { response: FileBytes };
  getLetter: { response: FileBytes };
  listApplicationLetters: { response: Api.LetterList };
  getTimeline: { response: Api.Timeline };
  listReviewers: { response: Api.ReviewerList };
  listQueue: { query: Api.ListQueueRequest; response: Api.Queue };
  listLines: { query: Api.ListLinesRequest; response: Api.LineList };
  listLetters: { query: Api.ListLettersRequest; response: Api.LetterList };
  listCountersigns: { query: Api.ListCountersignsRequest; response: Api.CountersignList };
  decideCountersign: { body: Api.DecideCountersignRequest; response: Api.Countersign };
  getRules: { response: Api.Rules };
  listConductors: { response: Api.ConductorList };
  listDemoAccounts: { response: Api.DemoAccountList };
}

type Part<T, K extends string> = T extends Record<K, infer V> ? V : undefined;

/**
 * By operationId: `params` of the path, `query`, `body` and `response`; undefined where there is none.
 */
export type CaseApiTypes = {
  [K in keyof typeof CASE_OPERATIONS]: {
    params: { [P in PathParameter<(typeof CASE_OPERATIONS)[K]['path']>]: string | number };
    query: Part<Exchanges[K], 'query'>;
    body: Part<Exchanges[K], 'body'>;
    response: Exchanges[K]['response'];
  };
};

/** The same of people, sign-in, rules and the server itself. */
export type AccountApiTypes = {
  [K in keyof typeof ACCOUNT_OPERATIONS]: {
    params: { [P in PathParameter<(typeof ACCOUNT_OPERATIONS)[K]['path']>]: string | number };
    query: Part<AccountExchanges[K], 'query'>;
    body: Part<AccountExchanges[K], 'body'>;
    response: AccountExchanges[K]['response'];
  };
};

/** All operations. */
export type ApiTypes = AccountApiTypes & CaseApiTypes;
