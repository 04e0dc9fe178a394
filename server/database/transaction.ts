import type { EntityManager } from 'typeorm';
import type { Surroundings, Tools } from '../integrations/surroundings';
import { appendToChain } from './audit/chain';
import type { ChainedEvent } from './audit/chain';
import { postgresCode } from '../errors/postgres-code';
import { actorRole, system } from './actor';
import type { Actor } from './actor';

/** One unit of work: what it reads, writes, mails and records comes to pass together or not at all. */
export interface Transaction {
  manager: EntityManager;
  actor: Actor;
  /** The moment of the whole transaction, from the product's clock. */
  now: Date;
  /** Entries for the audit trail; use `recordEvent`. */
  events: Omit<ChainedEvent, 'seq' | 'prevHash'>[];
  /** Run once the commit has succeeded (waking a worker and the like; never a write). */
  afterCommit: (() => void)[];
  /** The queue, the scanner, the checker and what else lies beyond the database. */
  tools: Tools;
}

/** Who acts: known beforehand, or found out inside the transaction (a session's person). */
export type ActorSource = Actor | ((manager: EntityManager, now: Date) => Promise<Actor>);

// Serialisation failure and deadlock: PostgreSQL asks for the whole transaction again. A lock that did not come in
// time is worth another try too: whoever held it has mostly finished by then.
const RETRIED = new Set(['40001', '40P01', '55P03']);
const TRIES = 3;

async function declareActor(manager: EntityManager, actor: Actor): Promise<void> {
  const user = actor.kind === 'user' ? actor : undefined;
  await manager.query(
    `SELECT set_config('app.role', $1, true), set_config('app.org_id', $2, true), set_config('app.user_id', $3, true)`,
    [actorRole(actor), user?.orgId ?? '', user?.userId ?? ''],
  );
}

const systemDepth = new WeakMap<Transaction, number>();

/** Runs one look-up or write with the product's own sight (a reviewer's address, the next number), then the actor's again. */
export async function asSystem<T>(tx: Transaction, work: (manager: EntityManager) => Promise<T>): Promise<T> {
  const depth = systemDepth.get(tx) ?? 0;
  if (depth === 0) await declareActor(tx.manager, system('system'));
  systemDepth.set(tx, depth + 1);
  const leave = async () => {
    systemDepth.set(tx, depth);
    if (depth === 0) await declareActor(tx.manager, tx.actor);
  };
  let result: T;
  try {
    result = await work(tx.manager);
  } catch (error) {
    // After a failed statement PostgreSQL takes no other until the transaction ends: then there is nothing to restore.
    await leave().catch(() => undefined);
    throw error;
  }
  await leave();
  return result;
}

async function findActor(manager: EntityManager, source: ActorSource, now: Date): Promise<Actor> {
  if (typeof source !== 'function') return source;
  await declareActor(manager, system('session'));
  return source(manager, now);
}

async function once<T>(
  { dataSource, tools }: Surroundings,
  source: ActorSource,
  work: (tx: Transaction) => Promise<T>,
): Promise<T> {
  const afterCommit: (() => void)[] = [];
  const result = await dataSource.transaction(async (manager) => {
    const now = tools.clock.now();
    const actor = await findActor(manager, source, now);
    await declareActor(manager, actor);
    const tx: Transaction = { manager, actor, now, events: [], afterCommit, tools };
    const value = await work(tx);
    if (tx.events.length > 0) await asSystem(tx, () => appendToChain(manager, tx.events));
    return value;
  });
  for (const follow of afterCommit) follow();
  return result;
}

function isRetried(error: unknown): boolean {
  const code = postgresCode(error);
  return code !== undefined && RETRIED.has(code);
}

/** Runs `work` in one transaction under the actor's sight; deadlocks are tried again as a whole. */
export async function inTransaction<T>(
  surroundings: Surroundings,
  actor: ActorSource,
  work: (tx: Transaction) => Promise<T>,
): Promise<T> {
  for (let attempt = 1; ; attempt++) {
    try {
      return await once(surroundings, actor, work);
    } catch (error) {
      if (attempt >= TRIES || !isRetried(error)) throw error;
      await new Promise((resolve) => setTimeout(resolve, 20 * attempt + Math.random() * 30));
    }
  }
}
