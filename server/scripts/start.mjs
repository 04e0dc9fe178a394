// npm start: everything that a fresh checkout needs, then client and API on one port. Plain Node, no dependencies.
import { spawn, spawnSync } from 'node:child_process';
import { createHash } from 'node:crypto';
import { existsSync, mkdirSync, readdirSync, readFileSync, statSync, writeFileSync } from 'node:fs';
import { join } from 'node:path';
import { addressOf, connects, start, stop } from './postgres.mjs';
import { ensureDatabase, installPackages, localSecret, lockStamp, ROOT } from './set-up.mjs';

process.chdir(ROOT);
const begun = performance.now();
const say = (text) => console.error(`[${((performance.now() - begun) / 1000).toFixed(1)} s] ${text}`);
const read = (file) => (existsSync(file) ? readFileSync(file, 'utf8') : '');
const port = process.env.PORT || '8080';
const DATABASE = 'counterpoise';

/** Somebody else listens there: us, started before, or another program. */
async function refuseSecondStart() {
  if (!/^\d+$/.test(port) || !(await connects(Number(port)))) return;
  const live = await fetch(`http://127.0.0.1:${port}/api/health/live`).then(
    (answer) => answer.json(),
    () => null,
  );
  if (live?.status === 'live') console.error(`Counterpoise is running already: http://127.0.0.1:${port}`);
  else console.error(`Port ${port} of this machine is in use by another program. Set PORT to a free one.`);
  process.exit(1);
}

const SOURCES = ['src', 'server', 'shared', 'schemas', 'public'];
const SOURCE_FILES = ['index.html', 'vite.config.ts', 'tailwind.config.ts', 'tsconfig.json'];

/** A fingerprint of everything that a build is made from. */
function sourceStamp() {
  const hash = createHash('sha256').update(lockStamp());
  const inFolders = SOURCES.filter((folder) => existsSync(folder)).flatMap((folder) =>
    readdirSync(folder, { recursive: true }).map((name) => join(folder, name)),
  );
  for (const file of [...inFolders, ...SOURCE_FILES].sort()) {
    // What a build itself writes does not count.
    if (/\.generated\.(js|d\.ts)$/.test(file) || !existsSync(file) || !statSync(file).isFile()) continue;
    hash.update(file).update(readFileSync(file));
  }
  return hash.digest('hex');
}

function buildWhenStale() {
  const stamp = sourceStamp();
  if (read('dist/.stamp') === stamp) return;
  say('building');
  const result = spawnSync(process.execPath, ['server/scripts/build.mjs'], { stdio: ['ignore', 2, 2] });
  if (result.status !== 0) process.exit(result.status ?? 1);
  mkdirSync('dist', { recursive: true });
  writeFileSync('dist/.stamp', stamp);
}

/** The database to use: DATABASE_URL, or the checkout's own cluster. */
async function findDatabase() {
  if (process.env.DATABASE_URL) return { url: process.env.DATABASE_URL, stop: async () => undefined };
  const cluster = await start({ log: say });
  await ensureDatabase(addressOf(cluster, 'postgres'), DATABASE);
  return {
    url: addressOf(cluster, DATABASE),
    stop: async () => {
      if (!cluster.reused) await stop();
    },
  };
}

function greet({ setUpToken, accounts = [] }) {
  console.log(`\nCounterpoise: ${process.env.PUBLIC_URL || `http://127.0.0.1:${port}`}\n`);
  if (setUpToken) console.log(`Nobody has an account yet. Set up with this token: ${setUpToken}\n`);
  if (accounts.length > 0) {
    console.log('Demo accounts (on this machine only):');
    for (const { role, email, password, organisation } of accounts) {
      console.log(`  ${role.padEnd(14)} ${email.padEnd(36)} ${password}   ${organisation}`);
    }
    console.log('');
  }
  if (process.env.DEMO === 'off' && !process.env.SMTP_URL) {
    console.log('SMTP_URL is not set: mails, invitations among them, are kept here and reach nobody.\n');
  }
  console.log('Ctrl-C stops it.');
}

/** npm that is killed leaves its script running: notice that the parent has gone. */
function watchParents(gone) {
  const lineage = () => {
    try {
      const stat = readFileSync(`/proc/${process.ppid}/stat`, 'utf8');
      return `${process.ppid} ${stat.replace(/^.*\) /s, '').split(' ')[1]}`;
    } catch {
      return String(process.ppid);
    }
  };
  const first = lineage();
  if (process.env.npm_lifecycle_event) setInterval(() => lineage() !== first && gone(), 500).unref();
}

function runServer(database) {
  const child = spawn(process.execPath, ['--enable-source-maps', 'dist/server/main.js'], {
    stdio: ['ignore', 'inherit', 'inherit', 'ipc'],
    env: {
      ...process.env,
      NODE_ENV: 'production',
      PORT: port,
      DATABASE_URL: database.url,
      SESSION_SECRET: process.env.SESSION_SECRET || localSecret(),
      LOG_LEVEL: process.env.LOG_LEVEL || 'warn',
    },
  });
  let stopping = false;
  const shutDown = () => {
    if (stopping) return;
    stopping = true;
    child.kill('SIGTERM');
    setTimeout(() => child.kill('SIGKILL'), 10_000).unref();
  };
  for (const signal of ['SIGINT', 'SIGTERM', 'SIGHUP']) process.on(signal, shutDown);
  watchParents(shutDown);
  child.on('message', (message) => message?.ready && greet(message));
  child.once('exit', async (code) => {
    await database.stop();
    process.exit(stopping ? 0 : (code ?? 1));
  });
}

await refuseSecondStart();
installPackages(say);
const database = findDatabase();
// A failure is dealt with where it is awaited, after the build that runs beside it.
database.catch(() => undefined);
try {
  buildWhenStale();
  runServer(await database);
} catch (error) {
  console.error(error instanceof Error ? error.message : error);
  process.exit(1);
}
