// npm run dev: the server restarts and the client reloads as files change. Plain Node.
import { spawn } from 'node:child_process';
import { addressOf, start, stop } from './postgres.mjs';
import { ensureDatabase, installPackages, localSecret, ROOT } from './set-up.mjs';

process.chdir(ROOT);
const say = (text) => console.error(text);
installPackages(say);
const { buildValidators } = await import('./build-validators.mjs');
await buildValidators();

const cluster = process.env.DATABASE_URL ? null : await start({ log: say });
if (cluster) await ensureDatabase(addressOf(cluster, 'postgres'), 'counterpoise');
const env = {
  LOG_LEVEL: 'info',
  PORT: '8080',
  SESSION_SECRET: localSecret(),
  ...(cluster ? { DATABASE_URL: addressOf(cluster, 'counterpoise') } : {}),
  ...process.env,
};

const children = [['--watch', '--import', 'tsx', 'server/main.ts'], ['node_modules/vite/bin/vite.js']].map(
  (args) => spawn(process.execPath, args, { stdio: 'inherit', env }),
);

let stopping = false;
async function stopAll() {
  if (stopping) return;
  stopping = true;
  await Promise.all(
    children.map(
      (child) =>
        new Promise((done) => {
          if (child.exitCode !== null) return done();
          child.once('exit', done);
          child.kill('SIGTERM');
        }),
    ),
  );
  if (cluster && !cluster.reused) await stop();
  process.exit(0);
}
for (const signal of ['SIGINT', 'SIGTERM', 'SIGHUP']) process.on(signal, () => void stopAll());
for (const child of children) child.once('exit', () => void stopAll());
