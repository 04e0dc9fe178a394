import type { Environment } from './environment';

export interface Config {
  port: number;
  /** As the owner, who migrates; the serving roles' addresses follow from it. */
  databaseUrl: string;
  /** None: the local mail server on loopback takes the mail. */
  smtpUrl: string | null;
  sessionSecret: string;
  publicUrl: URL;
  /** Whether cookies are Secure and carry the __Host- prefix. */
  secure: boolean;
  demo: boolean;
  /** Whether the owner's people need a second factor to sign in. */
  totpRequired: boolean;
  logLevel: string;
}

/** Everything that is wrong with the environment, at once. */
export class ConfigError extends Error {
  constructor(readonly faults: readonly string[]) {
    super(`The configuration cannot be used:\n${faults.map((fault) => `  - ${fault}`).join('\n')}`);
    this.name = 'ConfigError';
  }
}

const LEVELS = ['fatal', 'error', 'warn', 'info', 'debug', 'trace', 'silent'];
// What stands in documents and examples; known to everybody who can read them.
const EXAMPLE_SECRETS = /^(secret|change-?me|changeit|example|test|keyboard cat|your-?secret)/i;

const isLoopback = ({ hostname }: URL) =>
  hostname === 'localhost' || hostname === '[::1]' || /^127\.\d+\.\d+\.\d+$/.test(hostname);

class Reader {
  readonly faults: string[] = [];

  port(name: string, text: string | undefined, fallback: number): number {
    if (text === undefined) return fallback;
    const value = /^\d{1,5}$/.test(text) ? Number(text) : NaN;
    if (value >= 1 && value <= 65535) return value;
    this.faults.push(`${name} must be a port from 1 to 65535, not "${text}"`);
    return fallback;
  }

  url(name: string, text: string, protocols: readonly string[]): URL | null {
    const url = URL.canParse(text) ? new URL(text) : null;
    if (url && protocols.includes(url.protocol)) return url;
    // The value itself may hold a password.
    this.faults.push(
      `${name} must be an address that begins with ${protocols.map((p) => `${p}//`).join(' or ')}`,
    );
    return null;
  }

  onOff(name: string, text: string | undefined, fallback: boolean): boolean {
    if (text === undefined) return fallback;
    if (['on', 'true', '1'].includes(text)) return true;
    if (['off', 'false', '0'].includes(text)) return false;
    this.faults.push(`${name} must be on or off, not "${text}"`);
    return fallback;
  }

  level(text: string | undefined): string {
    if (text === undefined || LEVELS.includes(text)) return text ?? 'info';
    this.faults.push(`LOG_LEVEL must be one of ${LEVELS.join(', ')}, not "${text}"`);
    return 'info';
  }

  secret(text: string | undefined): string {
    if (text === undefined) this.faults.push('SESSION_SECRET is missing: at least 32 random characters');
    else if (text.length < 32) this.faults.push('SESSION_SECRET is too short: at least 32 random characters');
    return text ?? '';
  }
}

function publicFaults(secret: string, demo: boolean, publicUrl: URL): string[] {
  if (isLoopback(publicUrl)) return [];
  const faults: string[] = [];
  if (publicUrl.protocol !== 'https:')
    faults.push('PUBLIC_URL must begin with https:// where it is not loopback');
  if (secret !== '' && (EXAMPLE_SECRETS.test(secret) || new Set(secret).size < 10)) {
    faults.push('SESSION_SECRET is an example or too regular: make a random one for a public address');
  }
  if (demo)
    faults.push('DEMO must be off where PUBLIC_URL is not loopback: its accounts are known to everybody');
  return faults;
}

/** The configuration, or an error that names every fault at once. */
export function makeConfig(environment: Environment): Config {
  const reader = new Reader();
  const port = reader.port('PORT', environment.port, 8080);
  const database = reader.url('DATABASE_URL', environment.databaseUrl ?? '', ['postgres:', 'postgresql:']);
  const local = `http://127.0.0.1:${port}`;
  const publicUrl =
    reader.url('PUBLIC_URL', environment.publicUrl ?? local, ['http:', 'https:']) ?? new URL(local);
  const smtpUrl = environment.smtpUrl
    ? reader.url('SMTP_URL', environment.smtpUrl, ['smtp:', 'smtps:'])
    : null;
  const demo = reader.onOff('DEMO', environment.demo, isLoopback(publicUrl));
  const demoTotp = reader.onOff('DEMO_TOTP', environment.demoTotp, false);
  const sessionSecret = reader.secret(environment.sessionSecret);
  const logLevel = reader.level(environment.logLevel);
  const faults = [...reader.faults, ...publicFaults(sessionSecret, demo, publicUrl)];
  if (faults.length > 0) throw new ConfigError(faults);
  return {
    port,
    databaseUrl: database?.href ?? '',
    smtpUrl: smtpUrl?.href ?? null,
    sessionSecret,
    publicUrl,
    secure: publicUrl.protocol === 'https:',
    demo,
    totpRequired: !demo || demoTotp,
    logLevel,
  };
}
