/** Types of what the API takes and gives. Made from the schemas by `npm run generate`; do not edit. */

/** Accepts an application. */
export interface AcceptApplicationRequest {
  /** version that was read; a stale one is refused with 409 (count) */
  version?: number;
  /** the revision that is accepted */
  revision: string;
  /** words */
  reason?: string;
  /** conditions */
  conditions?: string[];
}

/** The invited person takes the account up. */
export interface AcceptInvitationRequest {
  /** token from the mail */
  token: string;
  /** name as shown */
  name: string;
  /** new password, 12 characters or more */
  password: string;
}

/** Makes a run govern. */
export interface AdoptRunRequest {
  /** reason */
  reason: string;
}

/** Opens a new round. */
export interface AmendApplicationRequest {
  /** version that was read; a stale one is refused with 409 (count) */
  version?: number;
  /** reason */
  reason: string;
}

/** Answers a discrepancy. */
export interface AnswerDiscrepancyRequest {
  /** version that was read; a stale one is refused with 409 (count) */
  version?: number;
  /** a change of the draft, or an explanation */
  by: 'change' | 'explanation';
  /** the answer */
  text: string;
  /** only keep the words, do not answer yet */
  draft?: boolean;
}

/** An account that was asked for is granted. */
export interface ApproveInvitationRequest {
  /** organisation */
  organisationId: string;
  /** role */
  role: 'applicant' | 'reviewer' | 'administrator';
}

/** Somebody without an account asks for one. */
export interface AskForAccountRequest {
  /** email address */
  email: string;
  /** name as shown */
  name: string;
  /** organisation, as a name */
  organisation: string;
  /** what it is for */
  message?: string;
}

/** The address of an account whose password is forgotten. */
export interface AskForResetRequest {
  /** email address */
  email: string;
}

/** A reviewer is kept from an organisation’s cases. */
export interface BarReviewerRequest {
  /** organisation */
  organisationId: string;
  /** reason */
  reason: string;
}

/** A new password in place of the present one. */
export interface ChangePasswordRequest {
  /** present password */
  present: string;
  /** new password, 12 characters or more */
  password: string;
}

/** Asks for another check run. */
export type CheckAgainRequest = Record<string, never>;

/** Query of comparing two revisions. */
export interface CompareRevisionsRequest {
  /** the earlier revision */
  from: string;
  /** the later revision */
  to: string;
}

/** Query of comparing two runs. */
export interface CompareRunsRequest {
  /** ordinal of the earlier run */
  from: string;
  /** ordinal of the later run */
  to: string;
}

/** A new application. */
export interface CreateApplicationRequest {
  /** title */
  title: string;
  /** kind of connection */
  connectionKind: 'generation' | 'storage' | 'load' | 'network';
  /** capacity asked for (MW) */
  capacityMw?: number | null;
  /** substation or line to connect at */
  pointOfConnection: string;
  contact: Contact;
}

/** A new applicant organisation. */
export interface CreateOrganisationRequest {
  /** name */
  name: string;
}

/** The second reviewer’s word. */
export interface DecideCountersignRequest {
  /** outcome */
  outcome: 'granted' | 'refused';
  /** words */
  remark?: string;
}

/** Proposes to decline; a second reviewer countersigns. */
export interface DeclineApplicationRequest {
  /** version that was read; a stale one is refused with 409 (count) */
  version?: number;
  /** the revision that is declined */
  revision: string;
  /** reason */
  reason: string;
}

/** Query of deleting a line of the draft. */
export interface DeleteDraftLineRequest {
  /** version that was read */
  version?: string;
}

/** Query of throwing the draft away. */
export interface DiscardBandDraftRequest {
  /** version that was read */
  version: string;
}

/** Query of exporting lines. */
export interface ExportLinesRequest {
  /** format, json by default */
  format?: 'json' | 'csv';
  /** revision; the draft, or the latest revision for the owner, without one */
  revision?: string;
}

/** Files the draft. */
export interface FileApplicationRequest {
  /** version that was read; a stale one is refused with 409 (count) */
  version?: number;
  /** words to go with the revision */
  note?: string;
}

/** A role in an organisation. */
export interface GrantRoleRequest {
  /** role */
  role: 'applicant' | 'reviewer' | 'administrator';
}

/** Hands a case over. */
export interface HandOverApplicationRequest {
  /** version that was read; a stale one is refused with 409 (count) */
  version?: number;
  /** the other reviewer */
  to: string;
  /** reason */
  reason: string;
}

/** An invitation by mail. */
export interface InvitePersonRequest {
  /** email address */
  email: string;
  /** name as shown */
  name: string;
  /** organisation */
  organisationId: string;
  /** role */
  role: 'applicant' | 'reviewer' | 'administrator';
}

/** Query of the list of applications. */
export interface ListApplicationsRequest {
  /** items a page, 1 to 200 */
  limit?: string;
  /** cursor of a page */
  cursor?: string;
  /** order, descending with a minus */
  sort?:
    | 'number'
    | '-number'
    | 'title'
    | '-title'
    | 'applicant'
    | '-applicant'
    | 'state'
    | '-state'
    | 'due'
    | '-due'
    | 'filed'
    | '-filed'
    | 'created'
    | '-created'
    | 'updated'
    | '-updated';
  /** states; several with commas */
  'filter[state]'?: string;
  /** applicant, part of the name */
  'filter[applicant]'?: string;
  /** nominal voltage in kV; several with commas */
  'filter[voltage]'?: string;
  /** worst grade; several with commas */
  'filter[grade]'?: string;
  /** a reviewer’s id, “me” or “nobody” */
  'filter[reviewer]'?: string;
  /** number of the application, in part */
  'filter[number]'?: string;
  /** number, title, applicant or place, in part */
  'filter[search]'?: string;
  /** when it is due */
  'filter[due]'?: 'overdue' | 'today' | 'week';
}

/** Query of the audit trail. */
export interface ListAuditEventsRequest {
  /** items a page, 1 to 200 */
  limit?: string;
  /** cursor of a page */
  cursor?: string;
  /** act, or its beginning */
  'filter[act]'?: string;
  /** who did it */
  'filter[actor]'?: string;
  /** number of the application */
  'filter[application]'?: string;
}

/** Query of the list of countersigns. */
export interface ListCountersignsRequest {
  /** where it stands */
  outcome?: 'pending' | 'granted' | 'refused' | 'lapsed';
}

/** Query of the list of letters. */
export interface ListLettersRequest {
  /** items a page, 1 to 200 */
  limit?: string;
  /** cursor of a page */
  cursor?: string;
  /** order, descending with a minus */
  sort?: 'sent' | '-sent' | 'number' | '-number';
  /** kind */
  'filter[kind]'?: 'receipt' | 'return' | 'decision' | 'notice';
  /** number or title, in part */
  'filter[search]'?: string;
}

/** Query of the list of lines. */
export interface ListLinesRequest {
  /** items a page, 1 to 200 */
  limit?: string;
  /** cursor of a page */
  cursor?: string;
  /** order, descending with a minus */
  sort?:
    | 'name'
    | '-name'
    | 'number'
    | '-number'
    | 'voltage'
    | '-voltage'
    | 'length'
    | '-length'
    | 'grade'
    | '-grade';
  /** name, place or application, in part */
  'filter[search]'?: string;
  /** nominal voltage in kV; several with commas */
  'filter[voltage]'?: string;
  /** worst grade; several with commas */
  'filter[grade]'?: string;
  /** states; several with commas */
  'filter[state]'?: string;
  /** applicant, part of the name */
  'filter[applicant]'?: string;
}

/** Query of the queue. */
export interface ListQueueRequest {
  /** items a page, 1 to 200 */
  limit?: string;
  /** cursor of a page */
  cursor?: string;
  /** order, descending with a minus */
  sort?:
    | 'number'
    | '-number'
    | 'applicant'
    | '-applicant'
    | 'state'
    | '-state'
    | 'voltage'
    | '-voltage'
    | 'lines'
    | '-lines'
    | 'grade'
    | '-grade'
    | 'due'
    | '-due'
    | 'age'
    | '-age'
    | 'reviewer'
    | '-reviewer';
  /** states; several with commas */
  'filter[state]'?: string;
  /** applicant, part of the name */
  'filter[applicant]'?: string;
  /** nominal voltage in kV; several with commas */
  'filter[voltage]'?: string;
  /** worst grade; several with commas */
  'filter[grade]'?: string;
  /** a reviewer’s id, “me” or “nobody” */
  'filter[reviewer]'?: string;
  /** number of the application, in part */
  'filter[number]'?: string;
  /** number, title, applicant or place, in part */
  'filter[search]'?: string;
  /** when it is due */
  'filter[due]'?: 'overdue' | 'today' | 'week';
}

/** The draft comes into force. */
export interface PublishBandsRequest {
  /** version that was read; a stale one is refused with 409 (count) */
  version: number;
  /** reason */
  reason: string;
}

/** Puts a case back into the queue. */
export interface PutBackApplicationRequest {
  /** version that was read; a stale one is refused with 409 (count) */
  version?: number;
  /** reason */
  reason: string;
}

