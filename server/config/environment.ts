/** The names that configure the product; the environment is read here and nowhere else. */
const FIELDS = {
  PORT: 'port',
  DATABASE_URL: 'databaseUrl',
  SMTP_URL: 'smtpUrl',
  SESSION_SECRET: 'sessionSecret',
  PUBLIC_URL: 'publicUrl',
  DEMO: 'demo',
  DEMO_TOTP: 'demoTotp',
  LOG_LEVEL: 'logLevel',
} as const;

export type VariableName = keyof typeof FIELDS;
export type Environment = { [K in (typeof FIELDS)[VariableName]]?: string };

/** What is set of these variables; an empty one counts as not set. */
export function readEnvironment(
  names: readonly VariableName[] = Object.keys(FIELDS) as VariableName[],
  source: Record<string, string | undefined> = process.env,
): Environment {
  return Object.fromEntries(
    names.flatMap((name) => (source[name] ? [[FIELDS[name], source[name]]] : [])),
  ) as Environment;
}
