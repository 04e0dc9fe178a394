import { createHash } from 'node:crypto';
import { IdempotencyKey } from '../entities/file.entities';
import { Problem } from '../errors/problem';
import { canonicalText } from './audit/canonical';
import type { Transaction } from './transaction';

export interface RetriableRequest {
  userId: string;
  key: string;
  operationId: string;
  /** Everything that makes the request what it is: parameters, body, the files' hashes. */
  content: unknown;
}

export interface KeptAnswer {
  status: number;
  body: unknown;
}

const DAY_MS = 24 * 60 * 60 * 1000;

/** Held until the transaction ends; a second request with the same key meanwhile gets a 409 and waits for nothing. */
async function takeKey(tx: Transaction, request: RetriableRequest): Promise<void> {
  const [row] = await tx.manager.query<{ taken: boolean }[]>(
    'SELECT pg_try_advisory_xact_lock(hashtextextended($1, 0)) AS taken',
    [`${request.userId} ${request.key}`],
  );
  if (!row?.taken) throw new Problem('in-flight');
}

/**
 * Does the work once for each key: a repeat within 24 hours gets the answer of the first. The key is written in the
 * work's own transaction, so a crash leaves neither or both.
 */
export async function oncePerKey(
  tx: Transaction,
  request: RetriableRequest,
  work: () => Promise<KeptAnswer>,
): Promise<KeptAnswer & { replayed: boolean }> {
  await takeKey(tx, request);
  const { userId, key, operationId } = request;
  const requestHash = createHash('sha256').update(canonicalText(request.content)).digest('hex');
  const known = await tx.manager.findOneBy(IdempotencyKey, { userId, key });
  if (known && tx.now.getTime() - known.createdAt.getTime() < DAY_MS) {
    if (known.operationId !== operationId || known.requestHash !== requestHash)
      throw new Problem('key-reused');
    return { status: known.status ?? 200, body: known.answer, replayed: true };
  }
  if (known) await tx.manager.delete(IdempotencyKey, { userId, key });
  const answer = await work();
  await tx.manager.insert(IdempotencyKey, {
    userId,
    key,
    operationId,
    requestHash,
    status: answer.status,
    answer: answer.body as never,
    createdAt: tx.now,
  });
  return { ...answer, replayed: false };
}
