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

/** One line as filed, kept once for each content; its conductors' data are copied in. Never changes. */
@Entity({ name: 'line_versions' })
@Check('ck_line_versions_kv', `"nominal_voltage_kv" > 0 AND "nominal_voltage_kv" <= 2000`)
@Check('ck_line_versions_hz', `"frequency_hz" IN (50, 60)`)
@Check('ck_line_versions_km', `"length_km" > 0 AND "length_km" <= 1e5`)
export class LineVersion {
  @PrimaryColumn({ type: 'uuid' }) @ForeignKey('Organisation') orgId!: string;
  /** SHA-256 of the canonical JSON in SI values. */
  @PrimaryColumn({ type: 'text' }) hash!: string;
  @Column({ type: 'jsonb' }) body!: unknown;
  @Column({ type: 'text' }) name!: string;
  @Column({ type: 'double precision' }) nominalVoltageKv!: number;
  @Column({ type: 'int' }) frequencyHz!: number;
  @Column({ type: 'double precision' }) lengthKm!: number;
}

/** What was filed at one moment: revision A, B, …. Never changes. */
@Entity({ name: 'revisions' })
@Unique(['applicationId', 'ordinal'])
export class Revision {
  @PrimaryGeneratedColumn('uuid') id!: string;
  @Column({ type: 'uuid' }) @ForeignKey('Organisation') @Index() orgId!: string;
  @Column({ type: 'uuid' }) @ForeignKey('Application') applicationId!: string;
  @Column({ type: 'uuid' }) @ForeignKey('Round') @Index() roundId!: string;
  @Column({ type: 'int' }) ordinal!: number;
  /** A … Z, AA …. */
  @Column({ type: 'text' }) letter!: string;
  @Column({ type: 'text' }) contentHash!: string;
  /** Title, connection, capacity and contact as they stood at filing. */
  @Column({ type: 'jsonb' }) particulars!: Record<string, unknown>;
  @Column({ type: 'uuid' }) @ForeignKey('User') filedBy!: string;
  @Column({ type: 'timestamptz', precision: 3 }) filedAt!: Date;
}

@Entity({ name: 'revision_lines' })
@ForeignKey('LineVersion', ['orgId', 'lineHash'], ['orgId', 'hash'])
@Unique(['revisionId', 'ordinal'])
@Check('ck_revision_lines_line_key', `"line_key" ~ '^L[1-9][0-9]{0,3}$'`)
export class RevisionLine {
  @PrimaryColumn({ type: 'uuid' }) @ForeignKey('Revision') revisionId!: string;
  @PrimaryColumn({ type: 'text' }) lineKey!: string;
  @Column({ type: 'uuid' }) @ForeignKey('Organisation') @Index() orgId!: string;
  @Column({ type: 'int' }) ordinal!: number;
  @Column({ type: 'text' }) lineHash!: string;
}
