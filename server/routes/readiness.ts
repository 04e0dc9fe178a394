import { NEWEST_MIGRATION } from '../database/migration-list';
import { Problem } from '../errors/problem';
import type { Context } from '../integrations/context';

const PATIENCE_MS = 1000;
const KEEP_MS = 1000;

interface Reading {
  at: number;
  reason: string | null;
}
const readings = new WeakMap<Context, Promise<Reading>>();

function inTime<T>(work: Promise<T>): Promise<T> {
  return new Promise((done, fail) => {
    const timer = setTimeout(() => fail(new Error('too slow')), PATIENCE_MS);
    work.then(done, fail).finally(() => clearTimeout(timer));
  });
}

async function look({ surroundings }: Context): Promise<Reading> {
  try {
    const found: unknown[] = await inTime(
      surroundings.dataSource.query('SELECT 1 FROM migrations WHERE name = $1', [NEWEST_MIGRATION]),
    );
    return { at: Date.now(), reason: found.length > 0 ? null : 'migration' };
  } catch {
    return { at: Date.now(), reason: 'database' };
  }
}

/** Throws `unavailable` unless the database answers in time; a reading is good for a second. */
export async function requireReady(context: Context): Promise<void> {
  const kept = await readings.get(context);
  const fresh = kept && Date.now() - kept.at < KEEP_MS ? kept : undefined;
  if (!fresh) readings.set(context, look(context));
  const reading = fresh ?? (await readings.get(context));
  if (reading?.reason) {
    throw new Problem('unavailable', { extra: { reason: reading.reason }, retryAfterSeconds: 2 });
  }
}