/** Raises a discrepancy. */
export interface RaiseDiscrepancyRequest {
  /** the revision that it is raised on */
  revision: string;
  /** findings it is raised from */
  fingerprints?: string[];
  /** lines it is about */
  lineKeys?: string[];
  /** what it is about */
  title: string;
  /** the value questioned */
  question: string;
  /** what would settle it */
  wanted?: string;
}

/** An account that was asked for is refused, or an invitation taken back. */
export interface RefuseInvitationRequest {
  /** reason */
  reason: string;
}

/** Adds words to the thread. */
export interface RemarkOnDiscrepancyRequest {
  /** words */
  text: string;
}

/** Asks again. */
export interface ReopenDiscrepancyRequest {
  /** version that was read; a stale one is refused with 409 (count) */
  version?: number;
  /** the revision that it is reopened on */
  revision: string;
  /** what is asked now */
  text: string;
}

/** A new password, with the token of the mail. */
export interface ResetPasswordRequest {
  /** token from the mail */
  token: string;
  /** new password, 12 characters or more */
  password: string;
}

/** Returns a case with its open discrepancies. */
export interface ReturnApplicationRequest {
  /** version that was read; a stale one is refused with 409 (count) */
  version?: number;
  /** the revision that it was decided on */
  revision: string;
  /** words to go with the letter */
  message?: string;
}

/** The next rule set as a draft: what is named is replaced, the rest stays. Version 0 for a new draft. */
export interface SaveBandDraftRequest {
  /** version of the draft that was read (count) */
  version: number;
  /** bands */
  bands?: Band[];
  /** tolerances by parameter */
  tolerances?: Record<
    string,
    {
      /** tolerance, a share of the recomputed value (ratio) */
      relative: number;
      /** the most that uncertainty may widen it to (ratio) */
      cap: number;
    }
  >;
  /** uncertainties of the inputs, each in the unit that its name says */
  uncertainties?: Record<string, number>;
  /** what the owner assumes where nothing is filed */
  owner?: {
    /** base of per-unit values (MVA) */
    baseMva: number;
    /** earth resistivity where none is filed (Ω·m) */
    earthResistivityOhmM: number;
  };
  /** windows of the case */
  windows?: {
    /** to take a filed case up, working days (count) */
    'take-up': number;
    /** to review, working days (count) */
    review: number;
    /** to answer a return, working days (count) */
    cure: number;
  };
}

/** Working days from now on; windows that are open keep the days they were given. */
export interface SaveCalendarRequest {
  /** version that was read; a stale one is refused with 409 (count) */
  version: number;
  /** reason */
  reason: string;
  /** time zone by its IANA name */
  timeZone: string;
  /** days of the week on which nobody works */
  weekendDays: number[];
  /** holidays */
  holidays: {
    /** day in the owner’s time zone */
    day: string;
    /** what is kept */
    name: string;
  }[];
}

/** A line of the draft; version 0 for a new one. */
export interface SaveDraftLineRequest {
  /** version that was read; a stale one is refused with 409 (count) */
  version?: number;
  /** the line as in a filing, perhaps incomplete */
  line: Record<string, unknown>;
  /** fields as they were typed, by JSON Pointer within the line */
  asTyped?: Record<
    string,
    {
      /** text as typed */
      text: string;
      /** unit as chosen */
      unit?: string;
    }
  >;
  /** place in the filing (count) */
  ordinal?: number;
}

/** Sets a Note or an Explain aside. */
export interface SetAsideFindingRequest {
  /** the revision that it is set aside on */
  revision: string;
  /** reason */
  reason: string;
}

/** Whether the account may sign in. */
export interface SetPersonStatusRequest {
  /** status */
  status: 'active' | 'disabled';
  /** reason */
  reason: string;
}

/** The first start: the grid owner and its first administrator. */
export interface SetUpRequest {
  /** token printed at the start */
  token: string;
  /** name of the grid owner */
  organisation: string;
  /** name as shown */
  name: string;
  /** email address */
  email: string;
  /** new password, 12 characters or more */
  password: string;
}

/** Settles a discrepancy. */
export interface SettleDiscrepancyRequest {
  /** version that was read; a stale one is refused with 409 (count) */
  version?: number;
  /** the revision that it is settled on */
  revision: string;
  /** words */
  text?: string;
}

/** Email and password. */
export interface SignInRequest {
  /** email address */
  email: string;
  /** password */
  password: string;
}

/** The organisation to act for. */
export interface SwitchOrganisationRequest {
  /** organisation */
  organisationId: string;
}

/** Takes a filed application. */
export interface TakeApplicationRequest {
  /** version that was read; a stale one is refused with 409 (count) */
  version?: number;
}

/** The applicant’s word on a file that was read. */
export interface TakeImportRequest {
  /** all lines, which needs a file without faults, or only the good ones */
  take: 'all' | 'good';
  /** also remove the draft’s other lines */
  replaceAll?: boolean;
}

/** Changes of the head of a draft. */
export interface UpdateApplicationRequest {
  /** version that was read; a stale one is refused with 409 (count) */
  version?: number;
  /** title */
  title?: string;
  /** kind of connection */
  connectionKind?: 'generation' | 'storage' | 'load' | 'network';
  /** capacity asked for (MW) */
  capacityMw?: number | null;
  /** substation or line to connect at */
  pointOfConnection?: string;
  contact?: Contact;
}

/** The code that the authenticator shows. */
export interface VerifyTotpRequest {
  /** six digits */
  code: string;
}

/** Waives a finding. */
export interface WaiveFindingRequest {
  /** the revision that it is waived on */
  revision: string;
  /** reason */
  reason: string;
}

/** Withdraws the open round. */
export interface WithdrawApplicationRequest {
  /** version that was read; a stale one is refused with 409 (count) */
  version?: number;
  /** reason */
  reason?: string;
}

/** Applications, a page. */
export interface ApplicationList {
  /** this page */
  items: ApplicationSummary[];
  /** cursor of the next page */
  nextCursor: string | null;
  /** items of the whole list (count) */
  total: number;
}

/** An application as lists and the queue show it. */
export interface ApplicationSummary {
  /** application */
  id: string;
  /** application number YY-NNNN */
  number: string;
  /** version that was read; a stale one is refused with 409 (count) */
  version: number;
  /** title */
  title: string;
  applicant: Party;
  /** kind of connection */
  connectionKind: 'generation' | 'storage' | 'load' | 'network';
  /** capacity asked for (MW) */
  capacityMw: number | null;
  /** substation or line to connect at */
  pointOfConnection: string;
  /** state of the current round */
  state: 'draft' | 'filed' | 'in-review' | 'returned' | 'accepted' | 'declined' | 'withdrawn';
  /** latest filed revision */
  revision: string | null;
  /** letter that the next filing gets */
  nextRevision: string;
  /** nominal voltages of the lines, highest first */
  voltagesKv: number[];
  /** lines (count) */
  lineCount: number;
  /** length of all lines together (km) */
  totalLengthKm: number;
  /** latest filing (instant, RFC 3339) */
  filedAt: string | null;
  filedBy: Person | null;
  reviewer: Person | null;
  /** when the current window ends (instant, RFC 3339) */
  dueAt: string | null;
  window: Window | null;
  grades: Grades | null;
  /** worst grade that still stands */
  worstGrade: 'must-answer' | 'explain' | 'note' | null;
  check: CheckState | null;
  /** discrepancies not yet settled or waived (count) */
  openDiscrepancies: number;
  /** created (instant, RFC 3339) */
  createdAt: string;
  /** last step (instant, RFC 3339) */
  updatedAt: string;
}

/** An application with all that its page shows. */
export interface Application {
  /** application */
  id: string;
  /** application number YY-NNNN */
  number: string;
  /** version that was read; a stale one is refused with 409 (count) */
  version: number;
  /** title */
  title: string;
  applicant: Party;
  /** kind of connection */
  connectionKind: 'generation' | 'storage' | 'load' | 'network';
  /** capacity asked for (MW) */
  capacityMw: number | null;
  /** substation or line to connect at */
  pointOfConnection: string;
  /** state of the current round */
  state: 'draft' | 'filed' | 'in-review' | 'returned' | 'accepted' | 'declined' | 'withdrawn';
  /** latest filed revision */
  revision: string | null;
  /** letter that the next filing gets */
  nextRevision: string;
  /** nominal voltages of the lines, highest first */
  voltagesKv: number[];
  /** lines (count) */
  lineCount: number;
  /** length of all lines together (km) */
  totalLengthKm: number;
  /** latest filing (instant, RFC 3339) */
  filedAt: string | null;
  filedBy: Person | null;
  reviewer: Person | null;
  /** when the current window ends (instant, RFC 3339) */
  dueAt: string | null;
  window: Window | null;
  grades: Grades | null;
  /** worst grade that still stands */
  worstGrade: 'must-answer' | 'explain' | 'note' | null;
  check: CheckState | null;
  /** discrepancies not yet settled or waived (count) */
  openDiscrepancies: number;
  /** created (instant, RFC 3339) */
  createdAt: string;
  /** last step (instant, RFC 3339) */
  updatedAt: string;
  contact: Contact;
  /** the open or last round */
  round: {
    /** 1 is the first application (count) */
    ordinal: number;
    /** kind of round */
    kind: 'first' | 'amendment';
    /** why it was amended */
    reason: string | null;
  };
  /** the accepted revision that stands */
  acceptedRevision: string | null;
  owner: Party;
  /** steps that the caller’s role has */
  steps: Step[];
  /** all windows, oldest first */
  windows: Window[];
  decision: Decision | null;
  /** proposals that wait for a second reviewer */
  pendingCountersigns: Countersign[];
  /** what the check does not replace */
  caution: string;
}

