const LIMIT = 500;

export interface Difference {
  pointer: string;
  before: unknown;
  after: unknown;
}

/** Fields that differ between two values of JSON, each with its pointer; what one side lacks is null there. */
export function differences(
  before: unknown,
  after: unknown,
): { changes: Difference[]; limitReached: boolean } {
  const changes: Difference[] = [];
  walk('', before, after, changes);
  return { changes: changes.slice(0, LIMIT), limitReached: changes.length > LIMIT };
}

function walk(pointer: string, before: unknown, after: unknown, changes: Difference[]): void {
  if (Object.is(before, after) || changes.length > LIMIT) return;
  if (isContainer(before) && isContainer(after) && Array.isArray(before) === Array.isArray(after)) {
    const keys = new Set([...Object.keys(before), ...Object.keys(after)]);
    for (const key of keys) {
      const part = key.replaceAll('~', '~0').replaceAll('/', '~1');
      walk(`${pointer}/${part}`, at(before, key), at(after, key), changes);
    }
    return;
  }
  changes.push({ pointer: pointer === '' ? '/' : pointer, before: before ?? null, after: after ?? null });
}

function isContainer(value: unknown): value is Record<string, unknown> {
  return typeof value === 'object' && value !== null;
}

function at(container: Record<string, unknown>, key: string): unknown {
  return Object.hasOwn(container, key) ? container[key] : undefined;
}
