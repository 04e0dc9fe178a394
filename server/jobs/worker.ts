import PgBoss from 'pg-boss';
import { QUEUES } from '../integrations/queue-names';
import type { QueueName } from '../integrations/queue-names';
import type { Mailer } from '../integrations/mail';
import type { Surroundings } from '../integrations/surroundings';
import type { Logger } from '../logging/logger';
import { checkRunJob } from './check-run.job';
import { OutboxSender } from './outbox-sender';
import { sendReminders } from '../services/windows/send-reminders';
import { sweep } from './sweeper';

type Job = (surroundings: Surroundings, id: string) => Promise<unknown>;

/** What is done for each queue. Any of them may run twice and must then do no harm. */
const JOBS: Record<QueueName, Job> = {
  [QUEUES.checkRun]: checkRunJob,
};

export interface RunningWorker {
  stop(): Promise<void>;
}

export interface WorkerSettings {
  /** Connected as the worker role. */
  surroundings: Surroundings;
  databaseUrl: string;
  mailer: Mailer;
  log: Logger;
}

const OUTBOX_EVERY_MS = 1000;
const SWEEP_EVERY_MS = 10 * 60_000;
const REMIND_EVERY_MS = 15 * 60_000;

/** Repeats a piece of work until it is stopped; one that fails is tried again the next time. */
function repeat(
  work: () => Promise<unknown>,
  everyMs: number,
  failed: (error: unknown) => void,
): () => Promise<void> {
  let stopped = false;
  let wake: () => void = () => undefined;
  const loop = async () => {
    while (!stopped) {
      await work().catch(failed);
      await new Promise<void>((next) => {
        const timer = setTimeout(next, everyMs);
        wake = () => {
          clearTimeout(timer);
          next();
        };
      });
    }
  };
  const running = loop();
  return () => {
    stopped = true;
    wake();
    return running;
  };
}

/** Takes jobs from the queue and mail from the outbox. Several workers on one database share the work. */
export async function startWorker({
  surroundings,
  databaseUrl,
  mailer,
  log,
}: WorkerSettings): Promise<RunningWorker> {
  const boss = new PgBoss({ connectionString: databaseUrl, max: 3, migrate: false, schedule: false });
  boss.on('error', (error) => log.warn({ err: error }, 'job queue'));
  await boss.start();
  for (const [queue, job] of Object.entries(JOBS)) {
    await boss.work<{ id: string }>(queue, { pollingIntervalSeconds: 0.5, batchSize: 1 }, async (jobs) => {
      for (const { data } of jobs) {
        await job(surroundings, data.id).catch((error: unknown) => {
          log.error({ err: error, queue, id: data.id }, 'job failed');
          throw error;
        });
      }
    });
  }
  const outbox = new OutboxSender(surroundings, mailer, log);
  const stopOutbox = repeat(
    () => outbox.sendDue(),
    OUTBOX_EVERY_MS,
    (error) => log.warn({ err: error }, 'outbox'),
  );
  const stopSweeping = repeat(
    () => sweep(surroundings),
    SWEEP_EVERY_MS,
    (error) => log.warn({ err: error }, 'sweeper'),
  );
  const stopReminding = repeat(
    () => sendReminders(surroundings),
    REMIND_EVERY_MS,
    (error) => log.warn({ err: error }, 'reminders'),
  );
  return {
    stop: async () => {
      await Promise.all([
        stopOutbox(),
        stopSweeping(),
        stopReminding(),
        boss.stop({ graceful: true, timeout: 5000 }),
      ]);
    },
  };
}
