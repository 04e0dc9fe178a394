import type { Transaction } from '../../database/transaction';

/**
 * Ends every session of a person, so that rights taken away are gone with the next request. The session that asks is
 * left to the session store: it would wait for this transaction's lock.
 */
export async function endSessionsOf(tx: Transaction, userId: string, butNot = ''): Promise<void> {
  await tx.manager.query(`DELETE FROM sessions WHERE sess #>> '{passport,user}' = $1 AND sid <> $2`, [
    userId,
    butNot,
  ]);
}
