import type { Cause } from '../types';
import { causesOf } from './alternatives';
import type { Cover } from './cover';
import { bestCover } from './cover';
import { declaredItems } from './declared-items';
import type { Item } from './item';
import { SLIP_PRIOR, SPREAD_OF_FITTED } from './item';
import type { DeclaredParameter, Problem } from './problem';
import { TIGHT, residual } from './problem';
import type { Reader, VariantFit } from './variant-items';
import { fitVariant, variantItems } from './variant-items';
import type { Variant } from './variants/variant';

/** Constants that one slip explains, with the causes that may be behind it. */
export interface Matter {
  explains: DeclaredParameter[];
  causes: Cause[];
}

/**
 * Explains the violated values of one circuit or one pair.
 *
 * @param problem declared values and what the geometry gives
 * @param variants other ways of working the line out
 * @param read picks this circuit or pair out of what a variant gives
 * @returns one matter for each slip; constants that nothing explains are in none
 */
export function solveProblem(problem: Problem, variants: readonly Variant[], read: Reader): Matter[] {
  const { targets } = problem;
  const honest = targets.map((target) => residual(target, target.declared, problem.base[target.parameter]));
  const fits = variants.flatMap((variant) => fitVariant(variant, problem, read) ?? []);
  const items = [...declaredItems(problem), ...fits.flatMap((fit) => variantItems(fit, problem, honest))];
  const cover = bestCover(items, targets, honest);
  if (cover.unexplained !== 0 || cover.items.length > 1) {
    const stacked = bestStack(fits, problem, cover);
    if (stacked !== null) return stacked;
  }
  // A resistivity always fits some X0; beside values that nothing explains it would only distract.
  const chosen =
    cover.unexplained === 0 ? cover.items : cover.items.filter(({ code }) => code !== 'earth-resistivity');
  return chosen.map((item) => ({
    explains: namesOf(item, problem),
    causes: causesOf(item, items, targets, honest, cover),
  }));
}

function namesOf(item: Item, { targets }: Problem): DeclaredParameter[] {
  return targets.flatMap(({ parameter }, index) => ((item.explained >> index) & 1 ? [parameter] : []));
}

interface Stack {
  total: number;
  unexplained: number;
  matters: Matter[];
}

/**
 * One slip over the whole line with others on top of it: half the charging of values worked out for one conductor,
 * say. Each variant stands in for the filed geometry, and what it leaves is explained by slips of unit.
 */
function bestStack(fits: readonly VariantFit[], problem: Problem, cover: Cover): Matter[] | null {
  let best: Stack | null = null;
  for (const fit of fits) {
    const stack = stackOn(fit, problem, cover.scatter);
    if (stack !== null && (best === null || stack.total > best.total)) best = stack;
  }
  if (best === null) return null;
  const isBetter = bitCount(best.unexplained) < bitCount(cover.unexplained) || best.total > cover.total + 1;
  return isBetter && bitCount(best.unexplained) <= bitCount(cover.unexplained) ? best.matters : null;
}

function stackOn(fit: VariantFit, problem: Problem, scatter: number): Stack | null {
  const { variant, reach, differences } = fit;
  let direct = 0;
  let isSpoilt = false;
  const targets = problem.targets.map((target, index) => {
    const isOff = !(Math.abs(differences[index] ?? Infinity) <= TIGHT);
    if (!isOff && target.violated && (reach >> index) & 1) direct |= 1 << index;
    // A slip over the whole line that spoils an honest value is none.
    if (isOff && !target.violated && (reach >> index) & 1) isSpoilt = true;
    return { ...target, violated: isOff && target.violated };
  });
  if (direct === 0 || isSpoilt) return null;
  const shifted: Problem = { ...problem, targets, base: fit.predicted };
  const items = declaredItems(shifted);
  const upper = bestCover(items, targets, differences);
  if (upper.items.length === 0) return null;
  const scopePrice = SLIP_PRIOR + variant.prior + variant.freedom * (Math.log(scatter) + SPREAD_OF_FITTED);
  const base = baseItem(fit, problem, direct);
  const matters = [
    { explains: namesOf(base, problem), causes: causesOf(base, [], problem.targets, differences, upper) },
    ...upper.items.map((item) => ({
      explains: namesOf(item, problem),
      causes: causesOf(item, items, targets, differences, upper),
    })),
  ];
  return { total: upper.total + scopePrice, unexplained: upper.unexplained, matters };
}

function baseItem(
  { variant, predicted, differences }: VariantFit,
  problem: Problem,
  explained: number,
): Item {
  const corrected: Record<string, number> = {};
  const residuals = new Map<number, number>();
  problem.targets.forEach(({ parameter, declared }, index) => {
    if (!((explained >> index) & 1)) return;
    residuals.set(index, differences[index] ?? 0);
    const value = predicted[parameter];
    const base = problem.base[parameter];
    if (value !== undefined && base !== undefined) corrected[parameter] = (declared * base) / value;
  });
  const item: Item = {
    code: variant.code,
    in: variant.in,
    touched: explained,
    explained,
    residuals,
    corrected: variant.corrected ?? corrected,
    prior: variant.prior,
    model: variant.model,
    freedom: variant.freedom,
    words: variant.words,
  };
  return variant.where === undefined ? item : { ...item, where: variant.where };
}

function bitCount(mask: number): number {
  let count = 0;
  for (let rest = mask; rest !== 0; rest &= rest - 1) count += 1;
  return count;
}
