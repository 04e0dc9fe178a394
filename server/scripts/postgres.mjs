// A PostgreSQL cluster of the checkout's own, on loopback. Plain Node: it runs before anything is installed.
// Usage: node server/scripts/postgres.mjs start|stop
import { spawnSync } from 'node:child_process';
import { createHash, randomBytes } from 'node:crypto';
import {
  chownSync,
  existsSync,
  mkdirSync,
  readFileSync,
  readdirSync,
  renameSync,
  rmSync,
  writeFileSync,
} from 'node:fs';
import { connect, createServer } from 'node:net';
import { delimiter, dirname, join, resolve } from 'node:path';
import { fileURLToPath, pathToFileURL } from 'node:url';

const ROOT = resolve(dirname(fileURLToPath(import.meta.url)), '../..');
export const DATA_FOLDER = join(ROOT, '.data');
const OWNER = 'counterpoise';
const isRoot = process.getuid?.() === 0;
const BINARIES = ['initdb', 'pg_ctl', 'postgres'];
const pause = (ms) => new Promise((done) => setTimeout(done, ms));

function exec(command, args, options = {}) {
  const result = spawnSync(command, args, { encoding: 'utf8', ...options });
  if (result.error) throw result.error;
  return result;
}

function must(command, args, options) {
  const result = exec(command, args, options);
  if (result.status !== 0) {
    throw new Error(
      `${command} ${args.join(' ')}\nexit ${result.status}\n${result.stdout ?? ''}${result.stderr ?? ''}`,
    );
  }
  return result;
}

/** The folder of the server's binaries: $PG_BIN, PATH, then Debian's place, newest version first. */
function findBinaries() {
  const folders = [process.env.PG_BIN, ...(process.env.PATH ?? '').split(delimiter)];
  const debian = '/usr/lib/postgresql';
  if (existsSync(debian)) {
    for (const version of readdirSync(debian).sort((a, b) => Number(b) - Number(a))) {
      folders.push(join(debian, version, 'bin'));
    }
  }
  return folders.find((folder) => folder && BINARIES.every((name) => existsSync(join(folder, name))));
}

function installPackage(log) {
  if (!isRoot || !existsSync('/usr/bin/apt-get')) {
    throw new Error(
      'PostgreSQL was not found. Install it (Debian, Ubuntu: sudo apt-get install -y postgresql) or set PG_BIN to the folder of initdb.',
    );
  }
  log("PostgreSQL not found: installing Debian's package (apt-get)");
  // Debian's package would make and start a cluster of its own on 5432: not wanted here.
  if (!existsSync('/etc/postgresql-common/createcluster.conf')) {
    mkdirSync('/etc/postgresql-common', { recursive: true });
    writeFileSync('/etc/postgresql-common/createcluster.conf', 'create_main_cluster = false\n');
  }
  aptInstall('postgresql');
  const folder = findBinaries();
  if (!folder) throw new Error('apt-get installed postgresql but initdb is still not found');
  return folder;
}

/** Installs a Debian package (root only). */
export function aptInstall(name) {
  const env = { ...process.env, DEBIAN_FRONTEND: 'noninteractive' };
  const keep = ['-o', 'Dpkg::Options::=--force-confold'];
  must('apt-get', ['-q', 'update'], { env });
  must('apt-get', ['-q', '-y', ...keep, 'install', '--no-install-recommends', name], {
    env,
    maxBuffer: 1 << 28,
  });
}

/** PostgreSQL refuses to run as root: as root it runs as the package's own user. */
function account() {
  if (!isRoot) return {};
  const line = readFileSync('/etc/passwd', 'utf8')
    .split('\n')
    .find((entry) => entry.startsWith('postgres:'));
  if (!line) throw new Error('no user "postgres" on this machine');
  const [, , uid, gid] = line.split(':');
  return { uid: Number(uid), gid: Number(gid) };
}

