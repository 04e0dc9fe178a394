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

export type RuleSetStatus = 'draft' | 'published';

/** Everything that a filing is weighed against, as one version. A published set never changes. */
@Entity({ name: 'rule_sets' })
@Index('ux_rule_sets_one_draft', ['status'], { unique: true, where: `"status" = 'draft'` })
@Check('ck_rule_sets_status', `"status" IN ('draft', 'published')`)
@Check(
  'ck_rule_sets_published',
  `"status" = 'draft' OR ("effective_from" IS NOT NULL AND "published_at" IS NOT NULL)`,
)
export class RuleSet {
  @PrimaryGeneratedColumn('uuid') id!: string;
  @Column({ type: 'int' }) @Index({ unique: true }) version!: number;
  @Column({ type: 'text' }) status!: RuleSetStatus;
  @Column({ type: 'timestamptz', precision: 3, nullable: true }) effectiveFrom!: Date | null;
  @Column({ type: 'text', default: '' }) reason!: string;
  @Column({ type: 'uuid', nullable: true }) @ForeignKey('User') createdBy!: string | null;
  @Column({ type: 'uuid', nullable: true }) @ForeignKey('User') publishedBy!: string | null;
  @Column({ type: 'timestamptz', precision: 3, nullable: true }) publishedAt!: Date | null;
  /** Counts the savings of a draft, so that two administrators do not overwrite each other. */
  @Column({ type: 'int', default: 1 }) lockVersion!: number;
}

@Entity({ name: 'voltage_classes' })
@Unique(['ruleSetId', 'classKv', 'frequencyHz'])
@Check('ck_voltage_classes_kv', `"class_kv" > 0 AND "class_kv" <= 2000`)
@Check('ck_voltage_classes_hz', `"frequency_hz" IN (50, 60)`)
export class VoltageClass {
  @PrimaryGeneratedColumn('uuid') id!: string;
  @Column({ type: 'uuid' }) @ForeignKey('RuleSet') ruleSetId!: string;
  @Column({ type: 'double precision' }) classKv!: number;
  @Column({ type: 'int' }) frequencyHz!: number;
}

@Entity({ name: 'bands' })
@Unique(['voltageClassId', 'parameter'])
// Both bounds in every check: in PostgreSQL NaN >= 0 is true.
@Check(
  'ck_bands_order',
  `"outer_low" >= -1e12 AND "outer_low" <= "typical_low" AND "typical_low" < "typical_high" AND "typical_high" <= "outer_high" AND "outer_high" <= 1e12`,
)
export class Band {
  @PrimaryGeneratedColumn('uuid') id!: string;
  @Column({ type: 'uuid' }) @ForeignKey('RuleSet') @Index() ruleSetId!: string;
  @Column({ type: 'uuid' }) @ForeignKey('VoltageClass') voltageClassId!: string;
  @Column({ type: 'text' }) parameter!: string;
  @Column({ type: 'double precision' }) typicalLow!: number;
  @Column({ type: 'double precision' }) typicalHigh!: number;
  @Column({ type: 'double precision' }) outerLow!: number;
  @Column({ type: 'double precision' }) outerHigh!: number;
  @Column({ type: 'text' }) source!: string;
}

@Entity({ name: 'tolerances' })
@Check('ck_tolerances_relative', `"relative" >= 0 AND "relative" <= 10`)
@Check('ck_tolerances_cap', `"cap" IS NULL OR ("cap" >= 0 AND "cap" <= 10)`)
export class Tolerance {
  @PrimaryColumn({ type: 'uuid' }) @ForeignKey('RuleSet') ruleSetId!: string;
  @PrimaryColumn({ type: 'text' }) parameter!: string;
  @Column({ type: 'double precision' }) relative!: number;
  @Column({ type: 'double precision', nullable: true }) cap!: number | null;
}

/** How far an input of the calculation may be off; the value is plain data of the checker's own shape. */
@Entity({ name: 'uncertainties' })
export class Uncertainty {
  @PrimaryColumn({ type: 'uuid' }) @ForeignKey('RuleSet') ruleSetId!: string;
  @PrimaryColumn({ type: 'text' }) input!: string;
  @Column({ type: 'jsonb' }) value!: unknown;
}

/** Windows, bases and other settings of the owner, by key. */
@Entity({ name: 'settings' })
export class Setting {
  @PrimaryColumn({ type: 'uuid' }) @ForeignKey('RuleSet') ruleSetId!: string;
  @PrimaryColumn({ type: 'text' }) key!: string;
  @Column({ type: 'jsonb' }) value!: unknown;
}

@Entity({ name: 'conductors' })
export class Conductor {
  @PrimaryGeneratedColumn('uuid') id!: string;
  @Column({ type: 'text' }) @Index({ unique: true }) name!: string;
}

@Entity({ name: 'conductor_versions' })
@Unique(['conductorId', 'ordinal'])
export class ConductorVersion {
  @PrimaryGeneratedColumn('uuid') id!: string;
  @Column({ type: 'uuid' }) @ForeignKey('Conductor') conductorId!: string;
  @Column({ type: 'int' }) ordinal!: number;
  @Column({ type: 'jsonb' }) data!: unknown;
  @Column({ type: 'text' }) source!: string;
  @Column({ type: 'text' }) tag!: string;
  @Column({ type: 'boolean', default: false }) retired!: boolean;
  @Column({ type: 'timestamptz', precision: 3, default: () => 'now()' }) createdAt!: Date;
}