/** Attachments. */
export interface AttachmentList {
  /** newest first */
  items: Attachment[];
}

/** A file kept with the case. */
export interface Attachment {
  /** attachment */
  id: string;
  /** name of the file */
  fileName: string;
  /** media type */
  mediaType: string;
  /** size: bytes (count) */
  byteLength: number;
  /** SHA-256 */
  sha256: string;
  subject: {
    /** what it belongs to */
    kind: 'application' | 'line' | 'discrepancy';
    /** the line’s key within the application, L1, L2 …; it stays through all revisions */
    lineKey: string | null;
    /** number of the discrepancy (count) */
    discrepancy: number | null;
  };
  uploadedBy: Person;
  /** uploaded (instant, RFC 3339) */
  uploadedAt: string;
  /** address of its bytes */
  href: string;
}

/** The audit trail, newest first. */
export interface AuditEventList {
  /** entries */
  items: AuditEvent[];
  /** cursor of the next page */
  next: string | null;
}

/** An entry of the audit trail. */
export interface AuditEvent {
  /** place in the chain (count) */
  seq: number;
  /** when */
  at: string;
  /** what happened */
  act: string;
  /** who, as the name was */
  actor: string;
  /** role */
  actorRole: string;
  /** application */
  applicationNumber: string | null;
  /** plain data of the act */
  before: unknown;
  /** plain data of the act */
  after: unknown;
  /** hash of the entry */
  hash: string;
}

/** The next rule set as it stands; version 0 while it is the one in force and nothing was saved. */
export interface BandDraft {
  /** version of the draft (count) */
  version: number;
  /** number that it will have (count) */
  ruleSetVersion: number;
  /** bands */
  bands: Band[];
  /** tolerances by parameter */
  tolerances: Record<
    string,
    {
      /** tolerance, a share of the recomputed value (ratio) */
      relative: number;
      /** the most that uncertainty may widen it to (ratio) */
      cap: number;
    }
  >;
  /** uncertainties of the inputs, each in the unit that its name says */
  uncertainties: Record<string, number>;
  /** what the owner assumes where nothing is filed */
  owner: {
    /** base of per-unit values (MVA) */
    baseMva: number;
    /** earth resistivity where none is filed (Ω·m) */
    earthResistivityOhmM: number;
  };
  /** windows of the case */
  windows: {
    /** to take a filed case up, working days (count) */
    'take-up': number;
    /** to review, working days (count) */
    review: number;
    /** to answer a return, working days (count) */
    cure: number;
  };
}

/** The two nested ranges of one parameter in one voltage class. */
export interface Band {
  /** voltage class (kV) */
  classKv: number;
  /** frequency (Hz) */
  frequencyHz: 50 | 60;
  /** parameter */
  parameter:
    | 'r1'
    | 'x1'
    | 'b1'
    | 'r0MinusR1'
    | 'x0'
    | 'b0'
    | 'x1OverR1'
    | 'x0OverX1'
    | 'r0OverR1'
    | 'b0OverB1'
    | 'surgeImpedanceOhm'
    | 'waveSpeed';
  /** typical range */
  typical: [number, number];
  /** outer range */
  outer: [number, number];
  /** source of the bounds */
  source: string;
  bounds?: {
    /** source of the lower typical bound */
    typicalLow: string;
    /** source of the upper typical bound */
    typicalHigh: string;
    /** source of the outer bounds */
    outer: string;
  };
}

/** The owner’s working days. */
export interface Calendar {
  /** version (count) */
  version: number;
  /** time zone by its IANA name */
  timeZone: string;
  /** days of the week on which nobody works */
  weekendDays: number[];
  /** holidays */
  holidays: {
    /** day in the owner’s time zone */
    day: string;
    /** what is kept */
    name: string;
  }[];
}

/** A slip that explains findings. */
export interface Cause {
  /** cause code */
  code: string;
  /** where the slip lies */
  in: 'declared' | 'geometry';
  /** parameters that it brings back */
  explains: string[];
  /** values that they get, Ω/km or µS/km; for a slip in the geometry the corrected entries, named from where, in the unit of their field */
  corrected: Record<string, number>;
  /** JSON Pointer of the slip in the geometry */
  where?: string;
  /** largest remaining difference (ratio, unbounded above) */
  residual: number;
  /** fitted without geometry */
  possible?: boolean;
  /** the cause as a sentence */
  sentence: string;
}

/** Where the check run stands. */
export interface CheckState {
  /** ordinal of the run within its revision (count) */
  run: number;
  /** state of the run */
  state: 'queued' | 'running' | 'done' | 'failed';
  /** lines to check (count) */
  lineCount: number;
  /** lines checked so far (count) */
  linesChecked: number;
  /** started (instant, RFC 3339) */
  startedAt: string | null;
  /** finished (instant, RFC 3339) */
  finishedAt: string | null;
  /** why it failed, as a sentence */
  failure: string | null;
}

/** The conductor library. */
export interface ConductorList {
  /** version of the library */
  version: string;
  /** by name */
  items: Conductor[];
}

/** A conductor of the library. */
export interface Conductor {
  /** name */
  name: string;
  /** the library’s row, with its units in the names of its fields */
  row: Record<string, unknown>;
  /** has what a filing needs of it */
  choosable: boolean;
  /** may not be chosen any more */
  retired: boolean;
}

/** Whom to ask about an application. */
export interface Contact {
  /** name */
  name: string;
  /** address for mail */
  email: string;
  /** telephone number */
  phone: string | null;
}

/** Countersigns. */
export interface CountersignList {
  /** newest first */
  items: Countersign[];
}

/** A step that a second reviewer must agree to. */
export interface Countersign {
  /** countersign */
  id: string;
  /** application */
  applicationId: string;
  /** application number YY-NNNN */
  number: string;
  /** what is proposed */
  subject: 'waive' | 'decline';
  /** revision letter */
  revision: string;
  /** what makes a finding the same from revision to revision: code, circuit and figures, hashed */
  fingerprint: string | null;
  /** the finding’s sentence */
  finding: string | null;
  /** reason */
  reason: string;
  proposedBy: Person;
  /** proposed (instant, RFC 3339) */
  proposedAt: string;
  /** where it stands */
  outcome: 'pending' | 'granted' | 'refused' | 'lapsed';
  decidedBy: Person | null;
  /** decided (instant, RFC 3339) */
  decidedAt: string | null;
  /** the second reviewer’s words */
  remark: string | null;
}

/** A decision. */
export interface Decision {
  /** decision */
  kind: 'accepted' | 'declined';
  /** decided on */
  revision: string;
  /** reason */
  reason: string | null;
  /** conditions */
  conditions: string[];
  /** decided (instant, RFC 3339) */
  decidedAt: string;
  decidedBy: Person;
  countersignedBy: Person | null;
  /** SHA-256 of the record */
  recordHash: string;
}

/** Accounts of the demo scenario. */
export interface DemoAccountList {
  /** accounts */
  items: DemoAccount[];
}

/** An account of the demo. */
export interface DemoAccount {
  /** address to sign in with */
  email: string;
  /** password */
  password: string;
  /** name */
  name: string;
  /** role */
  role: 'applicant' | 'reviewer' | 'administrator';
  /** organisations */
  organisation: string;
}

/** An entry of a discrepancy’s thread. */
export interface DiscrepancyEntry {
  /** entry */
  id: string;
  /** what it is */
  kind: 'raised' | 'answered' | 'commented' | 'settled' | 'reopened' | 'waived';
  /** made on */
  revision: string;
  by: Person;
  party: Party;
  /** when (instant, RFC 3339) */
  at: string;
  /** words */
  text: string;
}

/** Discrepancies of an application. */
export interface DiscrepancyList {
  /** by number */
  items: Discrepancy[];
}

/** What a reviewer raised and an applicant answers. */
export interface Discrepancy {
  /** discrepancy */
  id: string;
  /** D-number within the application (count) */
  number: number;
  /** state */
  state: 'open' | 'answered' | 'settled' | 'waived';
  /** version that was read; a stale one is refused with 409 (count) */
  version: number;
  /** what it is about */
  title: string;
  /** worst grade of its findings */
  grade: 'must-answer' | 'explain' | 'note';
  /** the value questioned */
  question: string;
  /** what would settle it */
  wanted: string | null;
  /** revision letter */
  raisedOn: string;
  /** raised (instant, RFC 3339) */
  raisedAt: string;
  raisedBy: Person;
  /** lines it is about */
  lineKeys: string[];
  /** findings it was raised from, as the current revision has them */
  findings: Finding[];
  /** how it was answered */
  answeredBy: 'change' | 'explanation' | null;
  /** answer not yet sent */
  draftAnswer: string | null;
  /** thread, oldest first */
  entries: DiscrepancyEntry[];
  /** files */
  attachments: Attachment[];
}

