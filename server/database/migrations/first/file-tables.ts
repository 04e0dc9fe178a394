export const FILE_TABLES: readonly string[] = [
  `
  CREATE TABLE attachments (
    id uuid NOT NULL DEFAULT gen_random_uuid(),
    org_id uuid NOT NULL,
    sha256 text NOT NULL,
    name text NOT NULL,
    media_type text NOT NULL,
    byte_length integer NOT NULL,
    scan text NOT NULL DEFAULT 'pending',
    uploaded_by uuid NOT NULL,
    uploaded_at timestamptz(3) NOT NULL,
    CONSTRAINT ck_attachments_scan CHECK (scan IN ('pending', 'clean', 'refused')),
    CONSTRAINT ck_attachments_size CHECK (byte_length > 0 AND byte_length <= 20971520),
    CONSTRAINT pk_attachments_id PRIMARY KEY (id)
  )
  `,
  `CREATE INDEX ix_attachments_org_id ON attachments (org_id)`,
  `
  CREATE TABLE attachment_chunks (
    attachment_id uuid NOT NULL,
    ordinal integer NOT NULL,
    org_id uuid NOT NULL,
    bytes bytea NOT NULL,
    CONSTRAINT pk_attachment_chunks_attachment_id_ordinal PRIMARY KEY (attachment_id, ordinal)
  )
  `,
  `CREATE INDEX ix_attachment_chunks_org_id ON attachment_chunks (org_id)`,
  `
  CREATE TABLE attachment_links (
    id uuid NOT NULL DEFAULT gen_random_uuid(),
    org_id uuid NOT NULL,
    attachment_id uuid NOT NULL,
    application_id uuid NOT NULL,
    subject text NOT NULL,
    line_key text,
    discrepancy_id uuid,
    linked_at timestamptz(3) NOT NULL,
    CONSTRAINT ck_attachment_links_discrepancy CHECK ((subject = 'discrepancy') = (discrepancy_id IS NOT NULL)),
    CONSTRAINT ck_attachment_links_line CHECK ((subject = 'line') = (line_key IS NOT NULL)),
    CONSTRAINT ck_attachment_links_subject CHECK (subject IN ('application', 'line', 'discrepancy')),
    CONSTRAINT pk_attachment_links_id PRIMARY KEY (id)
  )
  `,
  `CREATE INDEX ix_attachment_links_org_id ON attachment_links (org_id)`,
  `CREATE INDEX ix_attachment_links_attachment_id ON attachment_links (attachment_id)`,
  `CREATE INDEX ix_attachment_links_application_id ON attachment_links (application_id)`,
  `
  CREATE TABLE imports (
    id uuid NOT NULL DEFAULT gen_random_uuid(),
    org_id uuid NOT NULL,
    application_id uuid NOT NULL,
    round_id uuid NOT NULL,
    state text NOT NULL,
    file_name text NOT NULL,
    file_sha256 text NOT NULL,
    dialect jsonb NOT NULL,
    faults jsonb NOT NULL DEFAULT '[]',
    notices jsonb NOT NULL DEFAULT '[]',
    row_count integer NOT NULL DEFAULT '0',
    line_count integer NOT NULL DEFAULT '0',
    created_by uuid NOT NULL,
    created_at timestamptz(3) NOT NULL,
    imported_at timestamptz(3),
    version integer NOT NULL DEFAULT '1',
    CONSTRAINT ck_imports_state CHECK (state IN ('staged', 'imported', 'refused')),
    CONSTRAINT pk_imports_id PRIMARY KEY (id)
  )
  `,
  `CREATE INDEX ix_imports_org_id ON imports (org_id)`,
  `CREATE INDEX ix_imports_application_id ON imports (application_id)`,
  `
  CREATE TABLE import_rows (
    import_id uuid NOT NULL,
    ordinal integer NOT NULL,
    org_id uuid NOT NULL,
    row integer,
    body jsonb NOT NULL,
    faults jsonb NOT NULL DEFAULT '[]',
    CONSTRAINT pk_import_rows_import_id_ordinal PRIMARY KEY (import_id, ordinal)
  )
  `,
  `CREATE INDEX ix_import_rows_org_id ON import_rows (org_id)`,
  `
  CREATE TABLE idempotency_keys (
    user_id uuid NOT NULL,
    key text NOT NULL,
    operation_id text NOT NULL,
    request_hash text NOT NULL,
    status integer,
    answer json,
    created_at timestamptz(3) NOT NULL DEFAULT now(),
    CONSTRAINT pk_idempotency_keys_user_id_key PRIMARY KEY (user_id, key)
  )
  `,
  `CREATE INDEX ix_idempotency_keys_created_at ON idempotency_keys (created_at)`,
];
