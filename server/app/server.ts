import type { RequestListener, Server } from 'node:http';
import type { Express } from 'express';
import type { Config } from '../config/config';
import { system } from '../database/actor';
import { makeDataSource } from '../database/data-source';
import { makePlainPool } from '../database/plain-pool';
import { roleUrl } from '../database/roles';
import { inTransaction } from '../database/transaction';
import { ReceivedMail } from '../entities/correspondence.entities';
import { makeChecker } from '../integrations/checker';
import { systemClock } from '../integrations/clock';
import { makeJobQueue } from '../integrations/job-queue';
import { startLocalMailServer } from '../integrations/local-mail-server';
import type { TakenMail } from '../integrations/local-mail-server';
import { makeMailer } from '../integrations/mail';
import type { Surroundings, Tools } from '../integrations/surroundings';
import { standInVirusScan } from '../integrations/virus-scan';
import { startWorker } from '../jobs/worker';
import type { Logger } from '../logging/logger';
import { closeServer, listen, makeHttpServer, notYet } from './http-server';
import { makeApp } from './make-app';
import { setUpTokenOf } from './prepare-database';

export interface Parts {
  config: Config;
  log: Logger;
  /** Where the entry that runs lies; workers are found from it. */
  entry: string;
  root: string;
}

/** What has been opened, to be closed in the opposite order. */
export class Closing {
  private readonly steps: (() => unknown)[] = [];
  add(step: () => unknown): void {
    this.steps.push(step);
  }
  async all(): Promise<void> {
    for (const step of this.steps.splice(0).reverse()) {
      try {
        await step();
      } catch {
        // One part that will not close must not keep the others open.
      }
    }
  }
}

function makeTools({ config, entry }: Parts, closing: Closing): Tools {
  const checker = makeChecker(entry);
  closing.add(() => checker.close());
  return {
    clock: systemClock,
    jobs: makeJobQueue(),
    virusScan: standInVirusScan,
    checker,
    publicUrl: config.publicUrl,
    demo: config.demo,
  };
}

async function connect(
  { config }: Parts,
  role: 'web' | 'worker',
  tools: Tools,
  closing: Closing,
): Promise<Surroundings> {
  const dataSource = makeDataSource(roleUrl(config.databaseUrl, config.sessionSecret, role), role);
  await dataSource.initialize();
  closing.add(() => dataSource.destroy());
  return { dataSource, tools };
}

/** SMTP_URL, or a server of our own that keeps the mail for the Mail room. */
async function mailServerUrl(
  { config }: Parts,
  surroundings: Surroundings,
  closing: Closing,
): Promise<string> {
  if (config.smtpUrl) return config.smtpUrl;
  const keep = async (mail: TakenMail) => {
    await inTransaction(surroundings, system('mail room'), (tx) =>
      tx.manager.insert(ReceivedMail, { ...mail, receivedAt: tx.now }),
    );
  };
  const local = await startLocalMailServer(keep);
  closing.add(() => local.close());
  return local.url;
}

/** The jobs' side: mail and check runs. */
async function startJobs(parts: Parts, tools: Tools, closing: Closing): Promise<void> {
  const { config, log } = parts;
  const surroundings = await connect(parts, 'worker', tools, closing);
  const sender = { name: 'Counterpoise', address: `no-reply@${config.publicUrl.hostname}` };
  const mailer = makeMailer(await mailServerUrl(parts, surroundings, closing), sender);
  closing.add(() => mailer.close());
  const databaseUrl = roleUrl(config.databaseUrl, config.sessionSecret, 'worker');
  const worker = await startWorker({ surroundings, databaseUrl, mailer, log });
  closing.add(() => worker.stop());
}

/** Opens everything that a prepared database allows, and answers with the application. */
export async function assemble(
  parts: Parts,
  closing: Closing,
): Promise<{ app: Express; surroundings: Surroundings }> {
  const { config, log, root } = parts;
  const tools = makeTools(parts, closing);
  const surroundings = await connect(parts, 'web', tools, closing);
  const pool = makePlainPool(roleUrl(config.databaseUrl, config.sessionSecret, 'web'));
  closing.add(() => pool.end());
  const setUpToken = config.demo ? null : setUpTokenOf(config.sessionSecret);
  const app = makeApp({ config, surroundings, pool, log, root, checkAnswers: false, setUpToken });
  await startJobs(parts, tools, closing);
  return { app, surroundings };
}

/** An HTTP server that answers "not yet" until it is given the application. */
export async function openDoor(
  port: number,
): Promise<{ server: Server; serve(listener: RequestListener): void }> {
  let current: RequestListener = notYet;
  const server = makeHttpServer((request, response) => current(request, response));
  await listen(server, port);
  return {
    server,
    serve: (listener) => {
      current = listener;
    },
  };
}

export { closeServer };