/** What a reviewer did with a finding. */
export interface Disposition {
  /** what was done with it */
  kind: 'settled' | 'waived' | 'set-aside';
  /** false while a countersign is waited for */
  inForce: boolean;
  /** made on */
  revision: string;
  /** reason */
  reason: string;
  by: Person;
  /** made (instant, RFC 3339) */
  at: string;
  countersignedBy: Person | null;
  /** made on an older revision and carried over */
  carriedOver: boolean;
}

/** It is done; there is nothing more to say. */
export interface Done {
  /** always true */
  done: true;
}

/** A line of the draft. */
export interface DraftLine {
  /** the line’s key within the application, L1, L2 …; it stays through all revisions */
  lineKey: string;
  /** place in the filing (count) */
  ordinal: number;
  /** version that was read; a stale one is refused with 409 (count) */
  version: number;
  /** the line as in a filing, perhaps incomplete */
  line: Record<string, unknown>;
  /** fields as they were typed, by JSON Pointer within the line */
  asTyped: Record<
    string,
    {
      /** text as typed */
      text: string;
      /** unit as chosen */
      unit?: string;
    }
  >;
  /** name */
  name: string | null;
  /** nominal voltage (kV) */
  nominalVoltageKv: number | null;
  /** length (km) */
  lengthKm: number | null;
  /** circuits (count) */
  circuitCount: number;
  /** complete by schema, and its geometry can be computed */
  complete: boolean;
  /** what is missing or wrong; pointers within the line */
  faults: Fault[];
  /** saved (instant, RFC 3339) */
  updatedAt: string;
}

/** The draft of the next revision. */
export interface Draft {
  /** application */
  applicationId: string;
  /** version that was read; a stale one is refused with 409 (count) */
  version: number;
  /** the line’s key within the application, L1, L2 …; it stays through all revisions */
  nextLineKey: string;
  /** lines in filing order */
  lines: DraftLine[];
  /** may be filed as it stands */
  ready: boolean;
  /** what stands in the way of filing; pointers within the filing */
  faults: Fault[];
}

/** One fault of what was sent. */
export interface Fault {
  /** JSON Pointer of the value; empty for the whole */
  pointer?: string;
  /** row of the file, the header is 1 (count) */
  row?: number;
  /** column of the file; empty for the whole row */
  column?: string;
  /** the line’s key within the application, L1, L2 …; it stays through all revisions */
  lineKey?: string;
  /** what is there, unbounded (as found) */
  value: unknown;
  /** what is wanted */
  expected: string;
  /** the fault as a sentence */
  message: string;
}

/** What the check noticed, and what became of it. */
export interface Finding {
  /** what makes a finding the same from revision to revision: code, circuit and figures, hashed */
  fingerprint: string;
  /** finding code */
  code: string;
  /** family */
  family: 'physics' | 'geometry' | 'typical' | 'drawing';
  /** grade */
  grade: 'must-answer' | 'explain' | 'note';
  /** the line’s key within the application, L1, L2 …; it stays through all revisions */
  lineKey: string;
  /** circuit (count) */
  circuit: number | null;
  /** section, from 1 (count) */
  section: number | null;
  /** position, from 1 (count) */
  position: number | null;
  /** parameter */
  parameter: string | null;
  /** declared (Ω/km, µS/km, Ω or ratio, unbounded) */
  declared: number | null;
  /** recomputed (Ω/km, µS/km, Ω or ratio, unbounded) */
  recomputed: number | null;
  /** difference (ratio, unbounded) */
  deviation: number | null;
  /** tolerance (ratio, unbounded above) */
  tolerance: number | null;
  /** JSON Pointer within the filing */
  where: string | null;
  /** as a sentence */
  message: string;
  /** findings of one matter share it (count) */
  group: number | null;
  /** best first */
  causes: Cause[];
  /** carries its group’s cause */
  first: boolean;
  /** parameter that it follows from; then it is not counted again */
  follows: string | null;
  /** what the tolerance in use comes from */
  toleranceOf: {
    /** the administrator’s tolerance (ratio, unbounded above) */
    administrator: number;
    /** what the inputs’ uncertainty explains (ratio, unbounded above) */
    inputs: number;
    /** the input that dominates it */
    dominantInput: string;
    /** half a unit of the last digit declared (ratio, unbounded above) */
    rounding: number;
  } | null;
  /** not settled, waived or set aside */
  stands: boolean;
  disposition: Disposition | null;
  /** number of the discrepancy raised from it (count) */
  discrepancy: number | null;
}

/** Findings that still stand, by grade. */
export interface Grades {
  /** findings of grade must-answer that still stand (count) */
  mustAnswer: number;
  /** findings of grade explain that still stand (count) */
  explain: number;
  /** notes that still stand (count) */
  note: number;
}

/** Whether the server can work. */
export interface Health {
  /** status */
  status: 'live' | 'ready';
}

/** A file read for the draft. */
export interface Import {
  /** import */
  id: string;
  /** application */
  applicationId: string;
  /** staged: read and waiting for the applicant’s word; imported: in the draft; refused: nothing in it can be used */
  state: 'staged' | 'imported' | 'refused';
  /** name of the file */
  fileName: string;
  /** SHA-256 of the file */
  sha256: string;
  /** format */
  format: 'json' | 'csv';
  /** how the file is written, as found */
  dialect: {
    /** delimiter */
    delimiter: 'comma' | 'semicolon' | 'tab';
    /** decimal sign */
    decimal: 'point' | 'comma';
    /** encoding */
    encoding: 'utf-8' | 'windows-1252';
    /** line ends */
    lineEnds: 'crlf' | 'lf' | 'cr' | 'mixed';
  } | null;
  /** rows without the header (count) */
  rowCount: number;
  /** lines that can be taken */
  lines: {
    /** name */
    name: string;
    /** the line’s key within the application, L1, L2 …; it stays through all revisions */
    lineKey: string | null;
    /** length (km) */
    lengthKm: number | null;
    /** nominal voltage (kV) */
    nominalVoltageKv: number | null;
    /** circuits (count) */
    circuitCount: number;
    /** a line of this name is in the draft and would be replaced */
    replaces: boolean;
  }[];
  /** every fault */
  faults: Fault[];
  /** what was assumed */
  notices: Notice[];
  /** read (instant, RFC 3339) */
  createdAt: string;
  /** imported (instant, RFC 3339) */
  importedAt: string | null;
}

/** Invitations, newest first. */
export interface InvitationList {
  /** invitations */
  items: Invitation[];
}

/** An invitation, or an account that was asked for. */
export interface Invitation {
  /** invitation */
  id: string;
  /** email address */
  email: string;
  /** name */
  name: string;
  /** organisation invited to */
  organisation: {
    /** organisation */
    id: string;
    /** name */
    name: string;
  } | null;
  /** organisation as it was asked for */
  askedOrganisation: string | null;
  /** what it is for */
  message: string | null;
  /** role */
  role: 'applicant' | 'reviewer' | 'administrator';
  /** status */
  status: 'asked' | 'sent' | 'accepted' | 'refused' | 'revoked';
  /** made */
  createdAt: string;
  /** expires */
  expiresAt: string | null;
}

/** Letters, a page. */
export interface LetterList {
  /** newest first */
  items: Letter[];
  /** cursor of the next page */
  nextCursor: string | null;
  /** letters (count) */
  total: number;
}

/** A letter as it was sent. */
export interface Letter {
  /** number within the application (count) */
  number: number;
  /** application */
  applicationId: string;
  /** application number YY-NNNN */
  applicationNumber: string;
  /** title */
  applicationTitle: string;
  /** kind */
  kind: 'receipt' | 'return' | 'decision' | 'notice';
  /** what it says in a line */
  subject: string;
  /** revision letter */
  revision: string;
  /** SHA-256 of the PDF */
  sha256: string;
  /** size: bytes (count) */
  byteLength: number;
  /** sent (instant, RFC 3339) */
  sentAt: string;
  sentBy: Person;
  /** answers due (instant, RFC 3339) */
  dueAt: string | null;
  /** discrepancies in it */
  discrepancies: number[];
  /** address of the PDF */
  href: string;
}

/** Lines of the latest revisions, a page. */
export interface LineList {
  /** this page */
  items: {
    /** the line’s key within the application, L1, L2 …; it stays through all revisions */
    lineKey: string;
    /** place in the filing (count) */
    ordinal: number;
    /** name */
    name: string;
    /** from */
    from: string;
    /** to */
    to: string;
    /** nominal voltage (kV) */
    nominalVoltageKv: number;
    /** frequency (Hz) */
    frequencyHz: number;
    /** length (km) */
    lengthKm: number;
    /** circuits (count) */
    circuitCount: number;
    /** sections (count) */
    sectionCount: number;
    /** phase conductors in words */
    conductors: string;
    /** application */
    applicationId: string;
    /** application number YY-NNNN */
    applicationNumber: string;
    /** title */
    applicationTitle: string;
    applicant: Party;
    /** state of the application */
    state: 'draft' | 'filed' | 'in-review' | 'returned' | 'accepted' | 'declined' | 'withdrawn';
    /** revision letter */
    revision: string;
    grades: Grades | null;
    /** worst grade that still stands */
    worstGrade: 'must-answer' | 'explain' | 'note' | null;
  }[];
  /** cursor of the next page */
  nextCursor: string | null;
  /** lines (count) */
  total: number;
}

