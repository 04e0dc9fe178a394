import type { QueueName } from '../integrations/queue-names';
import type { Transaction } from './transaction';

/** Queues work that is done after this transaction commits, and not at all when it does not. */
export function enqueue(tx: Transaction, queue: QueueName, id: string): Promise<void> {
  return tx.tools.jobs.send(tx.manager, queue, id);
}
