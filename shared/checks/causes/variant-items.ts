import type { Outcome } from './bench';
import type { Item } from './item';
import type { Problem, Values } from './problem';
import { TIGHT, residual } from './problem';
import { CALCULATION_SCOPES, scopesWithin } from './scopes';
import type { Scope } from './scopes';
import type { Variant } from './variants/variant';

/** A variant moves a constant when it changes it by more than this share. */
const MOVES = 2e-4;

/** What an honest value may lose by a variant that touches it without its being beyond tolerance. */
const GRACE = 0.002;

/** Reads one circuit's or one pair's values from what a variant gives. */
export type Reader = (outcome: Outcome) => Values | undefined;

/** How one variant stands to one problem. */
export interface VariantFit {
  variant: Variant;
  predicted: Values;
  /** Mask of the targets that it moves. */
  reach: number;
  /** Remaining difference of each target under it. */
  differences: number[];
}

/** Holds a variant against the declared values. */
export function fitVariant(variant: Variant, problem: Problem, read: Reader): VariantFit | null {
  const predicted = read(variant.outcome);
  if (predicted === undefined) return null;
  let reach = 0;
  const differences = problem.targets.map((target, index) => {
    const value = predicted[target.parameter];
    const base = problem.base[target.parameter];
    if (value === undefined) return Infinity;
    const isReached = variant.reach === undefined || variant.reach(target.parameter);
    if (isReached && (base === undefined || Math.abs(value / base - 1) > MOVES)) reach |= 1 << index;
    return residual(target, target.declared, value);
  });
  return { variant, predicted, reach, differences };
}

/**
 * The items of a variant: over every natural scope for a slip of calculation, over all that it moves for a slip in the
 * geometry. An item stands only if everything that it touches is brought back.
 *
 * @param fit the variant against the problem
 * @param problem the problem
 * @param honest remaining difference of each target when nothing is slipped
 */
export function variantItems(fit: VariantFit, problem: Problem, honest: readonly number[]): Item[] {
  const { variant, reach, differences } = fit;
  if (reach === 0) return [];
  const scopes: Scope[] =
    variant.in === 'geometry' || variant.isWhole === true
      ? [{ mask: reach, prior: 0 }]
      : scopesWithin(reach, problem.targets, CALCULATION_SCOPES);
  return scopes.flatMap(({ mask, prior }): Item[] => {
    let explained = 0;
    const residuals = new Map<number, number>();
    for (const [index, target] of problem.targets.entries()) {
      if (!((mask >> index) & 1)) continue;
      const difference = differences[index] ?? Infinity;
      const allowed = target.violated ? TIGHT : Math.max(TIGHT, Math.abs(honest[index] ?? 0) + GRACE);
      if (!(Math.abs(difference) <= allowed)) return [];
      residuals.set(index, difference);
      if (target.violated) explained |= 1 << index;
    }
    if (explained === 0) return [];
    return [toItem(fit, problem, mask, explained, residuals, prior)];
  });
}

function toItem(
  { variant, predicted }: VariantFit,
  problem: Problem,
  touched: number,
  explained: number,
  residuals: Map<number, number>,
  prior: number,
): Item {
  const item: Item = {
    code: variant.code,
    in: variant.in,
    touched,
    explained,
    residuals,
    corrected: variant.corrected ?? correctedValues(problem, predicted, explained),
    prior: variant.prior + prior,
    model: variant.model,
    freedom: variant.freedom,
    words: variant.words,
  };
  return variant.where === undefined ? item : { ...item, where: variant.where };
}

/** Declared values with the slip taken out: scaled by what it does to the recomputed ones. */
function correctedValues(problem: Problem, predicted: Values, mask: number): Record<string, number> {
  const corrected: Record<string, number> = {};
  problem.targets.forEach(({ parameter, declared }, index) => {
    const base = problem.base[parameter];
    const value = predicted[parameter];
    if (!((mask >> index) & 1) || base === undefined || value === undefined || value === 0) return;
    corrected[parameter] = (declared * base) / value;
  });
  return corrected;
}