/** A line of a revision, as lists show it. */
export interface LineSummary {
  /** the line’s key within the application, L1, L2 …; it stays through all revisions */
  lineKey: string;
  /** place in the filing (count) */
  ordinal: number;
  /** name */
  name: string;
  /** from */
  from: string;
  /** to */
  to: string;
  /** nominal voltage (kV) */
  nominalVoltageKv: number;
  /** frequency (Hz) */
  frequencyHz: number;
  /** length (km) */
  lengthKm: number;
  /** circuits (count) */
  circuitCount: number;
  /** sections (count) */
  sectionCount: number;
  /** phase conductors in words */
  conductors: string;
  grades: Grades | null;
  /** worst grade that still stands */
  worstGrade: 'must-answer' | 'explain' | 'note' | null;
  /** one a matter, worst first */
  marks: {
    /** parameter */
    parameter: string | null;
    /** finding code */
    code: string;
    /** grade */
    grade: 'must-answer' | 'explain' | 'note';
    /** still stands */
    stands: boolean;
    /** short words, as “X1” or “X0 settled” */
    words: string;
  }[];
  /** against the revision before */
  change: 'first' | 'new' | 'changed' | 'same';
}

/** Mails of the demo, newest first. */
export interface MailRoom {
  /** mails */
  items: ReceivedMail[];
}

/** A role in an organisation. */
export interface Membership {
  /** organisation */
  organisationId: string;
  /** its name */
  organisationName: string;
  /** role */
  role: 'applicant' | 'reviewer' | 'administrator';
}

/** The password was right; one more step is needed. */
export interface NextStep {
  /** the step */
  next: 'totp' | 'totp-enrolment';
}

/** Something that was assumed or done and is worth knowing. */
export interface Notice {
  /** JSON Pointer */
  pointer?: string;
  /** row of the file (count) */
  row?: number;
  /** as a sentence */
  message: string;
}

/** All organisations. */
export interface OrganisationList {
  /** organisations */
  items: Organisation[];
}

/** An organisation. */
export interface Organisation {
  /** organisation */
  id: string;
  /** name */
  name: string;
  /** kind */
  kind: 'owner' | 'applicant';
  /** members (count) */
  members: number;
  /** applications (count) */
  applications: number;
}

/** One parameter weighed: declared, recomputed, typical. */
export interface ParameterValue {
  /** circuit (count) */
  circuit: number;
  /** parameter */
  parameter: string;
  /** declared (Ω/km, µS/km, Ω or ratio, unbounded) */
  declared: number | null;
  /** as written, with its unit */
  asDeclared: string | null;
  /** recomputed (Ω/km, µS/km, Ω or ratio, unbounded) */
  recomputed: number | null;
  /** lower end of its range (Ω/km, µS/km, Ω or ratio, unbounded) */
  low: number | null;
  /** upper end of its range (Ω/km, µS/km, Ω or ratio, unbounded) */
  high: number | null;
  /** declared less recomputed, by recomputed (ratio, unbounded) */
  deviation: number | null;
  /** tolerance in use (ratio, unbounded above) */
  tolerance: number | null;
  /** typical range of the class */
  typical: [number, number] | null;
  /** outer range of the class */
  outer: [number, number] | null;
  /** source of the band */
  source: string | null;
  /** worst grade that the check gave it */
  grade: 'must-answer' | 'explain' | 'note' | null;
  /** parameter that it follows from */
  follows: string | null;
}

/** An organisation. */
export interface Party {
  /** organisation */
  id: string;
  /** name */
  name: string;
}

/** A person with all roles. */
export interface PeopleEntry {
  /** user */
  id: string;
  /** name as shown */
  name: string;
  /** email address */
  email: string;
  /** status */
  status: 'active' | 'disabled';
  /** whether a second factor is in place */
  hasSecondFactor: boolean;
  /** last sign-in */
  lastSignInAt: string | null;
  /** roles */
  memberships: Membership[];
  /** organisations kept from */
  bars: {
    /** organisation */
    organisationId: string;
    /** its name */
    organisationName: string;
    /** reason */
    reason: string;
  }[];
}

/** Everybody with an account. */
export interface PeopleList {
  /** people */
  items: PeopleEntry[];
}

/** Somebody, as others see them. */
export interface Person {
  /** user */
  id: string;
  /** name as shown */
  name: string;
}

/** Open applications with their due dates, a page. */
export interface Queue {
  /** this page */
  items: ApplicationSummary[];
  /** cursor of the next page */
  nextCursor: string | null;
  /** applications that fit the filters (count) */
  total: number;
  /** counts over all open applications, whatever the filters */
  counts: {
    /** open applications of the caller (count) */
    mine: number;
    /** open applications (count) */
    everyone: number;
    /** open applications without a reviewer (count) */
    nobody: number;
    /** open applications past their due date (count) */
    overdue: number;
  };
}

/** A mail that the demo’s own mail server took in. */
export interface ReceivedMail {
  /** mail */
  id: string;
  /** sender */
  from: string;
  /** recipient */
  to: string;
  /** subject */
  subject: string;
  /** text */
  body: string;
  /** attachments */
  attachments: {
    /** file name */
    name: string;
    /** size (bytes) (count) */
    byteLength: number;
  }[];
  /** received */
  receivedAt: string;
}

/** Reviewers. */
export interface ReviewerList {
  /** reviewers who may take this application */
  items: {
    /** user */
    id: string;
    /** name */
    name: string;
    /** cases in hand (count) */
    openCases: number;
  }[];
}

/** Two revisions compared. */
export interface RevisionComparison {
  /** revision letter */
  from: string;
  /** revision letter */
  to: string;
  /** lines of either */
  lines: {
    /** the line’s key within the application, L1, L2 …; it stays through all revisions */
    lineKey: string;
    /** name */
    name: string;
    /** change */
    change: 'new' | 'changed' | 'same' | 'removed';
    /** fields that differ */
    changes: {
      /** JSON Pointer within the line */
      pointer: string;
      /** value before, unbounded (in the unit of its field) */
      before: unknown;
      /** value after, unbounded (in the unit of its field) */
      after: unknown;
    }[];
    /** more fields differ than are listed */
    limitReached: boolean;
  }[];
}

/** A line of a revision with its balance rows, findings and geometry. */
export interface RevisionLine {
  /** the line’s key within the application, L1, L2 …; it stays through all revisions */
  lineKey: string;
  /** place in the filing (count) */
  ordinal: number;
  /** name */
  name: string;
  /** from */
  from: string;
  /** to */
  to: string;
  /** nominal voltage (kV) */
  nominalVoltageKv: number;
  /** frequency (Hz) */
  frequencyHz: number;
  /** length (km) */
  lengthKm: number;
  /** circuits (count) */
  circuitCount: number;
  /** sections (count) */
  sectionCount: number;
  /** phase conductors in words */
  conductors: string;
  /** revision letter */
  revision: string;
  /** against the revision before */
  change: 'first' | 'new' | 'changed' | 'same';
  /** the line as filed, conductor data copied in */
  line: Record<string, unknown>;
  /** SHA-256 of the line */
  lineHash: string;
  run: Run | null;
  /** voltage class it was weighed against (kV) */
  bandClassKv: number | null;
  /** balance rows */
  values: ParameterValue[];
  /** a circuit each */
  equivalents: {
    /** circuit (count) */
    circuit: number;
    /** series resistance (Ω, unbounded) */
    r: number;
    /** series reactance (Ω, unbounded) */
    x: number;
    /** shunt susceptance (µS, unbounded) */
    b: number;
    /** zero-sequence resistance (Ω, unbounded) */
    r0: number;
    /** zero-sequence reactance (Ω, unbounded) */
    x0: number;
    /** zero-sequence susceptance (µS, unbounded) */
    b0: number;
  }[];
  /** zero-sequence mutuals */
  mutual: {
    /** the pair */
    circuits: [number, number];
    /** mutual resistance (Ω/km, unbounded) */
    r0m: number;
    /** mutual reactance (Ω/km, unbounded) */
    x0m: number;
    /** mutual susceptance (µS/km, unbounded) */
    b0m: number;
  }[];
  /** what the declared X1 and B1 would need */
  impliedGeometry: {
    /** circuit (count) */
    circuit: number;
    /** mean phase spacing that X1 and B1 need (m, unbounded above) */
    meanSpacingM: number | null;
    /** conductor GMR that they need (mm, unbounded above) */
    gmrMm: number | null;
    /** in words */
    sentence: string;
  }[];
  /** findings of this line */
  findings: Finding[];
  /** values of the revision before */
  previous:
    | {
        /** circuit (count) */
        circuit: number;
        /** parameter */
        parameter: string;
        /** declared (Ω/km or µS/km, unbounded) */
        declared: number | null;
        /** recomputed (Ω/km or µS/km, unbounded) */
        recomputed: number | null;
      }[]
    | null;
}

/** Revisions. */
export interface RevisionList {
  /** newest first */
  items: RevisionSummary[];
}

