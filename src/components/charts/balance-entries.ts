import { PARAMETER_WORDS } from '#shared/checks/parameters';
import type { FindingParameter } from '#shared/checks/parameters';
import { fixed, rangeTexts, signedPercent } from '#shared/format/numbers';
import type { BalanceEntry, Written, WrittenRange } from './balance-entry';

/** The rows of a balance, in their order. */
export const BALANCE_ROWS = ['r1', 'x1', 'b1', 'r0', 'x0', 'b0', 'surgeImpedanceOhm', 'waveSpeed'] as const;
export type BalanceRow = (typeof BALANCE_ROWS)[number];

/** A value as a check weighed it: Ω/km, µS/km, Ω, or the share of light's speed. */
export interface WeighedValue {
  parameter: string;
  declared: number | null;
  recomputed: number | null;
  range?: readonly [number, number] | null;
  deviation: number | null;
  tolerance: number | null;
  typical: readonly [number, number] | null;
  outer: readonly [number, number] | null;
  grade: 'must-answer' | 'explain' | 'note' | null;
  follows: string | null;
}

interface RowWords {
  name: string;
  unit: string;
  /** Shown value of one unit of the checked value. */
  scale: number;
}

const WORDS: Readonly<Record<BalanceRow, RowWords>> = {
  r1: { name: 'R1', unit: 'Ω/km', scale: 1 },
  x1: { name: 'X1', unit: 'Ω/km', scale: 1 },
  b1: { name: 'B1', unit: 'µS/km', scale: 1 },
  r0: { name: 'R0', unit: 'Ω/km', scale: 1 },
  x0: { name: 'X0', unit: 'Ω/km', scale: 1 },
  b0: { name: 'B0', unit: 'µS/km', scale: 1 },
  surgeImpedanceOhm: { name: 'Zc', unit: 'Ω', scale: 1 },
  waveSpeed: { name: 'Wave speed', unit: '% of c', scale: 100 },
};

/** Which row a finding about another parameter stands in: ratios stand with their numerator. */
const ROW_OF: Readonly<Record<string, BalanceRow>> = {
  r0MinusR1: 'r0',
  r0OverR1: 'r0',
  x1OverR1: 'x1',
  x0OverX1: 'x0',
  b0OverB1: 'b0',
};

const isRow = (parameter: string): parameter is BalanceRow =>
  (BALANCE_ROWS as readonly string[]).includes(parameter);

/** The row that a finding's parameter belongs to, or null where it has none (couplings, ratings). */
export function rowOf(parameter: string | null | undefined): BalanceRow | null {
  if (!parameter) return null;
  return isRow(parameter) ? parameter : (ROW_OF[parameter] ?? null);
}

/** Where a parameter's row stands among the others. */
export const balanceOrder = (parameter: string): number =>
  isRow(parameter) ? BALANCE_ROWS.indexOf(parameter) : BALANCE_ROWS.length;

/** A parameter as people call it: "X1", "Zc". */
export function parameterName(parameter: string): string {
  if (isRow(parameter)) return WORDS[parameter].name;
  return PARAMETER_WORDS[parameter as FindingParameter]?.label ?? parameter;
}

/** Decimals that show the larger of two values with three significant digits, so that both stand alike. */
function decimalsFor(values: readonly (number | null)[]): number {
  const sizes = values.filter((v): v is number => v !== null && v !== 0).map(Math.abs);
  if (sizes.length === 0) return 3;
  const digits = Math.floor(Math.log10(Math.min(...sizes))) + 1;
  return Math.min(6, Math.max(0, 3 - digits));
}

function range(ends: readonly [number, number] | null, scale: number): WrittenRange | null {
  if (!ends) return null;
  const [low, high] = [ends[0] * scale, ends[1] * scale];
  const [lowText, highText] = rangeTexts(low, high);
  return { low: { value: low, text: lowText }, high: { value: high, text: highText } };
}

/** What a difference in per cent with one decimal shows as 0.0. */
const SHOWN_AS_ZERO = 0.0005;

function gradeOf({ deviation, follows, grade }: WeighedValue): BalanceEntry['grade'] {
  if (follows) return 'in-balance';
  return grade ?? (deviation === null ? null : 'in-balance');
}

/** One row of the balance for a weighed value. */
export function balanceEntry(row: BalanceRow, weighed: WeighedValue): BalanceEntry {
  const { name, unit, scale } = WORDS[row];
  const scaled = (v: number | null): number | null => (v === null ? null : v * scale);
  const declared = scaled(weighed.declared);
  const recomputed = scaled(weighed.recomputed);
  const decimals = decimalsFor([declared, recomputed]);
  const written = (v: number | null): Written | null =>
    v === null ? null : { value: v, text: fixed(v, decimals) };
  const { deviation, tolerance } = weighed;
  // A derived value follows its parent in what is wrong with it; where it is level there is nothing to follow.
  const level = deviation !== null && Math.abs(deviation) <= Math.max(tolerance ?? 0, SHOWN_AS_ZERO);
  const follows = level ? null : weighed.follows;
  return {
    key: row,
    name,
    unit,
    declared: written(declared),
    recomputed: written(recomputed),
    range: weighed.range ? [weighed.range[0] * scale, weighed.range[1] * scale] : null,
    typical: range(weighed.typical, scale),
    outer: range(weighed.outer, scale),
    difference: deviation === null ? null : { value: deviation, text: signedPercent(deviation) },
    tolerance,
    grade: follows ? null : gradeOf(weighed),
    remark: follows ? `follows ${parameterName(follows)}` : undefined,
  };
}

const sum = (a: readonly [number, number], b: readonly [number, number]): [number, number] => [
  a[0] + b[0],
  a[1] + b[1],
];

/** R0 has no band of its own: it is drawn on those of R1 and of R0 − R1 added. */
function withSummedBand(r0: WeighedValue, values: readonly WeighedValue[]): WeighedValue {
  const r1 = values.find((v) => v.parameter === 'r1');
  const excess = values.find((v) => v.parameter === 'r0MinusR1');
  if (r0.typical || !r1?.typical || !r1.outer || !excess?.typical || !excess.outer) return r0;
  return { ...r0, typical: sum(r1.typical, excess.typical), outer: sum(r1.outer, excess.outer) };
}

/** The rows of a balance, in their order; values that have no row are left out. */
export function balanceEntries(values: readonly WeighedValue[]): BalanceEntry[] {
  return BALANCE_ROWS.flatMap((row) => {
    const weighed = values.find((v) => v.parameter === row);
    return weighed ? [balanceEntry(row, row === 'r0' ? withSummedBand(weighed, values) : weighed)] : [];
  });
}
