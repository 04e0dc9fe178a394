import type { ReactNode } from 'react';
import { GRADE_WORDS, type Grade } from '../ui/grades';

/** A value with the digits it is shown in. */
export interface Written {
  value: number;
  text: string;
}

/** A range with its ends as they are shown. */
export interface WrittenRange {
  low: Written;
  high: Written;
}

/** A finding as the row shows it: what it says, the causes behind it, what can be done. */
export interface RowFinding {
  key: string;
  grade: Grade;
  settled?: boolean;
  says: ReactNode;
  /** Cause lines, best first; "Same cause." where another finding carries it. */
  causes?: readonly ReactNode[];
  acts?: ReactNode;
}

/** One row of a balance: a parameter, its three values, what follows from them. */
export interface BalanceEntry {
  key: string;
  name: string;
  unit: string;
  declared: Written | null;
  recomputed: Written | null;
  /** Where the recomputed value may plausibly lie. */
  range?: readonly [number, number] | null;
  typical: WrittenRange | null;
  /** The outer limits of the class: the ends of the strip's scale. */
  outer: WrittenRange | null;
  /** (declared − recomputed) ÷ recomputed, and its text in percent. */
  difference: Written | null;
  /** Relative. Without one (values derived from others) 1.5 % is taken. */
  tolerance?: number | null;
  grade?: Grade | null;
  settled?: boolean;
  /** In place of a grade: "follows X1", "X0 settled". */
  remark?: string;
  findings?: readonly RowFinding[];
}

const DERIVED_TOLERANCE = 0.015;

export function toleranceOf(entry: BalanceEntry): number {
  return entry.tolerance ?? DERIVED_TOLERANCE;
}

export function isOutOfTolerance(entry: BalanceEntry): boolean {
  return entry.difference !== null && Math.abs(entry.difference.value) > toleranceOf(entry);
}

/** The row as a sentence, for those who hear it. */
export function balanceSentence(entry: BalanceEntry): string {
  const { declared, recomputed, typical, difference, unit } = entry;
  const withUnit = (text: string) => (unit ? `${text} ${unit}` : text);
  const values = [
    declared ? `declared ${withUnit(declared.text)}` : 'not declared',
    recomputed ? `recomputed ${withUnit(recomputed.text)}` : 'not recomputed',
    ...(typical ? [`typical ${typical.low.text} to ${withUnit(typical.high.text)}`] : []),
  ].join(', ');
  const verdict = entry.remark ?? (entry.grade ? GRADE_WORDS[entry.grade] : undefined);
  const parts = [values, difference ? `difference ${difference.text}` : undefined, verdict];
  return `${entry.name}: ${parts.filter(Boolean).join('; ')}.`;
}
