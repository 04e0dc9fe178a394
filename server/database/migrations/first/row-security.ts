/** Every table of an organisation's own; its rows are seen by that organisation and by the owner's people. */
export const ORGANISATION_TABLES = [
  'memberships',
  'invitations',
  'api_keys',
  'applications',
  'rounds',
  'draft_lines',
  'line_versions',
  'revisions',
  'revision_lines',
  'check_runs',
  'run_values',
  'findings',
  'dispositions',
  'countersigns',
  'discrepancies',
  'discrepancy_findings',
  'discrepancy_entries',
  'decisions',
  'letters',
  'letter_discrepancies',
  'outbox',
  'windows',
  'attachments',
  'attachment_chunks',
  'attachment_links',
  'imports',
  'import_rows',
  'audit_events',
] as const;

/** Tables about an applicant that the applicant never sees. */
export const OWNER_ONLY_TABLES = ['notes', 'reviewer_bars'] as const;

// Settings of the transaction (SET LOCAL). Without them current_setting gives null, and null lets nothing through.
const OWNERS_PEOPLE = `(SELECT current_setting('app.role', true)) IN ('reviewer', 'administrator', 'system')`;
const OWN_ORGANISATION = `org_id = (SELECT nullif(current_setting('app.org_id', true), '')::uuid)`;
const OWN_USER = `user_id = (SELECT nullif(current_setting('app.user_id', true), '')::uuid)`;
const SYSTEM = `(SELECT current_setting('app.role', true)) = 'system'`;

const policy = (table: string, rule: string) => [
  `ALTER TABLE ${table} ENABLE ROW LEVEL SECURITY`,
  `CREATE POLICY ${table}_wall ON ${table} USING (${rule}) WITH CHECK (${rule})`,
];

/** The second wall behind the where-clauses of the abilities. */
export const ROW_SECURITY: readonly string[] = [
  ...ORGANISATION_TABLES.flatMap((table) => policy(table, `${OWNERS_PEOPLE} OR ${OWN_ORGANISATION}`)),
  ...OWNER_ONLY_TABLES.flatMap((table) => policy(table, OWNERS_PEOPLE)),
  ...policy('idempotency_keys', `${SYSTEM} OR ${OWN_USER}`),
];
