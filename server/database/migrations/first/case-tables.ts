export const CASE_TABLES: readonly string[] = [
  `
  CREATE TABLE applications (
    id uuid NOT NULL DEFAULT gen_random_uuid(),
    org_id uuid NOT NULL,
    number text NOT NULL,
    title text NOT NULL,
    connection_kind text NOT NULL,
    capacity_mw double precision,
    point_of_connection text NOT NULL DEFAULT '',
    contact_name text NOT NULL DEFAULT '',
    contact_email text NOT NULL DEFAULT '',
    contact_phone text NOT NULL DEFAULT '',
    accepted_revision_id uuid,
    created_by uuid NOT NULL,
    created_at timestamptz(3) NOT NULL DEFAULT now(),
    first_filed_at timestamptz(3),
    updated_at timestamptz(3) NOT NULL DEFAULT now(),
    version integer NOT NULL DEFAULT '1',
    CONSTRAINT ck_applications_capacity CHECK (capacity_mw IS NULL OR (capacity_mw >= 0 AND capacity_mw <= 1e6)),
    CONSTRAINT pk_applications_id PRIMARY KEY (id)
  )
  `,
  `CREATE INDEX ix_applications_org_id ON applications (org_id)`,
  `CREATE UNIQUE INDEX ix_applications_number ON applications (number)`,
  `CREATE INDEX ix_applications_updated_at ON applications (updated_at)`,
  `
  CREATE TABLE rounds (
    id uuid NOT NULL DEFAULT gen_random_uuid(),
    org_id uuid NOT NULL,
    application_id uuid NOT NULL,
    ordinal integer NOT NULL,
    kind text NOT NULL,
    state text NOT NULL,
    reviewer_id uuid,
    reason text,
    review_days_used integer NOT NULL DEFAULT '0',
    opened_at timestamptz(3) NOT NULL DEFAULT now(),
    filed_at timestamptz(3),
    closed_at timestamptz(3),
    version integer NOT NULL DEFAULT '1',
    CONSTRAINT uq_rounds_application_id_ordinal UNIQUE (application_id, ordinal),
    CONSTRAINT ck_rounds_reviewer CHECK (state NOT IN ('in-review', 'returned') OR reviewer_id IS NOT NULL),
    CONSTRAINT ck_rounds_state CHECK (state IN ('draft', 'filed', 'in-review', 'returned', 'accepted', 'declined', 'withdrawn')),
    CONSTRAINT ck_rounds_kind CHECK (kind IN ('first', 'amendment')),
    CONSTRAINT pk_rounds_id PRIMARY KEY (id)
  )
  `,
  `CREATE INDEX ix_rounds_org_id ON rounds (org_id)`,
  `CREATE INDEX ix_rounds_state ON rounds (state)`,
  `CREATE INDEX ix_rounds_reviewer_id ON rounds (reviewer_id)`,
  `CREATE UNIQUE INDEX ux_rounds_one_open ON rounds (application_id) WHERE state IN ('draft', 'filed', 'in-review', 'returned')`,
  `
  CREATE TABLE draft_lines (
    id uuid NOT NULL DEFAULT gen_random_uuid(),
    org_id uuid NOT NULL,
    round_id uuid NOT NULL,
    line_key text NOT NULL,
    ordinal integer NOT NULL,
    body jsonb NOT NULL,
    as_typed jsonb NOT NULL DEFAULT '{}',
    updated_at timestamptz(3) NOT NULL DEFAULT now(),
    updated_by uuid NOT NULL,
    version integer NOT NULL DEFAULT '1',
    CONSTRAINT uq_draft_lines_round_id_line_key UNIQUE (round_id, line_key),
    CONSTRAINT ck_draft_lines_line_key CHECK (line_key ~ '^L[1-9][0-9]{0,3}$'),
    CONSTRAINT pk_draft_lines_id PRIMARY KEY (id)
  )
  `,
  `CREATE INDEX ix_draft_lines_org_id ON draft_lines (org_id)`,
];
