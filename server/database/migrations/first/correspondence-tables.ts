export const CORRESPONDENCE_TABLES: readonly string[] = [
  `
  CREATE TABLE letters (
    id uuid NOT NULL DEFAULT gen_random_uuid(),
    org_id uuid NOT NULL,
    application_id uuid NOT NULL,
    round_id uuid NOT NULL,
    number integer NOT NULL,
    kind text NOT NULL,
    revision_id uuid NOT NULL,
    subject text NOT NULL,
    media_type text NOT NULL,
    bytes bytea NOT NULL,
    sha256 text NOT NULL,
    due_at timestamptz(3),
    issued_by uuid,
    issued_at timestamptz(3) NOT NULL,
    CONSTRAINT uq_letters_application_id_number UNIQUE (application_id, number),
    CONSTRAINT ck_letters_kind CHECK (kind IN ('receipt', 'return', 'decision', 'notice')),
    CONSTRAINT pk_letters_id PRIMARY KEY (id)
  )
  `,
  `CREATE INDEX ix_letters_org_id ON letters (org_id)`,
  `
  CREATE TABLE letter_discrepancies (
    letter_id uuid NOT NULL,
    discrepancy_id uuid NOT NULL,
    org_id uuid NOT NULL,
    CONSTRAINT pk_letter_discrepancies_letter_id_discrepancy_id PRIMARY KEY (letter_id, discrepancy_id)
  )
  `,
  `CREATE INDEX ix_letter_discrepancies_org_id ON letter_discrepancies (org_id)`,
  `
  CREATE TABLE outbox (
    id uuid NOT NULL DEFAULT gen_random_uuid(),
    org_id uuid,
    kind text NOT NULL,
    cause_id text NOT NULL,
    recipient text NOT NULL,
    subject text NOT NULL,
    body text NOT NULL,
    letter_id uuid,
    status text NOT NULL DEFAULT 'waiting',
    attempts integer NOT NULL DEFAULT '0',
    next_attempt_at timestamptz(3) NOT NULL,
    created_at timestamptz(3) NOT NULL,
    sent_at timestamptz(3),
    last_error text,
    CONSTRAINT uq_outbox_kind_cause_id_recipient UNIQUE (kind, cause_id, recipient),
    CONSTRAINT ck_outbox_status CHECK (status IN ('waiting', 'sending', 'sent', 'failed')),
    CONSTRAINT pk_outbox_id PRIMARY KEY (id)
  )
  `,
  `CREATE INDEX ix_outbox_org_id ON outbox (org_id)`,
  `CREATE INDEX ix_outbox_due ON outbox (next_attempt_at) WHERE status IN ('waiting', 'sending')`,
  `
  CREATE TABLE mail_preferences (
    user_id uuid NOT NULL,
    kind text NOT NULL,
    wanted boolean NOT NULL,
    CONSTRAINT pk_mail_preferences_user_id_kind PRIMARY KEY (user_id, kind)
  )
  `,
  `
  CREATE TABLE mail_room (
    id uuid NOT NULL DEFAULT gen_random_uuid(),
    message_id text NOT NULL,
    sender text NOT NULL,
    recipient text NOT NULL,
    subject text NOT NULL,
    body text NOT NULL,
    attachments jsonb NOT NULL DEFAULT '[]',
    received_at timestamptz(3) NOT NULL DEFAULT now(),
    CONSTRAINT pk_mail_room_id PRIMARY KEY (id)
  )
  `,
  `CREATE INDEX ix_mail_room_received_at ON mail_room (received_at)`,
  `
  CREATE TABLE windows (
    id uuid NOT NULL DEFAULT gen_random_uuid(),
    org_id uuid NOT NULL,
    round_id uuid NOT NULL,
    kind text NOT NULL,
    opened_at timestamptz(3) NOT NULL,
    due_at timestamptz(3) NOT NULL,
    closed_at timestamptz(3),
    working_days integer NOT NULL,
    calendar_version integer NOT NULL,
    CONSTRAINT ck_windows_kind CHECK (kind IN ('take-up', 'review', 'cure', 'extension')),
    CONSTRAINT pk_windows_id PRIMARY KEY (id)
  )
  `,
  `CREATE INDEX ix_windows_org_id ON windows (org_id)`,
  `CREATE UNIQUE INDEX ux_windows_one_open ON windows (round_id, kind) WHERE closed_at IS NULL`,
  `
  CREATE TABLE calendars (
    id uuid NOT NULL DEFAULT gen_random_uuid(),
    version integer NOT NULL,
    time_zone text NOT NULL,
    weekend_days integer array NOT NULL,
    created_at timestamptz(3) NOT NULL DEFAULT now(),
    CONSTRAINT pk_calendars_id PRIMARY KEY (id)
  )
  `,
  `CREATE UNIQUE INDEX ix_calendars_version ON calendars (version)`,
  `
  CREATE TABLE holidays (
    calendar_id uuid NOT NULL,
    day date NOT NULL,
    name text NOT NULL,
    CONSTRAINT pk_holidays_calendar_id_day PRIMARY KEY (calendar_id, day)
  )
  `,
];