/** The wanted folder, or, where that user cannot get in (a checkout under a 0700 folder), one in /var/tmp. */
function placeFor(who, wanted) {
  mkdirSync(wanted, { recursive: true });
  if (!isRoot || exec('test', ['-x', wanted], { ...who, cwd: '/' }).status === 0) return wanted;
  const hash = createHash('sha256').update(wanted).digest('hex').slice(0, 12);
  const other = `/var/tmp/counterpoise-postgres-${hash}`;
  mkdirSync(other, { recursive: true, mode: 0o755 });
  return other;
}

/** A free port, the wanted one if it is. */
export function freePort(wanted = 0) {
  return new Promise((done, fail) => {
    const probe = createServer();
    probe.once('error', (error) => (wanted ? freePort(0).then(done, fail) : fail(error)));
    probe.listen(wanted, '127.0.0.1', () => {
      const { port } = probe.address();
      probe.close(() => done(port));
    });
  });
}

/** Whether something listens on that port of loopback. */
export function connects(port) {
  return new Promise((done) => {
    const socket = connect({ port, host: '127.0.0.1' });
    socket.once('connect', () => {
      socket.destroy();
      done(true);
    });
    socket.once('error', () => done(false));
  });
}

function processState(pid) {
  try {
    return readFileSync(`/proc/${pid}/stat`, 'utf8').replace(/^.*\) /s, '')[0];
  } catch {
    return undefined;
  }
}

/** The live postmaster's pid and port. A killed one may stay a zombie for seconds, and pg_ctl takes it for alive. */
async function running(data) {
  const file = join(data, 'postmaster.pid');
  for (let i = 0; existsSync(file); i++) {
    const [pid, , , port] = readFileSync(file, 'utf8').split('\n');
    const state = processState(pid);
    if (state === undefined) return undefined;
    if (state !== 'Z')
      return (await connects(Number(port))) ? { pid: Number(pid), port: Number(port) } : undefined;
    if (i >= 300) return undefined;
    await pause(100);
  }
  return undefined;
}

function lockHolder(file) {
  try {
    const holder = Number(readFileSync(file, 'utf8'));
    if (holder) process.kill(holder, 0);
    return holder;
  } catch (error) {
    if (error.code === 'ESRCH') rmSync(file, { force: true });
    return 0;
  }
}

/** One start or stop at a time in a folder: two initdb at once delete each other's files. */
async function locked(base, work) {
  const file = join(base, 'postgres.lock');
  for (let i = 0; ; i++) {
    try {
      writeFileSync(file, String(process.pid), { flag: 'wx' });
      break;
    } catch (error) {
      if (error.code !== 'EEXIST') throw error;
      const holder = lockHolder(file);
      if (i > 1200) throw new Error(`${file} is held by process ${holder}`, { cause: error });
      await pause(100);
    }
  }
  try {
    return await work();
  } finally {
    rmSync(file, { force: true });
  }
}

/** initdb in a folder beside, renamed only when whole: an interrupted one leaves files that look finished. */
function makeCluster({ bin, base, who, run, data, secret }) {
  for (const name of readdirSync(base).filter((entry) => entry.startsWith('new-'))) {
    try {
      rmSync(join(base, name), { recursive: true, force: true });
    } catch {
      /* an orphaned initdb may still write there */
    }
  }
  const fresh = join(base, `new-${process.pid}`);
  mkdirSync(fresh, { mode: 0o700 });
  if (!existsSync(secret)) writeFileSync(secret, randomBytes(24).toString('base64url'), { mode: 0o600 });
  const passwordFile = join(fresh, 'password');
  writeFileSync(passwordFile, `${readFileSync(secret, 'utf8')}\n`, { mode: 0o600 });
  if (isRoot) {
    chownSync(fresh, who.uid, who.gid);
    chownSync(passwordFile, who.uid, who.gid);
  }
  const options = [
    '--auth=scram-sha-256',
    '--encoding=UTF8',
    '--locale=C.UTF-8',
    '--no-sync',
    '--no-instructions',
  ];
  must(
    join(bin, 'initdb'),
    ['-D', join(fresh, 'data'), '-U', OWNER, '--pwfile', passwordFile, ...options],
    run,
  );
  renameSync(join(fresh, 'data'), data);
  rmSync(fresh, { recursive: true, force: true });
}

