/** Rows that are added once and never changed, by nobody. */
export const APPEND_ONLY_TABLES = [
  'line_versions',
  'revisions',
  'revision_lines',
  'findings',
  'run_values',
  'letters',
  'letter_discrepancies',
  'discrepancy_entries',
  'decisions',
  'audit_events',
] as const;

/** Parts of a rule set: free while it is a draft, fixed once it is published. */
const RULE_TABLES = ['voltage_classes', 'bands', 'tolerances', 'uncertainties', 'settings'] as const;

const REFUSE_CHANGE = `
  CREATE FUNCTION refuse_change() RETURNS trigger LANGUAGE plpgsql AS $$
  BEGIN
    RAISE EXCEPTION 'rows of % are only ever added', TG_TABLE_NAME USING ERRCODE = 'restrict_violation';
  END $$`;

const KEEP_PUBLISHED_PARTS = `
  CREATE FUNCTION keep_published_parts() RETURNS trigger LANGUAGE plpgsql AS $$
  DECLARE
    part record;
  BEGIN
    IF TG_OP = 'DELETE' THEN part := OLD; ELSE part := NEW; END IF;
    IF EXISTS (SELECT 1 FROM rule_sets WHERE id = part.rule_set_id AND status = 'published')
      OR (TG_OP = 'UPDATE' AND NEW.rule_set_id <> OLD.rule_set_id) THEN
      RAISE EXCEPTION 'a published rule set never changes' USING ERRCODE = 'restrict_violation';
    END IF;
    RETURN part;
  END $$`;

const KEEP_PUBLISHED_SET = `
  CREATE FUNCTION keep_published_set() RETURNS trigger LANGUAGE plpgsql AS $$
  BEGIN
    IF OLD.status = 'published' THEN
      RAISE EXCEPTION 'a published rule set never changes' USING ERRCODE = 'restrict_violation';
    END IF;
    IF TG_OP = 'DELETE' THEN RETURN OLD; END IF;
    RETURN NEW;
  END $$`;

// ENABLE ALWAYS: an ordinary trigger is by-passed with session_replication_role = replica.
const trigger = (table: string, name: string, moment: string, call: string) => [
  `CREATE TRIGGER ${name} ${moment} ON ${table} ${call}`,
  `ALTER TABLE ${table} ENABLE ALWAYS TRIGGER ${name}`,
];

const appendOnly = (table: string) => [
  ...trigger(
    table,
    `${table}_added_only`,
    'BEFORE UPDATE OR DELETE',
    'FOR EACH ROW EXECUTE FUNCTION refuse_change()',
  ),
  ...trigger(
    table,
    `${table}_not_emptied`,
    'BEFORE TRUNCATE',
    'FOR EACH STATEMENT EXECUTE FUNCTION refuse_change()',
  ),
];

export const PROTECTIONS: readonly string[] = [
  REFUSE_CHANGE,
  KEEP_PUBLISHED_PARTS,
  KEEP_PUBLISHED_SET,
  ...APPEND_ONLY_TABLES.flatMap(appendOnly),
  ...RULE_TABLES.flatMap((table) =>
    trigger(
      table,
      `${table}_published`,
      'BEFORE INSERT OR UPDATE OR DELETE',
      'FOR EACH ROW EXECUTE FUNCTION keep_published_parts()',
    ),
  ),
  ...trigger(
    'rule_sets',
    'rule_sets_published',
    'BEFORE UPDATE OR DELETE',
    'FOR EACH ROW EXECUTE FUNCTION keep_published_set()',
  ),
];
