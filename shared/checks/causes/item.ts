import type { CauseCode } from '../types';
import type { DeclaredParameter, Target } from './problem';

/** A sentence's end; put into words only when it is told, since most slips never are. */
export type Words = string | (() => string);

/** The words of a slip, worked out now. */
export function inWords(words: Words): string {
  return typeof words === 'string' ? words : words();
}

/** A slip over a set of declared constants, with how well it brings them back. */
export interface Item {
  code: CauseCode;
  in: 'declared' | 'geometry';
  /** Bit mask over the problem's targets: all constants that the slip touches. */
  touched: number;
  /** Bit mask of those among them that were beyond tolerance. */
  explained: number;
  /** Remaining difference ÷ reference by target index. */
  residuals: ReadonlyMap<number, number>;
  corrected: Readonly<Record<string, number>>;
  where?: string;
  /** Log of how likely the slip is before the values are looked at. */
  prior: number;
  /** Spread that the slip's own model has, a share: 0 for exact factors. */
  model: number;
  /** Numbers that were fitted to the values themselves. */
  freedom: number;
  /** What is assumed, as it follows "Fits within 0.1 % if". */
  words: Words;
}

/** Log of the chance that people make any one slip in one value. */
export const SLIP_PRIOR = -3;

/**
 * Log density of a remaining difference when values scatter by `scatter`: Student's t with four degrees of
 * freedom, so that one poor fit does not outweigh everything else.
 *
 * @param difference remaining difference, a share
 * @param scatter share by which honest values scatter in this filing
 */
export function logDensity(difference: number, scatter: number): number {
  return -Math.log(scatter) - 2.5 * Math.log1p((difference / scatter) ** 2 / 4);
}

/** Scatter of one target under a slip: the filing's own, rounding of its digits and the slip's model together. */
export function scatterOf(target: Target, scatter: number, model: number): number {
  return Math.sqrt(scatter ** 2 + target.rounding ** 2 / 3 + model ** 2);
}

/**
 * Log density of what a fitted number could have given: values within some 30 % of the recomputed one, in the same
 * convention as `logDensity`, which leaves ln √2π out.
 */
export const SPREAD_OF_FITTED = 2;

/** Log score of an item: its prior and the fit of everything that it touches. */
export function score(item: Item, targets: readonly Target[], scatter: number): number {
  let total = SLIP_PRIOR + item.prior;
  for (const [index, difference] of item.residuals) {
    const target = targets[index];
    if (target !== undefined) total += logDensity(difference, scatterOf(target, scatter, item.model));
  }
  // A number fitted to the values pays back the fit that it bought.
  return total + item.freedom * (Math.log(Math.hypot(scatter, item.model)) + SPREAD_OF_FITTED);
}

/** The largest remaining difference among the constants that the item explains. */
export function worstResidual(item: Item): number {
  let worst = 0;
  for (const [index, difference] of item.residuals) {
    if ((item.explained >> index) & 1) worst = Math.max(worst, Math.abs(difference));
  }
  return worst;
}

/** The names of the targets in a mask. */
export function namesIn(mask: number, targets: readonly Target[]): DeclaredParameter[] {
  return targets.filter((_, index) => (mask >> index) & 1).map(({ parameter }) => parameter);
}
