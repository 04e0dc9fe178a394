import type { EntityManager } from 'typeorm';
import { postgresCode } from '../errors/postgres-code';
import { Problem } from '../errors/problem';

/** Where a page ended: the sort value and the id of its last row. */
export interface Cursor {
  value: string | number;
  id: string;
}

export interface Page<T> {
  items: T[];
  nextCursor: string | null;
  total: number;
}

const DEFAULT_LIMIT = 50;

/** Opaque to clients; bound to nothing, since the ability's where-clause is asked again on every page. */
export function encodeCursor(cursor: Cursor): string {
  return Buffer.from(JSON.stringify([cursor.value, cursor.id])).toString('base64url');
}

export function decodeCursor(text: string | undefined): Cursor | null {
  if (text === undefined) return null;
  try {
    const [value, id] = JSON.parse(Buffer.from(text, 'base64url').toString('utf8')) as unknown[];
    if ((typeof value === 'string' || typeof value === 'number') && typeof id === 'string')
      return { value, id };
  } catch {
    // told below
  }
  throw foreignCursor();
}

const foreignCursor = () =>
  new Problem('invalid-request', { detail: 'The cursor is not one that this list gave.' });

export function readLimit(text: string | undefined): number {
  return text === undefined ? DEFAULT_LIMIT : Number(text);
}

/** Numbers the parameters of a statement that is put together from parts. */
export class Parameters {
  readonly values: unknown[];
  constructor(values: readonly unknown[] = []) {
    this.values = [...values];
  }
  add(value: unknown): string {
    this.values.push(value);
    return `$${this.values.length}`;
  }
}

/** For LIKE: the text's own wildcards stand for themselves. */
export function likePattern(text: string): string {
  return `%${text.replace(/[\\%_]/g, '\\$&')}%`;
}

export interface PageQuery {
  /** Key of the sorts, with a minus for descending. */
  sort: string;
  limit: number;
  cursor: Cursor | null;
}

/** Rows of a statement's last common table, which has an `id`, in the order and from the place that was asked for. */
export async function readPage<T extends { id: string }>(
  manager: EntityManager,
  source: { withs: string; from: string; sorts: Readonly<Record<string, string>>; parameters: Parameters },
  query: PageQuery,
): Promise<Page<T>> {
  const { withs, from, parameters } = source;
  const descending = query.sort.startsWith('-');
  // a fixed table of expressions: nothing of the request gets into the statement's text
  const sort = source.sorts[query.sort.replace(/^-/, '')] ?? 'id::text';
  const [counted] = await manager.query<{ total: number }[]>(
    `${withs} SELECT count(*)::int AS total FROM ${from}`,
    parameters.values,
  );
  const after = cursorSql(sort, descending, query.cursor, parameters);
  const direction = descending ? 'DESC' : 'ASC';
  const rows = await manager
    .query<(T & { sortValue: string | number })[]>(
      `${withs} SELECT *, ${sort} AS "sortValue" FROM ${from} WHERE ${after}
     ORDER BY ${sort} ${direction}, id::text ${direction} LIMIT ${parameters.add(query.limit + 1)}`,
      parameters.values,
    )
    .catch((error: unknown) => {
      // a place that this order does not have: of another sort, or made up
      const isOfCursor = query.cursor !== null && /^22/.test(postgresCode(error) ?? '');
      throw isOfCursor ? foreignCursor() : error;
    });
  const items = rows.slice(0, query.limit);
  const last = items.at(-1);
  const more = rows.length > query.limit && last !== undefined;
  const nextCursor = more ? encodeCursor({ value: last.sortValue, id: last.id }) : null;
  return { items, nextCursor, total: counted?.total ?? 0 };
}

function cursorSql(sort: string, descending: boolean, cursor: Cursor | null, parameters: Parameters): string {
  if (cursor === null) return 'true';
  const type = typeof cursor.value === 'number' ? 'double precision' : 'text';
  const from = `(${parameters.add(cursor.value)}::${type}, ${parameters.add(cursor.id)}::text)`;
  return `((${sort})::${type}, id::text) ${descending ? '<' : '>'} ${from}`;
}
