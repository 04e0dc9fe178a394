import { describe, expect, it } from 'vitest';
import { ConfigError, makeConfig } from '#server/config/config';
import { readEnvironment } from '#server/config/environment';
import type { Environment } from '#server/config/environment';

const good: Environment = {
  databaseUrl: 'postgres://u:p@127.0.0.1:5432/d',
  sessionSecret: 'Zk3vQ9rT7yLx2mWc8bNd4fHg6jKp1sAe',
};
const publicly: Environment = { ...good, publicUrl: 'https://connect.example.org', demo: 'off' };

function faultsOf(environment: Environment): readonly string[] {
  try {
    makeConfig(environment);
  } catch (error) {
    if (error instanceof ConfigError) return error.faults;
    throw error;
  }
  return [];
}

describe('the configuration', () => {
  it('needs little on loopback, where the demo is on', () => {
    expect(makeConfig(good)).toMatchObject({
      port: 8080,
      demo: true,
      secure: false,
      smtpUrl: null,
      totpRequired: false,
    });
    expect(makeConfig(good).publicUrl.href).toBe('http://127.0.0.1:8080/');
  });

  it('names every fault at once', () => {
    const faults = faultsOf({
      port: '99999',
      databaseUrl: 'mysql://x',
      smtpUrl: 'http://mail',
      sessionSecret: 'short',
      publicUrl: 'ftp://x',
      demo: 'maybe',
      logLevel: 'loud',
    });
    for (const name of [
      'PORT',
      'DATABASE_URL',
      'SMTP_URL',
      'SESSION_SECRET',
      'PUBLIC_URL',
      'DEMO',
      'LOG_LEVEL',
    ]) {
      expect(
        faults.some((fault) => fault.startsWith(name)),
        name,
      ).toBe(true);
    }
    expect(faults).toHaveLength(7);
  });

  it('tells nothing of a password in an address that it refuses', () => {
    expect(faultsOf({ ...good, databaseUrl: 'mysql://u:hunter2@h/d' }).join()).not.toMatch(/hunter2/);
  });

  it('takes a public address without demo data and with a secret of its own', () => {
    expect(makeConfig(publicly)).toMatchObject({ demo: false, secure: true, totpRequired: true });
  });

  it.each([
    ['demo data', { ...publicly, demo: 'on' }, 'DEMO'],
    ['plain http', { ...publicly, publicUrl: 'http://connect.example.org' }, 'PUBLIC_URL'],
    ['an example secret', { ...publicly, sessionSecret: `change-me${'x'.repeat(40)}` }, 'SESSION_SECRET'],
    ['a secret of one letter', { ...publicly, sessionSecret: 'a'.repeat(64) }, 'SESSION_SECRET'],
    ['no secret', { ...publicly, sessionSecret: undefined }, 'SESSION_SECRET'],
  ])('refuses %s on a public address', (_name, environment, variable) => {
    expect(faultsOf(environment).map((fault) => fault.split(' ')[0])).toEqual([variable]);
  });

  it.each(['http://localhost:8080', 'http://127.0.0.1', 'http://127.8.9.1:99', 'http://[::1]:8080'])(
    'takes %s for loopback',
    (publicUrl) => {
      expect(makeConfig({ ...good, publicUrl, demo: 'on' }).demo).toBe(true);
    },
  );

  it.each(['http://127.0.0.1.example.org', 'http://localhost.example.org', 'http://10.0.0.1'])(
    'does not take %s for loopback',
    (publicUrl) => {
      expect(faultsOf({ ...good, publicUrl, demo: 'on' }).length).toBeGreaterThan(0);
    },
  );

  it('asks the demo for the second step only when told to', () => {
    expect(makeConfig({ ...good, demoTotp: 'on' }).totpRequired).toBe(true);
    expect(makeConfig({ ...good, demo: 'off' }).totpRequired).toBe(true);
  });

  it('reads the environment by name and takes an empty variable for none', () => {
    expect(readEnvironment(['PORT', 'DEMO'], { PORT: '', DEMO: 'off', SESSION_SECRET: 'x' })).toEqual({
      demo: 'off',
    });
  });
});
