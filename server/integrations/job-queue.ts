import PgBoss from 'pg-boss';
import type { EntityManager } from 'typeorm';
import type { QueueName } from './queue-names';

/** Puts work into the queue as part of the transaction that causes it. */
export interface JobQueue {
  /** The id is the cause's own, so that the same work is never queued twice. */
  send(manager: EntityManager, queue: QueueName, id: string): Promise<void>;
}

/** The transaction's own connection, in the shape that the queue asks for. */
const through = (manager: EntityManager) => ({
  executeSql: async (text: string, values: unknown[]) => {
    const runner = manager.queryRunner;
    if (!runner) throw new Error('a job can only be queued inside a transaction');
    const result = await runner.query(text, values as never[], true);
    return { rows: (result.records ?? []) as never[] };
  },
});

/** Never started: it only writes rows, through connections that are lent to it. */
export function makeJobQueue(): JobQueue {
  const boss = new PgBoss({
    db: { executeSql: () => Promise.reject(new Error('no connection of its own')) },
  });
  return {
    send: async (manager, queue, id) => {
      await boss.send(queue, { id }, { id, db: through(manager) });
    },
  };
}
