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

export type CheckRunStatus = 'queued' | 'running' | 'done' | 'failed';
export type Grade = 'must-answer' | 'explain' | 'note';

const finite = (column: string) => `"${column}" IS NULL OR ("${column}" >= -1e300 AND "${column}" <= 1e300)`;

/** One check of one revision. Checking again adds a run; the one made at filing governs until another is adopted. */
@Entity({ name: 'check_runs' })
@Unique(['revisionId', 'ordinal'])
@Index('ux_check_runs_governing', ['revisionId'], { unique: true, where: '"governing"' })
@Check('ck_check_runs_status', `"status" IN ('queued', 'running', 'done', 'failed')`)
export class CheckRun {
  @PrimaryGeneratedColumn('uuid') id!: string;
  @Column({ type: 'uuid' }) @ForeignKey('Organisation') @Index() orgId!: string;
  @Column({ type: 'uuid' }) @ForeignKey('Revision') revisionId!: string;
  @Column({ type: 'int' }) ordinal!: number;
  @Column({ type: 'uuid' }) @ForeignKey('RuleSet') ruleSetId!: string;
  @Column({ type: 'text' }) status!: CheckRunStatus;
  @Column({ type: 'boolean', default: false }) governing!: boolean;
  @Column({ type: 'text', nullable: true }) engineVersion!: string | null;
  @Column({ type: 'int', default: 0 }) linesTotal!: number;
  @Column({ type: 'int', default: 0 }) linesDone!: number;
  /** The whole report as the checker gave it. */
  @Column({ type: 'jsonb', nullable: true }) report!: unknown;
  @Column({ type: 'text', nullable: true }) failure!: string | null;
  /** Who asked for it; nobody for the one made at filing. */
  @Column({ type: 'uuid', nullable: true }) @ForeignKey('User') requestedBy!: string | null;
  @Column({ type: 'timestamptz', precision: 3, default: () => 'now()' }) queuedAt!: Date;
  @Column({ type: 'timestamptz', precision: 3, nullable: true }) startedAt!: Date | null;
  @Column({ type: 'timestamptz', precision: 3, nullable: true }) finishedAt!: Date | null;
}

@Entity({ name: 'run_values' })
@Check('ck_run_values_declared', finite('declared'))
@Check('ck_run_values_recomputed', finite('recomputed'))
@Check('ck_run_values_low', finite('low'))
@Check('ck_run_values_high', finite('high'))
@Check('ck_run_values_tolerance', finite('tolerance'))
export class RunValue {
  @PrimaryColumn({ type: 'uuid' }) @ForeignKey('CheckRun') runId!: string;
  @PrimaryColumn({ type: 'text' }) lineKey!: string;
  @PrimaryColumn({ type: 'int' }) circuit!: number;
  @PrimaryColumn({ type: 'text' }) parameter!: string;
  @Column({ type: 'uuid' }) @ForeignKey('Organisation') @Index() orgId!: string;
  @Column({ type: 'double precision', nullable: true }) declared!: number | null;
  @Column({ type: 'double precision', nullable: true }) recomputed!: number | null;
  @Column({ type: 'double precision', nullable: true }) low!: number | null;
  @Column({ type: 'double precision', nullable: true }) high!: number | null;
  @Column({ type: 'double precision', nullable: true }) tolerance!: number | null;
}

@Entity({ name: 'findings' })
@Unique(['runId', 'ordinal'])
@Check('ck_findings_grade', `"grade" IN ('must-answer', 'explain', 'note')`)
@Check('ck_findings_declared', finite('declared'))
@Check('ck_findings_recomputed', finite('recomputed'))
@Check('ck_findings_deviation', finite('deviation'))
@Check('ck_findings_tolerance', finite('tolerance'))
export class Finding {
  @PrimaryGeneratedColumn('uuid') id!: string;
  @Column({ type: 'uuid' }) @ForeignKey('Organisation') @Index() orgId!: string;
  @Column({ type: 'uuid' }) @ForeignKey('CheckRun') runId!: string;
  @Column({ type: 'int' }) ordinal!: number;
  @Column({ type: 'text' }) lineKey!: string;
  @Column({ type: 'int', nullable: true }) circuit!: number | null;
  @Column({ type: 'int', nullable: true }) section!: number | null;
  @Column({ type: 'int', nullable: true }) position!: number | null;
  @Column({ type: 'text' }) code!: string;
  @Column({ type: 'text' }) family!: string;
  @Column({ type: 'text', nullable: true }) parameter!: string | null;
  @Column({ type: 'text' }) grade!: Grade;
  @Column({ type: 'double precision', nullable: true }) declared!: number | null;
  @Column({ type: 'double precision', nullable: true }) recomputed!: number | null;
  @Column({ type: 'double precision', nullable: true }) deviation!: number | null;
  @Column({ type: 'double precision', nullable: true }) tolerance!: number | null;
  /** JSON Pointer into the filing. */
  @Column({ type: 'text' }) pointer!: string;
  @Column({ type: 'text' }) message!: string;
  /** Joins the findings that one matter explains. */
  @Column({ type: 'int', nullable: true }) groupNumber!: number | null;
  @Column({ type: 'jsonb', default: () => `'[]'` }) causes!: unknown[];
  /** The parameter that it follows from; such a finding is not counted again. */
  @Column({ type: 'text', nullable: true }) follows!: string | null;
  /** Equal where code, circuit and figures are equal: what a disposition carries over by. */
  @Column({ type: 'text' }) @Index() fingerprint!: string;
}
