import { spawn, spawnSync } from 'node:child_process';
import { existsSync, mkdirSync, mkdtempSync, rmSync, writeFileSync } from 'node:fs';
import { createServer } from 'node:net';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import type { AddressInfo } from 'node:net';
import { inject } from 'vitest';
import { createDatabase, dropDatabase, randomDatabaseName } from '../../support/databases';

export interface Product {
  url: string;
  stop(): Promise<void>;
}

function freePort(): Promise<number> {
  return new Promise((resolve, reject) => {
    const probe = createServer().once('error', reject);
    probe.listen(0, '127.0.0.1', () => {
      const { port } = probe.address() as AddressInfo;
      probe.close(() => resolve(port));
    });
  });
}

/** `npm test` builds before the tests; a run of one file alone builds when there is nothing to run. */
function ensureBuilt(): void {
  if (existsSync('dist/server/main.js') && existsSync('dist/client/index.html')) return;
  const built = spawnSync(process.execPath, ['server/scripts/build.mjs'], { encoding: 'utf8' });
  if (built.status !== 0) throw new Error(`the build failed:\n${built.stdout}${built.stderr}`);
}

/** The built product as `npm start` runs it, with the demo scenario, on a database and a port of its own. */
export async function startProduct(): Promise<Product> {
  ensureBuilt();
  const cluster = inject('postgres');
  const name = randomDatabaseName();
  const databaseUrl = await createDatabase(cluster.ownerUrl, name, cluster.template);
  const port = await freePort();
  const child = spawn(process.execPath, ['--enable-source-maps', 'dist/server/main.js'], {
    stdio: ['ignore', 'pipe', 'pipe', 'ipc'],
    env: {
      PATH: process.env['PATH'],
      NODE_ENV: 'production',
      PORT: String(port),
      DATABASE_URL: databaseUrl,
      SESSION_SECRET: cluster.secret,
      DEMO: 'on',
      LOG_LEVEL: 'warn',
    },
  });
  let said = '';
  for (const stream of [child.stdout, child.stderr])
    stream?.on('data', (chunk: Buffer) => (said += chunk.toString()));
  await new Promise<void>((resolve, reject) => {
    child.once('message', () => resolve());
    child.once('exit', (code) => reject(new Error(`the server ended with ${code}:\n${said}`)));
  });
  return {
    url: `http://127.0.0.1:${port}`,
    async stop() {
      const ended = new Promise((resolve) => child.once('exit', resolve));
      child.kill('SIGTERM');
      await ended;
      await dropDatabase(cluster.ownerUrl, name);
    },
  };
}

/** A file on disk for an upload, gone with its folder when the tests end. */
export function fileFolder(): { write(name: string, content: string | Buffer): string; remove(): void } {
  const folder = mkdtempSync(join(tmpdir(), 'counterpoise-e2e-'));
  mkdirSync(folder, { recursive: true });
  return {
    write(name, content) {
      const path = join(folder, name);
      writeFileSync(path, content);
      return path;
    },
    remove: () => rmSync(folder, { recursive: true, force: true }),
  };
}
