import { createHash } from 'node:crypto';
import { DefaultNamingStrategy } from 'typeorm';
import type { NamingStrategyInterface, Table } from 'typeorm';

const snake = (name: string) => name.replace(/([a-z0-9])([A-Z])/g, '$1_$2').toLowerCase();
const tableName = (table: Table | string) =>
  (typeof table === 'string' ? table : table.name).split('.').at(-1) ?? '';

/** PostgreSQL cuts names at 63 bytes: longer ones end in a hash instead. */
function named(prefix: string, table: Table | string, columns: string[]): string {
  const name = [prefix, tableName(table), ...columns.map(snake)].join('_');
  if (name.length <= 63) return name;
  return `${name.slice(0, 54)}_${createHash('sha256').update(name).digest('hex').slice(0, 8)}`;
}

/** Snake-case columns, and constraint names that a person can read in an error. */
export class NamingStrategy extends DefaultNamingStrategy implements NamingStrategyInterface {
  override columnName(propertyName: string, customName: string | undefined): string {
    return customName ?? snake(propertyName);
  }
  override primaryKeyName(table: Table | string, columns: string[]): string {
    return named('pk', table, columns);
  }
  override uniqueConstraintName(table: Table | string, columns: string[]): string {
    return named('uq', table, columns);
  }
  override foreignKeyName(table: Table | string, columns: string[]): string {
    return named('fk', table, columns);
  }
  override indexName(table: Table | string, columns: string[]): string {
    return named('ix', table, columns);
  }
}
