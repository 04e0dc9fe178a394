export const RULES_TABLES: readonly string[] = [
  `
  CREATE TABLE rule_sets (
    id uuid NOT NULL DEFAULT gen_random_uuid(),
    version integer NOT NULL,
    status text NOT NULL,
    effective_from timestamptz(3),
    reason text NOT NULL DEFAULT '',
    created_by uuid,
    published_by uuid,
    published_at timestamptz(3),
    lock_version integer NOT NULL DEFAULT '1',
    CONSTRAINT ck_rule_sets_published CHECK (status = 'draft' OR (effective_from IS NOT NULL AND published_at IS NOT NULL)),
    CONSTRAINT ck_rule_sets_status CHECK (status IN ('draft', 'published')),
    CONSTRAINT pk_rule_sets_id PRIMARY KEY (id)
  )
  `,
  `CREATE UNIQUE INDEX ix_rule_sets_version ON rule_sets (version)`,
  `CREATE UNIQUE INDEX ux_rule_sets_one_draft ON rule_sets (status) WHERE status = 'draft'`,
  `
  CREATE TABLE voltage_classes (
    id uuid NOT NULL DEFAULT gen_random_uuid(),
    rule_set_id uuid NOT NULL,
    class_kv double precision NOT NULL,
    frequency_hz integer NOT NULL,
    CONSTRAINT uq_voltage_classes_rule_set_id_class_kv_frequency_hz UNIQUE (rule_set_id, class_kv, frequency_hz),
    CONSTRAINT ck_voltage_classes_hz CHECK (frequency_hz IN (50, 60)),
    CONSTRAINT ck_voltage_classes_kv CHECK (class_kv > 0 AND class_kv <= 2000),
    CONSTRAINT pk_voltage_classes_id PRIMARY KEY (id)
  )
  `,
  `
  CREATE TABLE bands (
    id uuid NOT NULL DEFAULT gen_random_uuid(),
    rule_set_id uuid NOT NULL,
    voltage_class_id uuid NOT NULL,
    parameter text NOT NULL,
    typical_low double precision NOT NULL,
    typical_high double precision NOT NULL,
    outer_low double precision NOT NULL,
    outer_high double precision NOT NULL,
    source text NOT NULL,
    CONSTRAINT uq_bands_voltage_class_id_parameter UNIQUE (voltage_class_id, parameter),
    CONSTRAINT ck_bands_order CHECK (outer_low >= -1e12 AND outer_low <= typical_low AND typical_low < typical_high AND typical_high <= outer_high AND outer_high <= 1e12),
    CONSTRAINT pk_bands_id PRIMARY KEY (id)
  )
  `,
  `CREATE INDEX ix_bands_rule_set_id ON bands (rule_set_id)`,
  `
  CREATE TABLE tolerances (
    rule_set_id uuid NOT NULL,
    parameter text NOT NULL,
    relative double precision NOT NULL,
    cap double precision,
    CONSTRAINT ck_tolerances_cap CHECK (cap IS NULL OR (cap >= 0 AND cap <= 10)),
    CONSTRAINT ck_tolerances_relative CHECK (relative >= 0 AND relative <= 10),
    CONSTRAINT pk_tolerances_rule_set_id_parameter PRIMARY KEY (rule_set_id, parameter)
  )
  `,
  `
  CREATE TABLE uncertainties (
    rule_set_id uuid NOT NULL,
    input text NOT NULL,
    value jsonb NOT NULL,
    CONSTRAINT pk_uncertainties_rule_set_id_input PRIMARY KEY (rule_set_id, input)
  )
  `,
  `
  CREATE TABLE settings (
    rule_set_id uuid NOT NULL,
    key text NOT NULL,
    value jsonb NOT NULL,
    CONSTRAINT pk_settings_rule_set_id_key PRIMARY KEY (rule_set_id, key)
  )
  `,
  `
  CREATE TABLE conductors (
    id uuid NOT NULL DEFAULT gen_random_uuid(),
    name text NOT NULL,
    CONSTRAINT pk_conductors_id PRIMARY KEY (id)
  )
  `,
  `CREATE UNIQUE INDEX ix_conductors_name ON conductors (name)`,
  `
  CREATE TABLE conductor_versions (
    id uuid NOT NULL DEFAULT gen_random_uuid(),
    conductor_id uuid NOT NULL,
    ordinal integer NOT NULL,
    data jsonb NOT NULL,
    source text NOT NULL,
    tag text NOT NULL,
    retired boolean NOT NULL DEFAULT false,
    created_at timestamptz(3) NOT NULL DEFAULT now(),
    CONSTRAINT uq_conductor_versions_conductor_id_ordinal UNIQUE (conductor_id, ordinal),
    CONSTRAINT pk_conductor_versions_id PRIMARY KEY (id)
  )
  `,
];