/** A revision. */
export interface RevisionSummary {
  /** revision letter */
  letter: string;
  /** 1 is A (count) */
  ordinal: number;
  /** round (count) */
  round: number;
  /** filed (instant, RFC 3339) */
  filedAt: string;
  filedBy: Person;
  /** SHA-256 of the canonical filing */
  contentHash: string;
  /** lines (count) */
  lineCount: number;
  /** length together (km) */
  totalLengthKm: number;
  /** what changed, in words */
  change: string;
  /** the applicant’s words with it */
  note: string | null;
  /** the latest */
  current: boolean;
}

/** A revision with its lines, its check and what became of each finding. */
export interface Revision {
  /** revision letter */
  letter: string;
  /** 1 is A (count) */
  ordinal: number;
  /** round (count) */
  round: number;
  /** filed (instant, RFC 3339) */
  filedAt: string;
  filedBy: Person;
  /** SHA-256 of the canonical filing */
  contentHash: string;
  /** what changed, in words */
  change: string;
  /** the applicant’s words with it */
  note: string | null;
  /** the latest */
  current: boolean;
  /** lines in filing order */
  lines: LineSummary[];
  /** lines of the revision before that are gone */
  removed: string[];
  /** check runs, newest first */
  runs: Run[];
  run: Run | null;
  /** findings of the governing run, worst first */
  findings: Finding[];
  /** what the check does not replace */
  caution: string;
}

/** All rule sets, newest first. */
export interface RuleSetList {
  /** rule sets */
  items: RuleSetSummary[];
}

/** A rule set in the list of versions. */
export interface RuleSetSummary {
  /** number of the rule set (count) */
  version: number;
  /** status */
  status: 'draft' | 'published';
  /** in force from */
  effectiveFrom: string | null;
  /** reason */
  reason: string;
  /** who published it */
  publishedBy: Person | null;
  /** whether it is the one in force */
  inForce: boolean;
}

/** The rules in force, for the live check. */
export interface Rules {
  /** version of the bands */
  bandsVersion: string;
  /** version of the tolerances */
  tolerancesVersion: string;
  /** bands */
  bands: {
    /** voltage class (kV) */
    classKv: number;
    /** frequency (Hz) */
    frequencyHz: number;
    /** parameter */
    parameter: string;
    /** typical range */
    typical: [number, number];
    /** outer range */
    outer: [number, number];
    /** source of the band */
    source: string;
  }[];
  /** tolerances by parameter */
  tolerances: Record<string, unknown>;
  /** uncertainties of the inputs */
  uncertainties: Record<string, unknown>;
  /** what the owner assumes where nothing is filed */
  owner: {
    /** base (MVA) */
    baseMva: number;
    /** earth resistivity (Ω·m) */
    earthResistivityOhmM: number;
  };
}

/** Two check runs of a revision compared. */
export interface RunComparison {
  /** revision letter */
  revision: string;
  from: Run;
  to: Run;
  /** only in the later */
  appeared: Finding[];
  /** only in the earlier */
  gone: Finding[];
  /** in both (count) */
  kept: number;
}

/** Check runs. */
export interface RunList {
  /** newest first */
  items: Run[];
}

/** A check run of a revision. */
export interface Run {
  /** ordinal within the revision (count) */
  ordinal: number;
  /** state */
  state: 'queued' | 'running' | 'done' | 'failed';
  /** its findings govern */
  governing: boolean;
  /** engine version */
  engine: string | null;
  /** rule set version */
  ruleSet: string | null;
  /** why it was made */
  reason: 'filing' | 'again';
  requestedBy: Person | null;
  /** asked for (instant, RFC 3339) */
  createdAt: string;
  /** finished (instant, RFC 3339) */
  finishedAt: string | null;
  /** lines (count) */
  lineCount: number;
  /** lines checked so far (count) */
  linesChecked: number;
  grades: Grades | null;
  /** why it failed */
  failure: string | null;
}

/** Who is signed in, and what may be shown before anybody is. */
export interface Session {
  /** who is signed in */
  user: {
    /** user */
    id: string;
    /** name as shown */
    name: string;
    /** email address */
    email: string;
  } | null;
  /** role in the active organisation */
  role: 'applicant' | 'reviewer' | 'administrator' | null;
  /** active organisation */
  organisation: {
    /** organisation */
    id: string;
    /** name */
    name: string;
    /** kind */
    kind: 'owner' | 'applicant';
  } | null;
  /** organisations to act for */
  memberships: Membership[];
  /** organisations whose cases are not this reviewer’s to see */
  barredOrganisationIds: string[];
  /** to be sent back as X-CSRF-Token */
  csrfToken: string | null;
  /** what is still to come */
  next: 'totp' | 'totp-enrolment' | null;
  /** the grid owner */
  gridOwner: {
    /** name */
    name: string;
  } | null;
  /** whether this is the demo */
  demo: boolean;
  /** whether the first start is still to be completed */
  setUpNeeded: boolean;
}

/** A step and, when it is closed, what opens it. */
export interface Step {
  /** step of the case */
  step:
    | 'file'
    | 'take'
    | 'hand-over'
    | 'put-back'
    | 'return'
    | 'raise'
    | 'settle'
    | 'waive'
    | 'accept'
    | 'decline'
    | 'withdraw'
    | 'amend';
  /** may be taken now by who asks */
  open: boolean;
  /** what opens it, as a sentence */
  reason: string | null;
}

/** One thing that happened. */
export interface TimelineEvent {
  /** place in the trail (count) */
  seq: number;
  /** when (instant, RFC 3339) */
  at: string;
  /** act */
  act: string;
  actor: Person | null;
  party: Party | null;
  /** what happened, as a sentence */
  sentence: string;
  /** revision letter */
  revision: string | null;
  /** hash of the entry */
  hash: string;
}

/** What happened to an application. */
export interface Timeline {
  /** oldest first */
  items: TimelineEvent[];
  /** more happened than is listed */
  limitReached: boolean;
}

/** A new second factor, to be confirmed with a code. */
export interface TotpEnrolment {
  /** secret in base 32 */
  secret: string;
  /** address for an authenticator */
  uri: string;
}

/** The working days that a step may take. */
export interface Window {
  /** which window */
  kind: 'take-up' | 'review' | 'cure';
  /** opened (instant, RFC 3339) */
  openedAt: string;
  /** due (instant, RFC 3339) */
  dueAt: string;
  /** closed (instant, RFC 3339) */
  closedAt: string | null;
  /** working days used (working days) */
  used: number;
  /** working days granted: working days (count) */
  total: number;
  /** working days left, negative when overdue (working days) */
  left: number;
}

