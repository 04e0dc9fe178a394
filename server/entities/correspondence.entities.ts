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

export type LetterKind = 'receipt' | 'return' | 'decision' | 'notice';
export type OutboxStatus = 'waiting' | 'sending' | 'sent' | 'failed';
export type WindowKind = 'take-up' | 'review' | 'cure' | 'extension';

/** A letter as it was sent: stored bytes, never made again. */
@Entity({ name: 'letters' })
@Unique(['applicationId', 'number'])
@Check('ck_letters_kind', `"kind" IN ('receipt', 'return', 'decision', 'notice')`)
export class Letter {
  @PrimaryGeneratedColumn('uuid') id!: string;
  @Column({ type: 'uuid' }) @ForeignKey('Organisation') @Index() orgId!: string;
  @Column({ type: 'uuid' }) @ForeignKey('Application') applicationId!: string;
  @Column({ type: 'uuid' }) @ForeignKey('Round') roundId!: string;
  @Column({ type: 'int' }) number!: number;
  @Column({ type: 'text' }) kind!: LetterKind;
  @Column({ type: 'uuid' }) @ForeignKey('Revision') revisionId!: string;
  @Column({ type: 'text' }) subject!: string;
  /** application/pdf or text/plain. */
  @Column({ type: 'text' }) mediaType!: string;
  @Column({ type: 'bytea', select: false }) bytes!: Buffer;
  @Column({ type: 'text' }) sha256!: string;
  @Column({ type: 'timestamptz', precision: 3, nullable: true }) dueAt!: Date | null;
  @Column({ type: 'uuid', nullable: true }) @ForeignKey('User') issuedBy!: string | null;
  @Column({ type: 'timestamptz', precision: 3 }) issuedAt!: Date;
}

@Entity({ name: 'letter_discrepancies' })
export class LetterDiscrepancy {
  @PrimaryColumn({ type: 'uuid' }) @ForeignKey('Letter') letterId!: string;
  @PrimaryColumn({ type: 'uuid' }) @ForeignKey('Discrepancy') discrepancyId!: string;
  @Column({ type: 'uuid' }) @ForeignKey('Organisation') @Index() orgId!: string;
}

/** Mail that must go out; written in the transaction of its cause, sent by the worker. */
@Entity({ name: 'outbox' })
@Unique(['kind', 'causeId', 'recipient'])
@Index('ix_outbox_due', ['nextAttemptAt'], { where: `"status" IN ('waiting', 'sending')` })
@Check('ck_outbox_status', `"status" IN ('waiting', 'sending', 'sent', 'failed')`)
export class OutboxMail {
  @PrimaryGeneratedColumn('uuid') id!: string;
  @Column({ type: 'uuid', nullable: true }) @ForeignKey('Organisation') @Index() orgId!: string | null;
  @Column({ type: 'text' }) kind!: string;
  @Column({ type: 'text' }) causeId!: string;
  @Column({ type: 'text' }) recipient!: string;
  @Column({ type: 'text' }) subject!: string;
  @Column({ type: 'text' }) body!: string;
  /** The letter that travels as an attachment. */
  @Column({ type: 'uuid', nullable: true }) @ForeignKey('Letter') letterId!: string | null;
  @Column({ type: 'text', default: 'waiting' }) status!: OutboxStatus;
  @Column({ type: 'int', default: 0 }) attempts!: number;
  @Column({ type: 'timestamptz', precision: 3 }) nextAttemptAt!: Date;
  @Column({ type: 'timestamptz', precision: 3 }) createdAt!: Date;
  @Column({ type: 'timestamptz', precision: 3, nullable: true }) sentAt!: Date | null;
  @Column({ type: 'text', nullable: true }) lastError!: string | null;
}

@Entity({ name: 'mail_preferences' })
export class MailPreference {
  @PrimaryColumn({ type: 'uuid' }) @ForeignKey('User') userId!: string;
  @PrimaryColumn({ type: 'text' }) kind!: string;
  @Column({ type: 'boolean' }) wanted!: boolean;
}

/** What the demo's own mail server took in, for the Mail room. */
@Entity({ name: 'mail_room' })
export class ReceivedMail {
  @PrimaryGeneratedColumn('uuid') id!: string;
  @Column({ type: 'text' }) messageId!: string;
  @Column({ type: 'text' }) sender!: string;
  @Column({ type: 'text' }) recipient!: string;
  @Column({ type: 'text' }) subject!: string;
  @Column({ type: 'text' }) body!: string;
  @Column({ type: 'jsonb', default: () => `'[]'` }) attachments!: { name: string; byteLength: number }[];
  @Column({ type: 'timestamptz', precision: 3, default: () => 'now()' }) @Index() receivedAt!: Date;
}

/** A span of working days within which somebody has to act. */
@Entity({ name: 'windows' })
@Check('ck_windows_kind', `"kind" IN ('take-up', 'review', 'cure', 'extension')`)
@Index('ux_windows_one_open', ['roundId', 'kind'], { unique: true, where: '"closed_at" IS NULL' })
export class CaseWindow {
  @PrimaryGeneratedColumn('uuid') id!: string;
  @Column({ type: 'uuid' }) @ForeignKey('Organisation') @Index() orgId!: string;
  @Column({ type: 'uuid' }) @ForeignKey('Round') roundId!: string;
  @Column({ type: 'text' }) kind!: WindowKind;
  @Column({ type: 'timestamptz', precision: 3 }) openedAt!: Date;
  @Column({ type: 'timestamptz', precision: 3 }) dueAt!: Date;
  @Column({ type: 'timestamptz', precision: 3, nullable: true }) closedAt!: Date | null;
  @Column({ type: 'int' }) workingDays!: number;
  @Column({ type: 'int' }) calendarVersion!: number;
}

@Entity({ name: 'calendars' })
export class Calendar {
  @PrimaryGeneratedColumn('uuid') id!: string;
  @Column({ type: 'int' }) @Index({ unique: true }) version!: number;
  @Column({ type: 'text' }) timeZone!: string;
  /** 0 Sunday … 6 Saturday. */
  @Column({ type: 'int', array: true }) weekendDays!: number[];
  @Column({ type: 'timestamptz', precision: 3, default: () => 'now()' }) createdAt!: Date;
}

@Entity({ name: 'holidays' })
export class Holiday {
  @PrimaryColumn({ type: 'uuid' }) @ForeignKey('Calendar') calendarId!: string;
  @PrimaryColumn({ type: 'date' }) day!: string;
  @Column({ type: 'text' }) name!: string;
}
