import { Check, Column, Entity, ForeignKey, Index, PrimaryColumn, PrimaryGeneratedColumn } from 'typeorm';

export type ScanState = 'pending' | 'clean' | 'refused';
export type AttachmentSubject = 'application' | 'line' | 'discrepancy';
export type ImportState = 'staged' | 'imported' | 'refused';

@Entity({ name: 'attachments' })
@Check('ck_attachments_size', `"byte_length" > 0 AND "byte_length" <= 20971520`)
@Check('ck_attachments_scan', `"scan" IN ('pending', 'clean', 'refused')`)
export class Attachment {
  @PrimaryGeneratedColumn('uuid') id!: string;
  @Column({ type: 'uuid' }) @ForeignKey('Organisation') @Index() orgId!: string;
  @Column({ type: 'text' }) sha256!: string;
  @Column({ type: 'text' }) name!: string;
  @Column({ type: 'text' }) mediaType!: string;
  @Column({ type: 'int' }) byteLength!: number;
  @Column({ type: 'text', default: 'pending' }) scan!: ScanState;
  @Column({ type: 'uuid' }) @ForeignKey('User') uploadedBy!: string;
  @Column({ type: 'timestamptz', precision: 3 }) uploadedAt!: Date;
}

@Entity({ name: 'attachment_chunks' })
export class AttachmentChunk {
  @PrimaryColumn({ type: 'uuid' }) @ForeignKey('Attachment') attachmentId!: string;
  @PrimaryColumn({ type: 'int' }) ordinal!: number;
  @Column({ type: 'uuid' }) @ForeignKey('Organisation') @Index() orgId!: string;
  @Column({ type: 'bytea' }) bytes!: Buffer;
}

/** Where an attachment hangs: the application, one of its lines, or a discrepancy. */
@Entity({ name: 'attachment_links' })
@Check('ck_attachment_links_subject', `"subject" IN ('application', 'line', 'discrepancy')`)
@Check('ck_attachment_links_line', `("subject" = 'line') = ("line_key" IS NOT NULL)`)
@Check('ck_attachment_links_discrepancy', `("subject" = 'discrepancy') = ("discrepancy_id" IS NOT NULL)`)
export class AttachmentLink {
  @PrimaryGeneratedColumn('uuid') id!: string;
  @Column({ type: 'uuid' }) @ForeignKey('Organisation') @Index() orgId!: string;
  @Column({ type: 'uuid' }) @ForeignKey('Attachment') @Index() attachmentId!: string;
  @Column({ type: 'uuid' }) @ForeignKey('Application') @Index() applicationId!: string;
  @Column({ type: 'text' }) subject!: AttachmentSubject;
  @Column({ type: 'text', nullable: true }) lineKey!: string | null;
  @Column({ type: 'uuid', nullable: true }) @ForeignKey('Discrepancy') discrepancyId!: string | null;
  @Column({ type: 'timestamptz', precision: 3 }) linkedAt!: Date;
}

/** An uploaded file of lines, read and staged; the applicant sees what it holds before taking it over. */
@Entity({ name: 'imports' })
@Check('ck_imports_state', `"state" IN ('staged', 'imported', 'refused')`)
export class FileImport {
  @PrimaryGeneratedColumn('uuid') id!: string;
  @Column({ type: 'uuid' }) @ForeignKey('Organisation') @Index() orgId!: string;
  @Column({ type: 'uuid' }) @ForeignKey('Application') @Index() applicationId!: string;
  @Column({ type: 'uuid' }) @ForeignKey('Round') roundId!: string;
  @Column({ type: 'text' }) state!: ImportState;
  @Column({ type: 'text' }) fileName!: string;
  @Column({ type: 'text' }) fileSha256!: string;
  /** json, or the separator, decimal sign, encoding and line ends that were found. */
  @Column({ type: 'jsonb' }) dialect!: unknown;
  @Column({ type: 'jsonb', default: () => `'[]'` }) faults!: unknown[];
  @Column({ type: 'jsonb', default: () => `'[]'` }) notices!: unknown[];
  @Column({ type: 'int', default: 0 }) rowCount!: number;
  @Column({ type: 'int', default: 0 }) lineCount!: number;
  @Column({ type: 'uuid' }) @ForeignKey('User') createdBy!: string;
  @Column({ type: 'timestamptz', precision: 3 }) createdAt!: Date;
  @Column({ type: 'timestamptz', precision: 3, nullable: true }) importedAt!: Date | null;
  @Column({ type: 'int', default: 1 }) version!: number;
}

/** One line found in the file, whole or with its faults. */
@Entity({ name: 'import_rows' })
export class ImportRow {
  @PrimaryColumn({ type: 'uuid' }) @ForeignKey('FileImport') importId!: string;
  @PrimaryColumn({ type: 'int' }) ordinal!: number;
  @Column({ type: 'uuid' }) @ForeignKey('Organisation') @Index() orgId!: string;
  @Column({ type: 'int', nullable: true }) row!: number | null;
  @Column({ type: 'jsonb' }) body!: unknown;
  @Column({ type: 'jsonb', default: () => `'[]'` }) faults!: unknown[];
}

/** The answer to a write that a client may retry; kept for 24 hours. */
@Entity({ name: 'idempotency_keys' })
export class IdempotencyKey {
  @PrimaryColumn({ type: 'uuid' }) @ForeignKey('User') userId!: string;
  @PrimaryColumn({ type: 'text' }) key!: string;
  @Column({ type: 'text' }) operationId!: string;
  @Column({ type: 'text' }) requestHash!: string;
  @Column({ type: 'int', nullable: true }) status!: number | null;
  @Column({ type: 'json', nullable: true }) answer!: unknown;
  @Column({ type: 'timestamptz', precision: 3, default: () => 'now()' }) @Index() createdAt!: Date;
}
