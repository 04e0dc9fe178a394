import { ORGANISATION_TABLES, OWNER_ONLY_TABLES } from './row-security';
import { APPEND_ONLY_TABLES } from './protections';
import { WEB_ROLE, WORKER_ROLE } from '../../role-names';

const OTHER_TABLES = [
  'organisations',
  'users',
  'sessions',
  'second_factors',
  'password_resets',
  'rate_limits',
  'rule_sets',
  'voltage_classes',
  'bands',
  'tolerances',
  'uncertainties',
  'settings',
  'conductors',
  'conductor_versions',
  'mail_preferences',
  'mail_room',
  'calendars',
  'holidays',
  'idempotency_keys',
];

/** What may be deleted at all; everything else stays for the record. */
const DELETABLE_TABLES = [
  'sessions',
  'rate_limits',
  'memberships',
  'reviewer_bars',
  'second_factors',
  'draft_lines',
  // A draft that is thrown away; the trigger keeps what was published.
  'rule_sets',
  'voltage_classes',
  'bands',
  'tolerances',
  'uncertainties',
  'settings',
  'import_rows',
  'attachment_links',
  'mail_preferences',
  'idempotency_keys',
];

const everyTable = [...ORGANISATION_TABLES, ...OWNER_ONLY_TABLES, ...OTHER_TABLES];
const changeable = everyTable.filter((table) => !APPEND_ONLY_TABLES.some((fixed) => fixed === table));
const servers = `${WEB_ROLE}, ${WORKER_ROLE}`;

/** The web and the worker role own nothing and may do only what stands here. */
export const GRANTS: readonly string[] = [
  'REVOKE ALL ON SCHEMA public FROM PUBLIC',
  `GRANT USAGE ON SCHEMA public TO ${servers}`,
  `GRANT SELECT, INSERT ON ${everyTable.join(', ')} TO ${servers}`,
  `GRANT UPDATE ON ${changeable.join(', ')} TO ${servers}`,
  `GRANT DELETE ON ${DELETABLE_TABLES.join(', ')} TO ${servers}`,
  `GRANT SELECT ON migrations TO ${servers}`,
];
