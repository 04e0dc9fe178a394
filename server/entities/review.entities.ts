import {
  Check,
  Column,
  Entity,
  ForeignKey,
  Index,
  PrimaryColumn,
  PrimaryGeneratedColumn,
  Unique,
} from 'typeorm';

export type DispositionKind = 'settled' | 'waived' | 'set-aside';
export type DiscrepancyState = 'open' | 'answered' | 'settled' | 'waived';
export type DiscrepancyEntryKind = 'raised' | 'answered' | 'commented' | 'settled' | 'reopened' | 'waived';
export type CountersignSubject = 'waive' | 'decline';
export type CountersignOutcome = 'pending' | 'granted' | 'refused';

/** What a reviewer decided about a finding, on the revision that was looked at. */
@Entity({ name: 'dispositions' })
@Index('ux_dispositions_standing', ['revisionId', 'lineKey', 'fingerprint'], {
  unique: true,
  where: '"revoked_at" IS NULL',
})
@Check('ck_dispositions_kind', `"kind" IN ('settled', 'waived', 'set-aside')`)
export class Disposition {
  @PrimaryGeneratedColumn('uuid') id!: string;
  @Column({ type: 'uuid' }) @ForeignKey('Organisation') @Index() orgId!: string;
  @Column({ type: 'uuid' }) @ForeignKey('Revision') revisionId!: string;
  @Column({ type: 'text' }) lineKey!: string;
  @Column({ type: 'text' }) fingerprint!: string;
  @Column({ type: 'text' }) kind!: DispositionKind;
  @Column({ type: 'text' }) reason!: string;
  @Column({ type: 'uuid' }) @ForeignKey('User') decidedBy!: string;
  @Column({ type: 'timestamptz', precision: 3 }) decidedAt!: Date;
  @Column({ type: 'uuid', nullable: true }) @ForeignKey('Countersign') countersignId!: string | null;
  @Column({ type: 'uuid', nullable: true }) @ForeignKey('Discrepancy') discrepancyId!: string | null;
  /** The disposition of the earlier revision that this one repeats. */
  @Column({ type: 'uuid', nullable: true }) @ForeignKey('Disposition') carriedFrom!: string | null;
  @Column({ type: 'timestamptz', precision: 3, nullable: true }) revokedAt!: Date | null;
}

/** A second reviewer's word on a waiver or a refusal: never the proposer's own. */
@Entity({ name: 'countersigns' })
@Check('ck_countersigns_subject', `"subject" IN ('waive', 'decline')`)
@Check('ck_countersigns_outcome', `"outcome" IN ('pending', 'granted', 'refused')`)
@Check('ck_countersigns_other_person', `"decided_by" IS NULL OR "decided_by" <> "proposed_by"`)
@Check('ck_countersigns_decided', `("outcome" = 'pending') = ("decided_by" IS NULL)`)
export class Countersign {
  @PrimaryGeneratedColumn('uuid') id!: string;
  @Column({ type: 'uuid' }) @ForeignKey('Organisation') @Index() orgId!: string;
  @Column({ type: 'uuid' }) @ForeignKey('Application') @Index() applicationId!: string;
  @Column({ type: 'uuid' }) @ForeignKey('Revision') revisionId!: string;
  @Column({ type: 'text' }) subject!: CountersignSubject;
  /** What is proposed: the finding's line and fingerprint, or the refusal's text. */
  @Column({ type: 'jsonb' }) proposal!: unknown;
  @Column({ type: 'text' }) reason!: string;
  @Column({ type: 'uuid' }) @ForeignKey('User') proposedBy!: string;
  @Column({ type: 'timestamptz', precision: 3 }) proposedAt!: Date;
  @Column({ type: 'text', default: 'pending' }) outcome!: CountersignOutcome;
  @Column({ type: 'uuid', nullable: true }) @ForeignKey('User') decidedBy!: string | null;
  @Column({ type: 'timestamptz', precision: 3, nullable: true }) decidedAt!: Date | null;
  @Column({ type: 'text', nullable: true }) remark!: string | null;
  @Column({ type: 'int', default: 1 }) version!: number;
}

