/** The closed unions of what may be done to what. */
import type { MongoAbility } from '@casl/ability';

/** Everything that somebody may do. */
export type Action =
  | 'read'
  | 'create'
  | 'update'
  | 'file'
  | 'answer'
  | 'withdraw'
  | 'amend'
  | 'review'
  | 'decide'
  | 'countersign'
  | 'publish'
  | 'administer';

/** Everything that it may be done to. Each has the organisation that it belongs to, save the owner's own things. */
export type Subject =
  | 'Application'
  | 'Draft'
  | 'Revision'
  | 'Discrepancy'
  | 'Attachment'
  | 'Letter'
  | 'Countersign'
  | 'Import'
  | 'Note'
  | 'RuleSet'
  | 'Conductor'
  | 'Calendar'
  | 'Organisation'
  | 'User'
  | 'Membership'
  | 'Invitation'
  | 'AuditEvent';

/** An ability over these. */
export type AppAbility = MongoAbility<[Action, Subject | SubjectRecord]>;

/** A record that a rule is asked about: its kind, and the fields that conditions look at. */
export interface SubjectRecord {
  readonly kind: Subject;
  /** Organisation of the applicant that the record belongs to. */
  readonly orgId?: string | null;
  /** When the application was first filed; before that it is the applicant's alone. */
  readonly firstFiledAt?: Date | string | null;
  /** A person that the record is about. */
  readonly userId?: string | null;
  /** Who proposed a countersign. */
  readonly proposedBy?: string | null;
  readonly id?: string;
}

/** Who asks, as the session knows them. */
export interface Actor {
  readonly userId: string;
  readonly role: 'applicant' | 'reviewer' | 'administrator';
  /** The organisation that is active in the session. */
  readonly orgId: string;
  /** Organisations whose cases this reviewer must not see (employed there before, or related). */
  readonly barredOrgIds: readonly string[];
}

/** What a subject's file is given to write its rules with. */
export type Can = (action: Action | Action[], subject: Subject, conditions?: Record<string, unknown>) => void;
