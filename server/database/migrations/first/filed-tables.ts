export const FILED_TABLES: readonly string[] = [
  `
  CREATE TABLE line_versions (
    org_id uuid NOT NULL,
    hash text NOT NULL,
    body jsonb NOT NULL,
    name text NOT NULL,
    nominal_voltage_kv double precision NOT NULL,
    frequency_hz integer NOT NULL,
    length_km double precision NOT NULL,
    CONSTRAINT ck_line_versions_km CHECK (length_km > 0 AND length_km <= 1e5),
    CONSTRAINT ck_line_versions_hz CHECK (frequency_hz IN (50, 60)),
    CONSTRAINT ck_line_versions_kv CHECK (nominal_voltage_kv > 0 AND nominal_voltage_kv <= 2000),
    CONSTRAINT pk_line_versions_org_id_hash PRIMARY KEY (org_id, hash)
  )
  `,
  `
  CREATE TABLE revisions (
    id uuid NOT NULL DEFAULT gen_random_uuid(),
    org_id uuid NOT NULL,
    application_id uuid NOT NULL,
    round_id uuid NOT NULL,
    ordinal integer NOT NULL,
    letter text NOT NULL,
    content_hash text NOT NULL,
    particulars jsonb NOT NULL,
    filed_by uuid NOT NULL,
    filed_at timestamptz(3) NOT NULL,
    CONSTRAINT uq_revisions_application_id_ordinal UNIQUE (application_id, ordinal),
    CONSTRAINT pk_revisions_id PRIMARY KEY (id)
  )
  `,
  `CREATE INDEX ix_revisions_org_id ON revisions (org_id)`,
  `CREATE INDEX ix_revisions_round_id ON revisions (round_id)`,
  `
  CREATE TABLE revision_lines (
    revision_id uuid NOT NULL,
    line_key text NOT NULL,
    org_id uuid NOT NULL,
    ordinal integer NOT NULL,
    line_hash text NOT NULL,
    CONSTRAINT uq_revision_lines_revision_id_ordinal UNIQUE (revision_id, ordinal),
    CONSTRAINT ck_revision_lines_line_key CHECK (line_key ~ '^L[1-9][0-9]{0,3}$'),
    CONSTRAINT pk_revision_lines_revision_id_line_key PRIMARY KEY (revision_id, line_key)
  )
  `,
  `CREATE INDEX ix_revision_lines_org_id ON revision_lines (org_id)`,
];
