import { rulesToAST } from '@casl/ability/extra';
import type { AnyAbility } from '@casl/ability';
import { Brackets } from 'typeorm';
import type { ObjectLiteral, SelectQueryBuilder } from 'typeorm';
import type { Action, Subject } from '../../shared/policies/subjects';

interface Condition {
  operator: string;
  value: unknown;
  field?: string;
}

/** Turns the conditions of one query into SQL. What it does not know it refuses: nothing is let through by accident. */
class ConditionWriter {
  readonly parameters: ObjectLiteral = {};
  private count = 0;

  constructor(private readonly columnOf: (field: string) => string) {}

  write({ operator, value, field }: Condition): string {
    if (operator === 'and' || operator === 'or') return this.all(value as Condition[], operator);
    // Null counts as "does not match", as it does in the check of a loaded object.
    if (operator === 'not') return `(${this.all(value as Condition[], 'and')} IS NOT TRUE)`;
    if (operator === 'nor') return `(${this.all(value as Condition[], 'or')} IS NOT TRUE)`;
    return this.compare(operator, this.columnOf(field ?? ''), value);
  }

  private all(parts: readonly Condition[], operator: 'and' | 'or'): string {
    if (parts.length === 0) return operator === 'and' ? '(1 = 1)' : '(1 = 0)';
    return `(${parts.map((part) => this.write(part)).join(` ${operator.toUpperCase()} `)})`;
  }

  private compare(operator: string, column: string, value: unknown): string {
    if (operator === 'eq') return value === null ? `${column} IS NULL` : `${column} = :${this.bind(value)}`;
    if (operator === 'ne') {
      return value === null ? `${column} IS NOT NULL` : `${column} IS DISTINCT FROM :${this.bind(value)}`;
    }
    if (operator === 'in' || operator === 'nin') return this.among(operator, column, value as unknown[]);
    // Order is left out on purpose: in memory null is less than 8, in SQL it is not.
    throw new Error(`condition operator ${operator} has no SQL form`);
  }

  private among(operator: 'in' | 'nin', column: string, values: readonly unknown[]): string {
    if (values.length === 0) return operator === 'in' ? '1 = 0' : '1 = 1';
    const inside = `${column} IN (:...${this.bind(values)})`;
    return operator === 'in' ? inside : `((${inside}) IS NOT TRUE)`;
  }

  private bind(value: unknown): string {
    const name = `ability_${this.count++}`;
    this.parameters[name] = value;
    return name;
  }
}

/**
 * Adds to a query the rows on which the ability allows the action: the same rules that decide about a loaded object,
 * as a where-clause on the query's main table. No rule means no row.
 */
export function accessibleBy<T extends ObjectLiteral>(
  query: SelectQueryBuilder<T>,
  ability: AnyAbility,
  action: Action,
  subject: Subject,
): SelectQueryBuilder<T> {
  const conditions = rulesToAST(ability, action, subject) as Condition | null;
  if (conditions === null) return query.andWhere('1 = 0');
  const main = query.expressionMap.mainAlias;
  if (!main) throw new Error('the query has no main table');
  const writer = new ConditionWriter((field) => {
    const column = main.metadata.findColumnWithPropertyPath(field);
    if (!column) throw new Error(`no column ${field} on ${main.metadata.name}`);
    return `${main.name}.${column.propertyPath}`;
  });
  const text = writer.write(conditions);
  return query.andWhere(new Brackets((inner) => inner.where(text, writer.parameters)));
}
