import type { EntityManager, EntityTarget, FindOptionsWhere, ObjectLiteral, UpdateResult } from 'typeorm';
import { stale } from '../errors/problem';

type Columns<T> = Partial<{ [K in keyof T]: T[K] | (() => string) }>;

/**
 * `UPDATE … WHERE id AND version [AND what else must still hold]`, and exactly one row: anything else is a 409.
 * The version counts up. TypeORM's own version column is not checked on update, so this is the only way to change
 * what several people may change at once. Answers the new version.
 */
export async function conditionalUpdate<T extends ObjectLiteral & { id: string; version: number }>(
  manager: EntityManager,
  target: EntityTarget<T>,
  expected: Pick<T, 'id' | 'version'> & FindOptionsWhere<T>,
  changes: Columns<T>,
): Promise<number> {
  const version = expected.version + 1;
  const result: UpdateResult = await manager.update(
    target,
    expected as FindOptionsWhere<T>,
    { ...changes, version } as never,
  );
  if (result.affected !== 1) {
    throw stale(
      'It was changed by somebody else since you last saw it. Look at the present state and try again.',
    );
  }
  return version;
}
