import { Column, Entity, ForeignKey, Index, PrimaryColumn } from 'typeorm';

/** One entry of the audit trail: only ever added, each chained to the one before by a hash. */
@Entity({ name: 'audit_events' })
export class AuditEvent {
  @PrimaryColumn({ type: 'bigint' }) seq!: string;
  /** The organisation whose case it concerns; none for what concerns the owner alone. */
  @Column({ type: 'uuid', nullable: true }) @ForeignKey('Organisation') @Index() orgId!: string | null;
  @Column({ type: 'uuid', nullable: true }) @ForeignKey('Application') @Index() applicationId!: string | null;
  @Column({ type: 'uuid', nullable: true }) @ForeignKey('User') @Index() actorId!: string | null;
  @Column({ type: 'text' }) actorRole!: string;
  @Column({ type: 'text' }) actorName!: string;
  /** `application.filed`, `bands.published` …: noun and past participle. */
  @Column({ type: 'text' }) @Index() act!: string;
  @Column({ type: 'jsonb', nullable: true }) before!: unknown;
  @Column({ type: 'jsonb', nullable: true }) after!: unknown;
  @Column({ type: 'timestamptz', precision: 3 }) at!: Date;
  @Column({ type: 'text' }) prevHash!: string;
  @Column({ type: 'text' }) @Index({ unique: true }) hash!: string;
}
