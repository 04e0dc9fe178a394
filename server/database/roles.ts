import { createHmac } from 'node:crypto';
import type { QueryRunner } from 'typeorm';
import { WEB_ROLE, WORKER_ROLE } from './role-names';

export type ServerRole = 'web' | 'worker';

const NAMES: Record<ServerRole, string> = { web: WEB_ROLE, worker: WORKER_ROLE };

/** A role's password follows from the server's secret: every node with that secret knows it, no file holds it. */
export function rolePassword(secret: string, role: ServerRole): string {
  return createHmac('sha256', secret).update(`database role ${role}`).digest('base64url');
}

/** The owner's connection address turned into that of a serving role. */
export function roleUrl(ownerUrl: string, secret: string, role: ServerRole): string {
  const url = new URL(ownerUrl);
  url.username = NAMES[role];
  url.password = rolePassword(secret, role);
  return url.href;
}

async function roleExists(runner: QueryRunner, name: string): Promise<boolean> {
  const rows: unknown[] = await runner.query('SELECT 1 FROM pg_roles WHERE rolname = $1', [name]);
  return rows.length > 0;
}

/** Makes both roles where they are missing and gives them their present passwords. */
export async function ensureRoles(runner: QueryRunner, secret: string): Promise<void> {
  for (const role of ['web', 'worker'] as const) {
    const name = NAMES[role];
    const verb = (await roleExists(runner, name)) ? 'ALTER' : 'CREATE';
    // The password is base64url, and the name our own constant: neither can end the statement early.
    const password = rolePassword(secret, role);
    try {
      await runner.query(`${verb} ROLE ${name} LOGIN NOINHERIT PASSWORD '${password}'`);
    } catch (error) {
      throw new Error(
        `the user of DATABASE_URL may not ${verb.toLowerCase()} the role ${name}; give it CREATEROLE`,
        { cause: error },
      );
    }
  }
}