async function startServer({ bin, data, port, fast, log, run }) {
  const settings = [
    `-p ${port}`,
    '-c listen_addresses=127.0.0.1',
    "-c unix_socket_directories=''",
    '-c timezone=UTC',
    '-c log_timezone=UTC',
  ];
  if (fast) settings.push('-c fsync=off', '-c synchronous_commit=off', '-c full_page_writes=off');
  const logFile = join(data, 'server.log');
  const args = ['-D', data, '-l', logFile, '-w', '-t', '60', '-o', settings.join(' '), 'start'];
  let failure;
  for (let i = 0; i < 5; i++) {
    failure = exec(join(bin, 'pg_ctl'), args, { ...run, stdio: ['ignore', 'pipe', 'pipe'] });
    if (failure.status === 0) return;
    const tail = existsSync(logFile)
      ? readFileSync(logFile, 'utf8').trim().split('\n').slice(-3).join(' | ')
      : '';
    log(`pg_ctl start failed (try ${i + 1}): ${tail}`);
    await pause(500 * (i + 1));
  }
  throw new Error(`pg_ctl start: ${failure.stdout}${failure.stderr}`);
}

async function startLocked(bin, base, { log, port: wanted, fast }) {
  const who = account();
  const data = join(base, 'postgres');
  const secret = join(base, 'postgres-password');
  const run = { ...who, cwd: '/', env: { PATH: `${bin}:/usr/bin:/bin`, LC_ALL: 'C.UTF-8', TZ: 'UTC' } };
  if (!existsSync(data)) makeCluster({ bin, base, who, run, data, secret });
  const live = await running(data);
  let port = live?.port;
  if (port === undefined) {
    const portFile = join(base, 'postgres-port');
    port = await freePort(wanted || (existsSync(portFile) ? Number(readFileSync(portFile, 'utf8')) : 0));
    writeFileSync(portFile, String(port));
    await startServer({ bin, data, port, fast, log, run });
  }
  const password = readFileSync(secret, 'utf8');
  return { host: '127.0.0.1', port, user: OWNER, password, data, reused: live !== undefined };
}

/** Starts the cluster in `folder` (made when there is none) and answers how to reach it. */
export async function start({ folder = DATA_FOLDER, port = 0, fast = false, log = console.error } = {}) {
  const bin = findBinaries() ?? installPackage(log);
  const base = placeFor(account(), folder);
  return locked(base, () => startLocked(bin, base, { log, port, fast }));
}

/** Stops the cluster in `folder`; false when none runs. */
export async function stop({ folder = DATA_FOLDER, mode = 'fast' } = {}) {
  const bin = findBinaries();
  if (!bin) return false;
  const who = account();
  const data = join(placeFor(who, folder), 'postgres');
  if (!(await running(data))) return false;
  must(join(bin, 'pg_ctl'), ['-D', data, '-m', mode, '-w', '-t', '60', 'stop'], { ...who, cwd: '/' });
  return true;
}

/** Stops a throw-away cluster and deletes its files. */
export async function discard({ folder }) {
  await stop({ folder, mode: 'immediate' });
  const place = findBinaries() ? placeFor(account(), folder) : folder;
  rmSync(place, { recursive: true, force: true });
  rmSync(folder, { recursive: true, force: true });
}

/** The connection address of one database of a started cluster. */
export function addressOf({ host, port, user, password }, database) {
  return `postgres://${user}:${encodeURIComponent(password)}@${host}:${port}/${database}`;
}

if (import.meta.url === pathToFileURL(process.argv[1] ?? '').href) {
  const verb = process.argv[2];
  if (verb === 'start') {
    const server = await start();
    console.log(`ready on ${server.host}:${server.port}, data in ${server.data}`);
  } else if (verb === 'stop') {
    console.log((await stop()) ? 'stopped' : 'was not running');
  } else {
    console.error('usage: node server/scripts/postgres.mjs start|stop');
    process.exit(2);
  }
}
