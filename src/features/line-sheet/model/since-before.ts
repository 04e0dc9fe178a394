import type { RevisionLine } from '#shared/contracts/api.generated';
import { BALANCE_ROWS } from '../../../components/charts/balance-entries';

export interface ChangedValue {
  parameter: string;
  /** Which of the two values moved. */
  what: 'declared' | 'recomputed';
  before: number | null;
  after: number | null;
}

/** Figures to nine digits: another machine's last bits are no change. */
const same = (a: number | null, b: number | null) =>
  a === b || (a !== null && b !== null && a.toPrecision(9) === b.toPrecision(9));

/** What of a circuit's values moved since the revision before; nothing where there is none. */
export function sinceBefore(
  { values, previous }: Pick<RevisionLine, 'values' | 'previous'>,
  circuit: number,
): ChangedValue[] {
  if (previous === null) return [];
  return BALANCE_ROWS.flatMap((parameter) => {
    const find = <T extends { circuit: number; parameter: string }>(list: readonly T[]) =>
      list.find((v) => v.circuit === circuit && v.parameter === parameter);
    const [before, after] = [find(previous), find(values)];
    if (!before || !after) return [];
    return (['declared', 'recomputed'] as const).flatMap((what) =>
      same(before[what], after[what]) ? [] : [{ parameter, what, before: before[what], after: after[what] }],
    );
  });
}
