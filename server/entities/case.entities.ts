import { Check, Column, Entity, ForeignKey, Index, PrimaryGeneratedColumn, Unique } from 'typeorm';

export type RoundKind = 'first' | 'amendment';
export type RoundState = 'draft' | 'filed' | 'in-review' | 'returned' | 'accepted' | 'declined' | 'withdrawn';

/** An application to connect. Its state belongs to its rounds. */
@Entity({ name: 'applications' })
@Check('ck_applications_capacity', `"capacity_mw" IS NULL OR ("capacity_mw" >= 0 AND "capacity_mw" <= 1e6)`)
export class Application {
  @PrimaryGeneratedColumn('uuid') id!: string;
  @Column({ type: 'uuid' }) @ForeignKey('Organisation') @Index() orgId!: string;
  /** YY-NNNN, drawn at random without repeats. */
  @Column({ type: 'text' }) @Index({ unique: true }) number!: string;
  @Column({ type: 'text' }) title!: string;
  @Column({ type: 'text' }) connectionKind!: string;
  @Column({ type: 'double precision', nullable: true }) capacityMw!: number | null;
  @Column({ type: 'text', default: '' }) pointOfConnection!: string;
  @Column({ type: 'text', default: '' }) contactName!: string;
  @Column({ type: 'text', default: '' }) contactEmail!: string;
  @Column({ type: 'text', default: '' }) contactPhone!: string;
  @Column({ type: 'uuid', nullable: true }) @ForeignKey('Revision') acceptedRevisionId!: string | null;
  @Column({ type: 'uuid' }) @ForeignKey('User') createdBy!: string;
  @Column({ type: 'timestamptz', precision: 3, default: () => 'now()' }) createdAt!: Date;
  /** When its first revision was filed: from then on the owner's people may read it. */
  @Column({ type: 'timestamptz', precision: 3, nullable: true }) firstFiledAt!: Date | null;
  @Column({ type: 'timestamptz', precision: 3, default: () => 'now()' }) @Index() updatedAt!: Date;
  @Column({ type: 'int', default: 1 }) version!: number;
}

/** The first application or one amendment; at most one of an application is open. */
@Entity({ name: 'rounds' })
@Unique(['applicationId', 'ordinal'])
@Index('ux_rounds_one_open', ['applicationId'], {
  unique: true,
  where: `"state" IN ('draft', 'filed', 'in-review', 'returned')`,
})
@Check('ck_rounds_kind', `"kind" IN ('first', 'amendment')`)
@Check(
  'ck_rounds_state',
  `"state" IN ('draft', 'filed', 'in-review', 'returned', 'accepted', 'declined', 'withdrawn')`,
)
@Check('ck_rounds_reviewer', `"state" NOT IN ('in-review', 'returned') OR "reviewer_id" IS NOT NULL`)
export class Round {
  @PrimaryGeneratedColumn('uuid') id!: string;
  @Column({ type: 'uuid' }) @ForeignKey('Organisation') @Index() orgId!: string;
  @Column({ type: 'uuid' }) @ForeignKey('Application') applicationId!: string;
  @Column({ type: 'int' }) ordinal!: number;
  @Column({ type: 'text' }) kind!: RoundKind;
  @Column({ type: 'text' }) @Index() state!: RoundState;
  @Column({ type: 'uuid', nullable: true }) @ForeignKey('User') @Index() reviewerId!: string | null;
  /** Why the amendment was opened. */
  @Column({ type: 'text', nullable: true }) reason!: string | null;
  /** Working days of the review already used when a case was put back. */
  @Column({ type: 'int', default: 0 }) reviewDaysUsed!: number;
  @Column({ type: 'timestamptz', precision: 3, default: () => 'now()' }) openedAt!: Date;
  @Column({ type: 'timestamptz', precision: 3, nullable: true }) filedAt!: Date | null;
  @Column({ type: 'timestamptz', precision: 3, nullable: true }) closedAt!: Date | null;
  @Column({ type: 'int', default: 1 }) version!: number;
}

export interface TypedField {
  text: string;
  unit?: string;
}

/** A line as the applicant is writing it; may be incomplete. */
@Entity({ name: 'draft_lines' })
@Unique(['roundId', 'lineKey'])
@Check('ck_draft_lines_line_key', `"line_key" ~ '^L[1-9][0-9]{0,3}$'`)
export class DraftLine {
  @PrimaryGeneratedColumn('uuid') id!: string;
  @Column({ type: 'uuid' }) @ForeignKey('Organisation') @Index() orgId!: string;
  @Column({ type: 'uuid' }) @ForeignKey('Round') roundId!: string;
  /** L1, L2 …: stays with the line from revision to revision. */
  @Column({ type: 'text' }) lineKey!: string;
  @Column({ type: 'int' }) ordinal!: number;
  @Column({ type: 'jsonb' }) body!: unknown;
  /** The text of each field as it was typed, by JSON Pointer. */
  @Column({ type: 'jsonb', default: () => `'{}'` }) asTyped!: Record<string, TypedField>;
  @Column({ type: 'timestamptz', precision: 3, default: () => 'now()' }) updatedAt!: Date;
  @Column({ type: 'uuid' }) @ForeignKey('User') updatedBy!: string;
  @Column({ type: 'int', default: 1 }) version!: number;
}
