export const PEOPLE_TABLES: readonly string[] = [
  `
  CREATE TABLE organisations (
    id uuid NOT NULL DEFAULT gen_random_uuid(),
    name text NOT NULL,
    kind text NOT NULL,
    disabled boolean NOT NULL DEFAULT false,
    created_at timestamptz(3) NOT NULL DEFAULT now(),
    CONSTRAINT ck_organisations_kind CHECK (kind IN ('owner', 'applicant')),
    CONSTRAINT pk_organisations_id PRIMARY KEY (id)
  )
  `,
  `CREATE UNIQUE INDEX ix_organisations_name ON organisations (name)`,
  `
  CREATE TABLE users (
    id uuid NOT NULL DEFAULT gen_random_uuid(),
    email text NOT NULL,
    email_key text NOT NULL,
    display_name text NOT NULL,
    password_hash text,
    status text NOT NULL DEFAULT 'active',
    created_at timestamptz(3) NOT NULL DEFAULT now(),
    last_sign_in_at timestamptz(3),
    CONSTRAINT ck_users_status CHECK (status IN ('active', 'disabled')),
    CONSTRAINT pk_users_id PRIMARY KEY (id)
  )
  `,
  `CREATE UNIQUE INDEX ix_users_email_key ON users (email_key)`,
  `
  CREATE TABLE memberships (
    id uuid NOT NULL DEFAULT gen_random_uuid(),
    user_id uuid NOT NULL,
    org_id uuid NOT NULL,
    role text NOT NULL,
    created_at timestamptz(3) NOT NULL DEFAULT now(),
    CONSTRAINT uq_memberships_user_id_org_id UNIQUE (user_id, org_id),
    CONSTRAINT ck_memberships_role CHECK (role IN ('applicant', 'reviewer', 'administrator')),
    CONSTRAINT pk_memberships_id PRIMARY KEY (id)
  )
  `,
  `CREATE INDEX ix_memberships_org_id ON memberships (org_id)`,
  `
  CREATE TABLE reviewer_bars (
    id uuid NOT NULL DEFAULT gen_random_uuid(),
    user_id uuid NOT NULL,
    org_id uuid NOT NULL,
    reason text NOT NULL,
    created_at timestamptz(3) NOT NULL DEFAULT now(),
    CONSTRAINT uq_reviewer_bars_user_id_org_id UNIQUE (user_id, org_id),
    CONSTRAINT pk_reviewer_bars_id PRIMARY KEY (id)
  )
  `,
  `
  CREATE TABLE sessions (
    sid text NOT NULL,
    sess json NOT NULL,
    expire timestamptz(3) NOT NULL,
    CONSTRAINT pk_sessions_sid PRIMARY KEY (sid)
  )
  `,
  `CREATE INDEX ix_sessions_expire ON sessions (expire)`,
  `
  CREATE TABLE invitations (
    id uuid NOT NULL DEFAULT gen_random_uuid(),
    org_id uuid,
    email text NOT NULL,
    display_name text NOT NULL,
    asked_organisation text,
    message text,
    role text NOT NULL DEFAULT 'applicant',
    status text NOT NULL,
    token_hash text,
    expires_at timestamptz(3),
    decided_by uuid,
    created_at timestamptz(3) NOT NULL DEFAULT now(),
    decided_at timestamptz(3),
    CONSTRAINT ck_invitations_status CHECK (status IN ('asked', 'sent', 'accepted', 'refused', 'revoked')),
    CONSTRAINT pk_invitations_id PRIMARY KEY (id)
  )
  `,
  `CREATE INDEX ix_invitations_org_id ON invitations (org_id)`,
  `CREATE UNIQUE INDEX ix_invitations_token_hash ON invitations (token_hash)`,
  `
  CREATE TABLE password_resets (
    id uuid NOT NULL DEFAULT gen_random_uuid(),
    user_id uuid NOT NULL,
    token_hash text NOT NULL,
    expires_at timestamptz(3) NOT NULL,
    used_at timestamptz(3),
    CONSTRAINT pk_password_resets_id PRIMARY KEY (id)
  )
  `,
  `CREATE INDEX ix_password_resets_user_id ON password_resets (user_id)`,
  `CREATE UNIQUE INDEX ix_password_resets_token_hash ON password_resets (token_hash)`,
  `
  CREATE TABLE second_factors (
    user_id uuid NOT NULL,
    sealed_secret text NOT NULL,
    confirmed_at timestamptz(3),
    last_step integer NOT NULL DEFAULT '0',
    CONSTRAINT pk_second_factors_user_id PRIMARY KEY (user_id)
  )
  `,
  `
  CREATE TABLE api_keys (
    id uuid NOT NULL DEFAULT gen_random_uuid(),
    user_id uuid NOT NULL,
    org_id uuid NOT NULL,
    name text NOT NULL,
    hash text NOT NULL,
    created_at timestamptz(3) NOT NULL DEFAULT now(),
    last_used_at timestamptz(3),
    revoked_at timestamptz(3),
    CONSTRAINT pk_api_keys_id PRIMARY KEY (id)
  )
  `,
  `CREATE INDEX ix_api_keys_org_id ON api_keys (org_id)`,
  `CREATE UNIQUE INDEX ix_api_keys_hash ON api_keys (hash)`,
  `
  CREATE TABLE rate_limits (
    key character varying(255) NOT NULL,
    points integer NOT NULL DEFAULT '0',
    expire bigint,
    CONSTRAINT pk_rate_limits_key PRIMARY KEY (key)
  )
  `,
];
