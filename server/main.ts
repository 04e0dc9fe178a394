import 'reflect-metadata';
import { ConfigError, makeConfig } from './config/config';
import { readEnvironment } from './config/environment';
import { prepareDatabase, setUpTokenOf } from './app/prepare-database';
import { assemble, closeServer, Closing, openDoor } from './app/server';
import type { Parts } from './app/server';
import { problemOf } from './middleware/problems';
import { demoAccounts } from './services/accounts/demo-accounts';
import { makeLogger } from './logging/logger';

const RETRY_MS = 2000;

/** What the starting script is told, so that it can tell the person in front of it. */
interface Ready {
  ready: true;
  setUpToken: string | null;
  accounts: ReturnType<typeof demoAccounts>;
}

function configOrExit() {
  try {
    return makeConfig(readEnvironment());
  } catch (error) {
    if (!(error instanceof ConfigError)) throw error;
    console.error(error.message);
    return process.exit(1);
  }
}

/** Waits for a database that is not there yet; any other failure ends the start. */
async function whenPossible<T>(
  work: () => Promise<T>,
  { log }: Parts,
  isStopping: () => boolean,
): Promise<T> {
  for (;;) {
    try {
      return await work();
    } catch (error) {
      if (isStopping() || problemOf(error).kind !== 'unavailable') throw error;
      log.warn({ err: error }, 'the database cannot be reached: trying again');
      await new Promise((next) => setTimeout(next, RETRY_MS));
    }
  }
}

async function main(): Promise<void> {
  const config = configOrExit();
  const log = makeLogger(config.logLevel);
  const parts: Parts = { config, log, entry: import.meta.url, root: process.cwd() };
  const closing = new Closing();
  let stopping = false;
  const stop = async () => {
    if (stopping) return;
    stopping = true;
    await closing.all();
    process.exit(0);
  };
  for (const signal of ['SIGINT', 'SIGTERM'] as const) process.on(signal, () => void stop());
  process.on('disconnect', () => void stop());
  const door = await openDoor(config.port);
  closing.add(() => closeServer(door.server));
  const { empty } = await whenPossible(
    () => prepareDatabase(config, new Date()),
    parts,
    () => stopping,
  );
  const { app } = await assemble(parts, closing);
  door.serve(app);
  log.info({ port: config.port }, 'ready');
  const ready: Ready = {
    ready: true,
    setUpToken: empty && !config.demo ? setUpTokenOf(config.sessionSecret) : null,
    accounts: config.demo ? demoAccounts() : [],
  };
  process.send?.(ready);
}

main().catch((error: unknown) => {
  console.error(error instanceof ConfigError ? error.message : error);
  process.exit(1);
});