/** One row of the lines’ CSV file, by column. A row is a section; the rows of one name stand together; declared values stand on the first of them. Cells are texts: numbers are read by the rules of the filing format. */
export interface LinesCsvRow {
  /** Name of the line, the same on all its rows. Text. On the line’s first row. */
  name: string;
  /** Where the line begins. Text. On the line’s first row. */
  from: string;
  /** Where the line ends. Text. On the line’s first row. */
  to: string;
  /** Nominal phase-to-phase voltage, kV. Number, with the file’s decimal sign. On the line’s first row. */
  nominal_voltage_kv: string;
  /** Rated frequency, 50 or 60, Hz. Number, with the file’s decimal sign. On the line’s first row. */
  frequency_hz: string;
  /** True or false; true when empty. true or false. On the line’s first row. */
  transposed?: string;
  /** Number of the section within the line, 1 to k; may be empty when there is one. Number, with the file’s decimal sign. */
  section?: string;
  /** Overhead or cable; overhead when empty. One of a list. */
  kind?: string;
  /** Length of the section, km. Number, with the file’s decimal sign. */
  length_km: string;
  /** Resistivity of the earth, ohm metre; the owner’s when empty. Number, with the file’s decimal sign. */
  earth_resistivity_ohm_m?: string;
  /** Continuous or segmented; continuous when empty. One of a list. */
  ground_wire_bonding?: string;
  /** Phase conductor: name in the library, or its name when its data are given. Text. */
  conductor?: string;
  /** Phase conductor: model: handbook or tube; found from the data when empty. One of a list. */
  conductor_model?: string;
  /** Phase conductor: outer diameter, mm. Number, with the file’s decimal sign. */
  conductor_diameter_mm?: string;
  /** Phase conductor: diameter of the core that carries no current, mm. Number, with the file’s decimal sign. */
  conductor_core_diameter_mm?: string;
  /** Phase conductor: geometric mean radius, mm. Number, with the file’s decimal sign. */
  conductor_gmr_mm?: string;
  /** Phase conductor: a.c. resistance at its temperature, ohm/km. Number, with the file’s decimal sign. */
  conductor_ac_resistance_ohm_per_km?: string;
  /** Phase conductor: d.c. resistance at 20 °C, ohm/km. Number, with the file’s decimal sign. */
  conductor_dc_resistance_20_ohm_per_km?: string;
  /** Phase conductor: temperature, °C. Number, with the file’s decimal sign. */
  conductor_temperature_c?: string;
  /** Phase conductor: temperature coefficient at 20 °C, 1/K. Number, with the file’s decimal sign. */
  conductor_temperature_coefficient_per_k?: string;
  /** Ground wire: name in the library, or its name when its data are given. Text. */
  ground_conductor?: string;
  /** Ground wire: model: handbook or tube; found from the data when empty. One of a list. */
  ground_conductor_model?: string;
  /** Ground wire: outer diameter, mm. Number, with the file’s decimal sign. */
  ground_conductor_diameter_mm?: string;
  /** Ground wire: diameter of the core that carries no current, mm. Number, with the file’s decimal sign. */
  ground_conductor_core_diameter_mm?: string;
  /** Ground wire: geometric mean radius, mm. Number, with the file’s decimal sign. */
  ground_conductor_gmr_mm?: string;
  /** Ground wire: a.c. resistance at its temperature, ohm/km. Number, with the file’s decimal sign. */
  ground_conductor_ac_resistance_ohm_per_km?: string;
  /** Ground wire: d.c. resistance at 20 °C, ohm/km. Number, with the file’s decimal sign. */
  ground_conductor_dc_resistance_20_ohm_per_km?: string;
  /** Ground wire: temperature, °C. Number, with the file’s decimal sign. */
  ground_conductor_temperature_c?: string;
  /** Ground wire: temperature coefficient at 20 °C, 1/K. Number, with the file’s decimal sign. */
  ground_conductor_temperature_coefficient_per_k?: string;
  /** Subconductors of each phase, 1 to 8; 1 when empty. Number, with the file’s decimal sign. */
  bundle_count?: string;
  /** Side of the bundle’s polygon, m. Number, with the file’s decimal sign. */
  bundle_spacing_m?: string;
  /** Sag of the phases at mid-span where a phase has none of its own, m. Number, with the file’s decimal sign. */
  sag_m?: string;
  /** Sag of the ground wires at mid-span where a wire has none of its own, m. Number, with the file’s decimal sign. */
  gw_sag_m?: string;
  /** Circuit 1, phase a: offset from the centre line, m. Number, with the file’s decimal sign. */
  a_x_m?: string;
  /** Circuit 1, phase a: height of the attachment above ground, m. Number, with the file’s decimal sign. */
  a_height_m?: string;
  /** Circuit 1, phase a: sag at mid-span, m. Number, with the file’s decimal sign. */
  a_sag_m?: string;
  /** Circuit 1, phase b: offset from the centre line, m. Number, with the file’s decimal sign. */
  b_x_m?: string;
  /** Circuit 1, phase b: height of the attachment above ground, m. Number, with the file’s decimal sign. */
  b_height_m?: string;
  /** Circuit 1, phase b: sag at mid-span, m. Number, with the file’s decimal sign. */
  b_sag_m?: string;
  /** Circuit 1, phase c: offset from the centre line, m. Number, with the file’s decimal sign. */
  c_x_m?: string;
  /** Circuit 1, phase c: height of the attachment above ground, m. Number, with the file’s decimal sign. */
  c_height_m?: string;
  /** Circuit 1, phase c: sag at mid-span, m. Number, with the file’s decimal sign. */
  c_sag_m?: string;
  /** Circuit 2, phase a: offset from the centre line, m. Number, with the file’s decimal sign. */
  c2_a_x_m?: string;
  /** Circuit 2, phase a: height of the attachment above ground, m. Number, with the file’s decimal sign. */
  c2_a_height_m?: string;
  /** Circuit 2, phase a: sag at mid-span, m. Number, with the file’s decimal sign. */
  c2_a_sag_m?: string;
  /** Circuit 2, phase b: offset from the centre line, m. Number, with the file’s decimal sign. */
  c2_b_x_m?: string;
  /** Circuit 2, phase b: height of the attachment above ground, m. Number, with the file’s decimal sign. */
  c2_b_height_m?: string;
  /** Circuit 2, phase b: sag at mid-span, m. Number, with the file’s decimal sign. */
  c2_b_sag_m?: string;
  /** Circuit 2, phase c: offset from the centre line, m. Number, with the file’s decimal sign. */
  c2_c_x_m?: string;
  /** Circuit 2, phase c: height of the attachment above ground, m. Number, with the file’s decimal sign. */
  c2_c_height_m?: string;
  /** Circuit 2, phase c: sag at mid-span, m. Number, with the file’s decimal sign. */
  c2_c_sag_m?: string;
  /** Ground wire 1: offset from the centre line, m. Number, with the file’s decimal sign. */
  gw1_x_m?: string;
  /** Ground wire 1: height of the attachment above ground, m. Number, with the file’s decimal sign. */
  gw1_height_m?: string;
  /** Ground wire 1: sag at mid-span, m. Number, with the file’s decimal sign. */
  gw1_sag_m?: string;
  /** Ground wire 2: offset from the centre line, m. Number, with the file’s decimal sign. */
  gw2_x_m?: string;
  /** Ground wire 2: height of the attachment above ground, m. Number, with the file’s decimal sign. */
  gw2_height_m?: string;
  /** Ground wire 2: sag at mid-span, m. Number, with the file’s decimal sign. */
  gw2_sag_m?: string;
  /** Ground wire 3: offset from the centre line, m. Number, with the file’s decimal sign. */
  gw3_x_m?: string;
  /** Ground wire 3: height of the attachment above ground, m. Number, with the file’s decimal sign. */
  gw3_height_m?: string;
  /** Ground wire 3: sag at mid-span, m. Number, with the file’s decimal sign. */
  gw3_sag_m?: string;
  /** Ground wire 4: offset from the centre line, m. Number, with the file’s decimal sign. */
  gw4_x_m?: string;
  /** Ground wire 4: height of the attachment above ground, m. Number, with the file’s decimal sign. */
  gw4_height_m?: string;
  /** Ground wire 4: sag at mid-span, m. Number, with the file’s decimal sign. */
  gw4_sag_m?: string;
  /** Circuit 1: declared r1, in its unit. Number, with the file’s decimal sign. On the line’s first row. */
  r1?: string;
  /** Circuit 1: declared x1, in its unit. Number, with the file’s decimal sign. On the line’s first row. */
  x1?: string;
  /** Circuit 1: declared b1, in its unit. Number, with the file’s decimal sign. On the line’s first row. */
  b1?: string;
  /** Circuit 1: declared r0, in its unit. Number, with the file’s decimal sign. On the line’s first row. */
  r0?: string;
  /** Circuit 1: declared x0, in its unit. Number, with the file’s decimal sign. On the line’s first row. */
  x0?: string;
  /** Circuit 1: declared b0, in its unit. Number, with the file’s decimal sign. On the line’s first row. */
  b0?: string;
  /** Circuit 1: unit of r1 where it is another one. One of a list. On the line’s first row. */
  r1_unit?: string;
  /** Circuit 1: unit of x1 where it is another one. One of a list. On the line’s first row. */
  x1_unit?: string;
  /** Circuit 1: unit of b1 where it is another one. One of a list. On the line’s first row. */
  b1_unit?: string;
  /** Circuit 1: unit of r0 where it is another one. One of a list. On the line’s first row. */
  r0_unit?: string;
  /** Circuit 1: unit of x0 where it is another one. One of a list. On the line’s first row. */
  x0_unit?: string;
  /** Circuit 1: unit of b0 where it is another one. One of a list. On the line’s first row. */
  b0_unit?: string;
  /** Circuit 1: the applicant’s own name of it. Text. On the line’s first row. */
  circuit_id?: string;
  /** Circuit 1: continuous rating at its maximum temperature, A. Number, with the file’s decimal sign. On the line’s first row. */
  rating_a?: string;
  /** Circuit 1: conductor temperature that the rating is for, °C. Number, with the file’s decimal sign. On the line’s first row. */
  max_temperature_c?: string;
  /** Circuit 1: season of its rating 1. Text. On the line’s first row. */
  rating1_season?: string;
  /** Circuit 1: continuous rating in that season, A. Number, with the file’s decimal sign. On the line’s first row. */
  rating1_continuous_a?: string;
  /** Circuit 1: short-time rating in that season, A. Number, with the file’s decimal sign. On the line’s first row. */
  rating1_emergency_a?: string;
  /** Circuit 1: season of its rating 2. Text. On the line’s first row. */
  rating2_season?: string;
  /** Circuit 1: continuous rating in that season, A. Number, with the file’s decimal sign. On the line’s first row. */
  rating2_continuous_a?: string;
  /** Circuit 1: short-time rating in that season, A. Number, with the file’s decimal sign. On the line’s first row. */
  rating2_emergency_a?: string;
  /** Circuit 1: season of its rating 3. Text. On the line’s first row. */
  rating3_season?: string;
  /** Circuit 1: continuous rating in that season, A. Number, with the file’s decimal sign. On the line’s first row. */
  rating3_continuous_a?: string;
  /** Circuit 1: short-time rating in that season, A. Number, with the file’s decimal sign. On the line’s first row. */
  rating3_emergency_a?: string;
  /** Circuit 1: season of its rating 4. Text. On the line’s first row. */
  rating4_season?: string;
  /** Circuit 1: continuous rating in that season, A. Number, with the file’s decimal sign. On the line’s first row. */
  rating4_continuous_a?: string;
  /** Circuit 1: short-time rating in that season, A. Number, with the file’s decimal sign. On the line’s first row. */
  rating4_emergency_a?: string;
  /** Circuit 1: where the values come from. One of a list. On the line’s first row. */
  basis_kind?: string;
  /** Circuit 1: state of the line that they describe. One of a list. On the line’s first row. */
  basis_status?: string;
  /** Circuit 1: who answers for the values. Text. On the line’s first row. */
  basis_engineer?: string;
  /** Circuit 1: day of the calculation or measurement, YYYY-MM-DD. Text. On the line’s first row. */
  basis_date?: string;
  /** Circuit 2: declared r1, in its unit. Number, with the file’s decimal sign. On the line’s first row. */
  c2_r1?: string;
  /** Circuit 2: declared x1, in its unit. Number, with the file’s decimal sign. On the line’s first row. */
  c2_x1?: string;
  /** Circuit 2: declared b1, in its unit. Number, with the file’s decimal sign. On the line’s first row. */
  c2_b1?: string;
  /** Circuit 2: declared r0, in its unit. Number, with the file’s decimal sign. On the line’s first row. */
  c2_r0?: string;
  /** Circuit 2: declared x0, in its unit. Number, with the file’s decimal sign. On the line’s first row. */
  c2_x0?: string;
  /** Circuit 2: declared b0, in its unit. Number, with the file’s decimal sign. On the line’s first row. */
  c2_b0?: string;
  /** Circuit 2: unit of r1 where it is another one. One of a list. On the line’s first row. */
  c2_r1_unit?: string;
  /** Circuit 2: unit of x1 where it is another one. One of a list. On the line’s first row. */
  c2_x1_unit?: string;
  /** Circuit 2: unit of b1 where it is another one. One of a list. On the line’s first row. */
  c2_b1_unit?: string;
  /** Circuit 2: unit of r0 where it is another one. One of a list. On the line’s first row. */
  c2_r0_unit?: string;
  /** Circuit 2: unit of x0 where it is another one. One of a list. On the line’s first row. */
  c2_x0_unit?: string;
  /** Circuit 2: unit of b0 where it is another one. One of a list. On the line’s first row. */
  c2_b0_unit?: string;
  /** Circuit 2: the applicant’s own name of it. Text. On the line’s first row. */
  c2_circuit_id?: string;
  /** Circuit 2: continuous rating at its maximum temperature, A. Number, with the file’s decimal sign. On the line’s first row. */
  c2_rating_a?: string;
  /** Circuit 2: conductor temperature that the rating is for, °C. Number, with the file’s decimal sign. On the line’s first row. */
  c2_max_temperature_c?: string;
  /** Circuit 2: season of its rating 1. Text. On the line’s first row. */
  c2_rating1_season?: string;
  /** Circuit 2: continuous rating in that season, A. Number, with the file’s decimal sign. On the line’s first row. */
  c2_rating1_continuous_a?: string;
  /** Circuit 2: short-time rating in that season, A. Number, with the file’s decimal sign. On the line’s first row. */
  c2_rating1_emergency_a?: string;
  /** Circuit 2: season of its rating 2. Text. On the line’s first row. */
  c2_rating2_season?: string;
  /** Circuit 2: continuous rating in that season, A. Number, with the file’s decimal sign. On the line’s first row. */
  c2_rating2_continuous_a?: string;
  /** Circuit 2: short-time rating in that season, A. Number, with the file’s decimal sign. On the line’s first row. */
  c2_rating2_emergency_a?: string;
  /** Circuit 2: season of its rating 3. Text. On the line’s first row. */
  c2_rating3_season?: string;
  /** Circuit 2: continuous rating in that season, A. Number, with the file’s decimal sign. On the line’s first row. */
  c2_rating3_continuous_a?: string;
  /** Circuit 2: short-time rating in that season, A. Number, with the file’s decimal sign. On the line’s first row. */
  c2_rating3_emergency_a?: string;
  /** Circuit 2: season of its rating 4. Text. On the line’s first row. */
  c2_rating4_season?: string;
  /** Circuit 2: continuous rating in that season, A. Number, with the file’s decimal sign. On the line’s first row. */
  c2_rating4_continuous_a?: string;
  /** Circuit 2: short-time rating in that season, A. Number, with the file’s decimal sign. On the line’s first row. */
  c2_rating4_emergency_a?: string;
  /** Circuit 2: where the values come from. One of a list. On the line’s first row. */
  c2_basis_kind?: string;
  /** Circuit 2: state of the line that they describe. One of a list. On the line’s first row. */
  c2_basis_status?: string;
  /** Circuit 2: who answers for the values. Text. On the line’s first row. */
  c2_basis_engineer?: string;
  /** Circuit 2: day of the calculation or measurement, YYYY-MM-DD. Text. On the line’s first row. */
  c2_basis_date?: string;
  /** Declared coupling of the two circuits, r0m, in its unit. Number, with the file’s decimal sign. On the line’s first row. */
  r0m?: string;
  /** Declared coupling of the two circuits, x0m, in its unit. Number, with the file’s decimal sign. On the line’s first row. */
  x0m?: string;
  /** Declared coupling of the two circuits, b0m, in its unit. Number, with the file’s decimal sign. On the line’s first row. */
  b0m?: string;
  /** Unit of r0m where it is another one. One of a list. On the line’s first row. */
  r0m_unit?: string;
  /** Unit of x0m where it is another one. One of a list. On the line’s first row. */
  x0m_unit?: string;
  /** Unit of b0m where it is another one. One of a list. On the line’s first row. */
  b0m_unit?: string;
  /** Unit of the resistances and reactances. One of a list. */
  impedance_unit?: string;
  /** Unit of the susceptances. One of a list. */
  susceptance_unit?: string;
  /** Power base of pu and % values, MVA; the owner’s when empty. Number, with the file’s decimal sign. */
  base_mva?: string;
  /** Voltage base of pu and % values, kV; the nominal voltage when empty. Number, with the file’s decimal sign. */
  base_kv?: string;
  /** Unit of a cable’s resistances and reactances where it is another one. One of a list. */
  cable_impedance_unit?: string;
  /** Unit of a cable’s susceptances where it is another one. One of a list. */
  cable_susceptance_unit?: string;
  /** Cable section, circuit 1: r1 from the maker’s sheet, in its unit. Number, with the file’s decimal sign. */
  cable_r1?: string;
  /** Cable section, circuit 1: x1 from the maker’s sheet, in its unit. Number, with the file’s decimal sign. */
  cable_x1?: string;
  /** Cable section, circuit 1: b1 from the maker’s sheet, in its unit. Number, with the file’s decimal sign. */
  cable_b1?: string;
  /** Cable section, circuit 1: r0 from the maker’s sheet, in its unit. Number, with the file’s decimal sign. */
  cable_r0?: string;
  /** Cable section, circuit 1: x0 from the maker’s sheet, in its unit. Number, with the file’s decimal sign. */
  cable_x0?: string;
  /** Cable section, circuit 1: b0 from the maker’s sheet, in its unit. Number, with the file’s decimal sign. */
  cable_b0?: string;
  /** Cable section, circuit 1: unit of r1 where it is another one. One of a list. */
  cable_r1_unit?: string;
  /** Cable section, circuit 1: unit of x1 where it is another one. One of a list. */
  cable_x1_unit?: string;
  /** Cable section, circuit 1: unit of b1 where it is another one. One of a list. */
  cable_b1_unit?: string;
  /** Cable section, circuit 1: unit of r0 where it is another one. One of a list. */
  cable_r0_unit?: string;
  /** Cable section, circuit 1: unit of x0 where it is another one. One of a list. */
  cable_x0_unit?: string;
  /** Cable section, circuit 1: unit of b0 where it is another one. One of a list. */
  cable_b0_unit?: string;
  /** Cable section, circuit 2: r1 from the maker’s sheet, in its unit. Number, with the file’s decimal sign. */
  c2_cable_r1?: string;
  /** Cable section, circuit 2: x1 from the maker’s sheet, in its unit. Number, with the file’s decimal sign. */
  c2_cable_x1?: string;
  /** Cable section, circuit 2: b1 from the maker’s sheet, in its unit. Number, with the file’s decimal sign. */
  c2_cable_b1?: string;
  /** Cable section, circuit 2: r0 from the maker’s sheet, in its unit. Number, with the file’s decimal sign. */
  c2_cable_r0?: string;
  /** Cable section, circuit 2: x0 from the maker’s sheet, in its unit. Number, with the file’s decimal sign. */
  c2_cable_x0?: string;
  /** Cable section, circuit 2: b0 from the maker’s sheet, in its unit. Number, with the file’s decimal sign. */
  c2_cable_b0?: string;
  /** Cable section, circuit 2: unit of r1 where it is another one. One of a list. */
  c2_cable_r1_unit?: string;
  /** Cable section, circuit 2: unit of x1 where it is another one. One of a list. */
  c2_cable_x1_unit?: string;
  /** Cable section, circuit 2: unit of b1 where it is another one. One of a list. */
  c2_cable_b1_unit?: string;
  /** Cable section, circuit 2: unit of r0 where it is another one. One of a list. */
  c2_cable_r0_unit?: string;
  /** Cable section, circuit 2: unit of x0 where it is another one. One of a list. */
  c2_cable_x0_unit?: string;
  /** Cable section, circuit 2: unit of b0 where it is another one. One of a list. */
  c2_cable_b0_unit?: string;
}