@Entity({ name: 'discrepancies' })
@Unique(['applicationId', 'number'])
@Check('ck_discrepancies_state', `"state" IN ('open', 'answered', 'settled', 'waived')`)
@Check('ck_discrepancies_answered_by', `"answered_by" IS NULL OR "answered_by" IN ('change', 'explanation')`)
export class Discrepancy {
  @PrimaryGeneratedColumn('uuid') id!: string;
  @Column({ type: 'uuid' }) @ForeignKey('Organisation') @Index() orgId!: string;
  @Column({ type: 'uuid' }) @ForeignKey('Application') applicationId!: string;
  @Column({ type: 'uuid' }) @ForeignKey('Round') @Index() roundId!: string;
  /** D-1, D-2 … within the application. */
  @Column({ type: 'int' }) number!: number;
  @Column({ type: 'text' }) state!: DiscrepancyState;
  @Column({ type: 'text' }) title!: string;
  @Column({ type: 'text' }) questioned!: string;
  @Column({ type: 'text', nullable: true }) wouldSettle!: string | null;
  @Column({ type: 'text', array: true, default: () => `'{}'` }) lineKeys!: string[];
  /** How the applicant means to answer with the next revision. */
  @Column({ type: 'text', nullable: true }) answeredBy!: 'change' | 'explanation' | null;
  @Column({ type: 'text', nullable: true }) draftAnswer!: string | null;
  @Column({ type: 'uuid' }) @ForeignKey('Revision') raisedOnRevisionId!: string;
  @Column({ type: 'uuid' }) @ForeignKey('User') raisedBy!: string;
  @Column({ type: 'timestamptz', precision: 3 }) raisedAt!: Date;
  @Column({ type: 'int', default: 1 }) version!: number;
}

@Entity({ name: 'discrepancy_findings' })
export class DiscrepancyFinding {
  @PrimaryColumn({ type: 'uuid' }) @ForeignKey('Discrepancy') discrepancyId!: string;
  @PrimaryColumn({ type: 'uuid' }) @ForeignKey('Finding') findingId!: string;
  @Column({ type: 'uuid' }) @ForeignKey('Organisation') @Index() orgId!: string;
  @Column({ type: 'text' }) lineKey!: string;
  @Column({ type: 'text' }) fingerprint!: string;
}

/** One word in a discrepancy's thread; only ever added. */
@Entity({ name: 'discrepancy_entries' })
@Unique(['discrepancyId', 'ordinal'])
@Check(
  'ck_discrepancy_entries_kind',
  `"kind" IN ('raised', 'answered', 'commented', 'settled', 'reopened', 'waived')`,
)
export class DiscrepancyEntry {
  @PrimaryGeneratedColumn('uuid') id!: string;
  @Column({ type: 'uuid' }) @ForeignKey('Organisation') @Index() orgId!: string;
  @Column({ type: 'uuid' }) @ForeignKey('Discrepancy') discrepancyId!: string;
  @Column({ type: 'int' }) ordinal!: number;
  @Column({ type: 'text' }) kind!: DiscrepancyEntryKind;
  @Column({ type: 'text' }) text!: string;
  @Column({ type: 'uuid', nullable: true }) @ForeignKey('Revision') revisionId!: string | null;
  @Column({ type: 'uuid' }) @ForeignKey('User') writtenBy!: string;
  @Column({ type: 'timestamptz', precision: 3 }) writtenAt!: Date;
}

@Entity({ name: 'decisions' })
@Check('ck_decisions_kind', `"kind" IN ('accepted', 'declined')`)
export class Decision {
  @PrimaryGeneratedColumn('uuid') id!: string;
  @Column({ type: 'uuid' }) @ForeignKey('Organisation') @Index() orgId!: string;
  @Column({ type: 'uuid' }) @ForeignKey('Application') @Index() applicationId!: string;
  @Column({ type: 'uuid' }) @ForeignKey('Round') @Index({ unique: true }) roundId!: string;
  @Column({ type: 'uuid' }) @ForeignKey('Revision') revisionId!: string;
  @Column({ type: 'text' }) kind!: 'accepted' | 'declined';
  @Column({ type: 'text' }) reason!: string;
  @Column({ type: 'jsonb', default: () => `'[]'` }) conditions!: string[];
  @Column({ type: 'uuid', nullable: true }) @ForeignKey('Countersign') countersignId!: string | null;
  /** SHA-256 over the canonical JSON of the whole accepted record. */
  @Column({ type: 'text' }) recordHash!: string;
  @Column({ type: 'uuid' }) @ForeignKey('User') decidedBy!: string;
  @Column({ type: 'timestamptz', precision: 3 }) decidedAt!: Date;
}

/** Between reviewers; an applicant never sees one. */
@Entity({ name: 'notes' })
export class Note {
  @PrimaryGeneratedColumn('uuid') id!: string;
  @Column({ type: 'uuid' }) @ForeignKey('Organisation') @Index() orgId!: string;
  @Column({ type: 'uuid' }) @ForeignKey('Application') @Index() applicationId!: string;
  @Column({ type: 'text' }) text!: string;
  @Column({ type: 'uuid' }) @ForeignKey('User') writtenBy!: string;
  @Column({ type: 'timestamptz', precision: 3 }) writtenAt!: Date;
}
