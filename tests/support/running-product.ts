import { spawn } from 'node:child_process';
import type { ChildProcess } from 'node:child_process';
import { randomBytes } from 'node:crypto';
import { existsSync } from 'node:fs';
import { resolve } from 'node:path';
import { inject } from 'vitest';
import { freePort } from '../../server/scripts/postgres.mjs';
import { createDatabase, dropDatabase, randomDatabaseName } from './databases';

export const ROOT = resolve(import.meta.dirname, '../..');

export interface RunningProduct {
  baseUrl: string;
  /** As the owner: for looking, never for what is tested. */
  databaseUrl: string;
  /** What the server wrote to standard error and output. */
  output(): string;
  child: ChildProcess;
  stop(): Promise<void>;
}

function whenReady(child: ChildProcess, output: () => string): Promise<void> {
  return new Promise((done, fail) => {
    child.on('message', (message) => {
      if ((message as { ready?: boolean }).ready) done();
    });
    child.once('exit', (code) => fail(new Error(`the server ended with ${code}:\n${output()}`)));
  });
}

/** The built product (`npm run build`) on a fresh database of the test cluster, on a port of its own. */
export async function startProduct(environment: Record<string, string> = {}): Promise<RunningProduct> {
  if (!existsSync(resolve(ROOT, 'dist/server/main.js')))
    throw new Error('nothing is built yet: npm run build');
  const cluster = inject('postgres');
  const name = randomDatabaseName();
  const databaseUrl = await createDatabase(cluster.ownerUrl, name);
  const port = await freePort();
  let said = '';
  const child = spawn(process.execPath, ['--enable-source-maps', 'dist/server/main.js'], {
    cwd: ROOT,
    stdio: ['ignore', 'pipe', 'pipe', 'ipc'],
    env: {
      ...process.env,
      PORT: String(port),
      DATABASE_URL: databaseUrl,
      // The roles of a cluster have one password, which follows from the secret: all of a run share it.
      SESSION_SECRET: cluster.secret,
      LOG_LEVEL: 'warn',
      PUBLIC_URL: '',
      SMTP_URL: '',
      ...environment,
    },
  });
  for (const stream of [child.stdout, child.stderr])
    stream?.on('data', (chunk: Buffer) => (said += chunk.toString()));
  const output = () => said;
  await whenReady(child, output);
  return {
    baseUrl: `http://127.0.0.1:${port}`,
    databaseUrl,
    output,
    child,
    stop: async () => {
      const gone = new Promise((done) => child.once('exit', done));
      if (child.exitCode === null) {
        child.kill('SIGTERM');
        await gone;
      }
      await dropDatabase(cluster.ownerUrl, name);
    },
  };
}

/** A secret that could stand in production. */
export const randomSecret = () => randomBytes(48).toString('base64url');
