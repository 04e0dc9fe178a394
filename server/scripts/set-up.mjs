// What a bare checkout needs before anything can run: packages, secrets, a database. Plain Node.
import { spawnSync } from 'node:child_process';
import { createHash, randomBytes } from 'node:crypto';
import { existsSync, mkdirSync, readFileSync, writeFileSync } from 'node:fs';
import { dirname, join, resolve } from 'node:path';
import { fileURLToPath } from 'node:url';

export const ROOT = resolve(dirname(fileURLToPath(import.meta.url)), '../..');
const read = (file) => (existsSync(file) ? readFileSync(file, 'utf8') : '');

/** A fingerprint of what npm ci would install. */
export function lockStamp() {
  const files = ['package-lock.json', 'package.json'].map((name) => read(join(ROOT, name)));
  return createHash('sha256').update(files.join('\0')).digest('hex');
}

const packagesOf = (file) => JSON.parse(read(file) || '{}').packages ?? {};

/** Whether node_modules holds what the lock file names; npm keeps its own list of what it installed. */
function packagesAreCurrent() {
  const installed = packagesOf(join(ROOT, 'node_modules/.package-lock.json'));
  const wanted = Object.entries(packagesOf(join(ROOT, 'package-lock.json')));
  return wanted.every(
    // Optional ones are for other systems, most of them.
    ([path, { version, optional }]) => path === '' || optional || installed[path]?.version === version,
  );
}

/** Runs npm ci when the installed packages are not those of the lock file. */
export function installPackages(say) {
  if (packagesAreCurrent()) return;
  say('installing packages (npm ci); the first time takes a minute');
  const npm = process.env.npm_execpath ? [process.execPath, process.env.npm_execpath] : ['npm'];
  const result = spawnSync(npm[0], [...npm.slice(1), 'ci', '--no-audit', '--no-fund'], {
    cwd: ROOT,
    // Standard output belongs to the answer of the command that called.
    stdio: ['ignore', 2, 2],
  });
  if (result.status !== 0) process.exit(result.status ?? 1);
}

/** A secret of this checkout's own, made once. */
export function localSecret() {
  const file = join(ROOT, '.data/session-secret');
  if (!existsSync(file)) {
    mkdirSync(dirname(file), { recursive: true });
    writeFileSync(file, randomBytes(48).toString('base64url'), { mode: 0o600, flag: 'wx' });
  }
  return readFileSync(file, 'utf8');
}

/** Makes the database when the cluster does not have it yet. The name is our own constant. */
export async function ensureDatabase(ownerUrl, name) {
  const { default: pg } = await import('pg');
  const client = new pg.Client({ connectionString: ownerUrl });
  await client.connect();
  try {
    const { rowCount } = await client.query('SELECT 1 FROM pg_database WHERE datname = $1', [name]);
    if (rowCount === 0) await client.query(`CREATE DATABASE ${name}`);
  } finally {
    await client.end();
  }
}
