export const RECORD_TABLES: readonly string[] = [
  `
  CREATE TABLE audit_events (
    seq bigint NOT NULL,
    org_id uuid,
    application_id uuid,
    actor_id uuid,
    actor_role text NOT NULL,
    actor_name text NOT NULL,
    act text NOT NULL,
    before jsonb,
    after jsonb,
    at timestamptz(3) NOT NULL,
    prev_hash text NOT NULL,
    hash text NOT NULL,
    CONSTRAINT pk_audit_events_seq PRIMARY KEY (seq)
  )
  `,
  `CREATE INDEX ix_audit_events_org_id ON audit_events (org_id)`,
  `CREATE INDEX ix_audit_events_application_id ON audit_events (application_id)`,
  `CREATE INDEX ix_audit_events_actor_id ON audit_events (actor_id)`,
  `CREATE INDEX ix_audit_events_act ON audit_events (act)`,
  `CREATE UNIQUE INDEX ix_audit_events_hash ON audit_events (hash)`,
];
