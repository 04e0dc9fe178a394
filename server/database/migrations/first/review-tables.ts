export const REVIEW_TABLES: readonly string[] = [
  `
  CREATE TABLE dispositions (
    id uuid NOT NULL DEFAULT gen_random_uuid(),
    org_id uuid NOT NULL,
    revision_id uuid NOT NULL,
    line_key text NOT NULL,
    fingerprint text NOT NULL,
    kind text NOT NULL,
    reason text NOT NULL,
    decided_by uuid NOT NULL,
    decided_at timestamptz(3) NOT NULL,
    countersign_id uuid,
    discrepancy_id uuid,
    carried_from uuid,
    revoked_at timestamptz(3),
    CONSTRAINT ck_dispositions_kind CHECK (kind IN ('settled', 'waived', 'set-aside')),
    CONSTRAINT pk_dispositions_id PRIMARY KEY (id)
  )
  `,
  `CREATE INDEX ix_dispositions_org_id ON dispositions (org_id)`,
  `CREATE UNIQUE INDEX ux_dispositions_standing ON dispositions (revision_id, line_key, fingerprint) WHERE revoked_at IS NULL`,
  `
  CREATE TABLE countersigns (
    id uuid NOT NULL DEFAULT gen_random_uuid(),
    org_id uuid NOT NULL,
    application_id uuid NOT NULL,
    revision_id uuid NOT NULL,
    subject text NOT NULL,
    proposal jsonb NOT NULL,
    reason text NOT NULL,
    proposed_by uuid NOT NULL,
    proposed_at timestamptz(3) NOT NULL,
    outcome text NOT NULL DEFAULT 'pending',
    decided_by uuid,
    decided_at timestamptz(3),
    remark text,
    version integer NOT NULL DEFAULT '1',
    CONSTRAINT ck_countersigns_decided CHECK ((outcome = 'pending') = (decided_by IS NULL)),
    CONSTRAINT ck_countersigns_other_person CHECK (decided_by IS NULL OR decided_by <> proposed_by),
    CONSTRAINT ck_countersigns_outcome CHECK (outcome IN ('pending', 'granted', 'refused')),
    CONSTRAINT ck_countersigns_subject CHECK (subject IN ('waive', 'decline')),
    CONSTRAINT pk_countersigns_id PRIMARY KEY (id)
  )
  `,
  `CREATE INDEX ix_countersigns_org_id ON countersigns (org_id)`,
  `CREATE INDEX ix_countersigns_application_id ON countersigns (application_id)`,
  `
  CREATE TABLE discrepancies (
    id uuid NOT NULL DEFAULT gen_random_uuid(),
    org_id uuid NOT NULL,
    application_id uuid NOT NULL,
    round_id uuid NOT NULL,
    number integer NOT NULL,
    state text NOT NULL,
    title text NOT NULL,
    questioned text NOT NULL,
    would_settle text,
    line_keys text array NOT NULL DEFAULT '{}',
    answered_by text,
    draft_answer text,
    raised_on_revision_id uuid NOT NULL,
    raised_by uuid NOT NULL,
    raised_at timestamptz(3) NOT NULL,
    version integer NOT NULL DEFAULT '1',
    CONSTRAINT uq_discrepancies_application_id_number UNIQUE (application_id, number),
    CONSTRAINT ck_discrepancies_answered_by CHECK (answered_by IS NULL OR answered_by IN ('change', 'explanation')),
    CONSTRAINT ck_discrepancies_state CHECK (state IN ('open', 'answered', 'settled', 'waived')),
    CONSTRAINT pk_discrepancies_id PRIMARY KEY (id)
  )
  `,
  `CREATE INDEX ix_discrepancies_org_id ON discrepancies (org_id)`,
  `CREATE INDEX ix_discrepancies_round_id ON discrepancies (round_id)`,
  `
  CREATE TABLE discrepancy_findings (
    discrepancy_id uuid NOT NULL,
    finding_id uuid NOT NULL,
    org_id uuid NOT NULL,
    line_key text NOT NULL,
    fingerprint text NOT NULL,
    CONSTRAINT pk_discrepancy_findings_discrepancy_id_finding_id PRIMARY KEY (discrepancy_id, finding_id)
  )
  `,
  `CREATE INDEX ix_discrepancy_findings_org_id ON discrepancy_findings (org_id)`,
  `
  CREATE TABLE discrepancy_entries (
    id uuid NOT NULL DEFAULT gen_random_uuid(),
    org_id uuid NOT NULL,
    discrepancy_id uuid NOT NULL,
    ordinal integer NOT NULL,
    kind text NOT NULL,
    text text NOT NULL,
    revision_id uuid,
    written_by uuid NOT NULL,
    written_at timestamptz(3) NOT NULL,
    CONSTRAINT uq_discrepancy_entries_discrepancy_id_ordinal UNIQUE (discrepancy_id, ordinal),
    CONSTRAINT ck_discrepancy_entries_kind CHECK (kind IN ('raised', 'answered', 'commented', 'settled', 'reopened', 'waived')),
    CONSTRAINT pk_discrepancy_entries_id PRIMARY KEY (id)
  )
  `,
  `CREATE INDEX ix_discrepancy_entries_org_id ON discrepancy_entries (org_id)`,
  `
  CREATE TABLE decisions (
    id uuid NOT NULL DEFAULT gen_random_uuid(),
    org_id uuid NOT NULL,
    application_id uuid NOT NULL,
    round_id uuid NOT NULL,
    revision_id uuid NOT NULL,
    kind text NOT NULL,
    reason text NOT NULL,
    conditions jsonb NOT NULL DEFAULT '[]',
    countersign_id uuid,
    record_hash text NOT NULL,
    decided_by uuid NOT NULL,
    decided_at timestamptz(3) NOT NULL,
    CONSTRAINT ck_decisions_kind CHECK (kind IN ('accepted', 'declined')),
    CONSTRAINT pk_decisions_id PRIMARY KEY (id)
  )
  `,
  `CREATE INDEX ix_decisions_org_id ON decisions (org_id)`,
  `CREATE INDEX ix_decisions_application_id ON decisions (application_id)`,
  `CREATE UNIQUE INDEX ix_decisions_round_id ON decisions (round_id)`,
  `
  CREATE TABLE notes (
    id uuid NOT NULL DEFAULT gen_random_uuid(),
    org_id uuid NOT NULL,
    application_id uuid NOT NULL,
    text text NOT NULL,
    written_by uuid NOT NULL,
    written_at timestamptz(3) NOT NULL,
    CONSTRAINT pk_notes_id PRIMARY KEY (id)
  )
  `,
  `CREATE INDEX ix_notes_org_id ON notes (org_id)`,
  `CREATE INDEX ix_notes_application_id ON notes (application_id)`,
];
