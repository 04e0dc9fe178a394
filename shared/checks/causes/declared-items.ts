import type { Item } from './item';
import type { Problem, Target } from './problem';
import { TIGHT, residual } from './problem';
import { UNIT_SCOPES, scopesWithin } from './scopes';
import { swapItems } from './swaps';
import { factorSlips } from './unit-slips';
import type { FactorSlip } from './unit-slips';

/** Log price of a slip between per-length and whole-line values in one field alone. */
const LONE_WHOLE = -3.5;

interface Fit {
  slip: FactorSlip;
  index: number;
  value: number;
  difference: number;
}

/**
 * The slips of unit, base, decimal point and field that bring violated values back.
 *
 * @param problem the circuit's or the pair's values
 * @returns items over every natural set of the constants that one slip fits
 */
export function declaredItems(problem: Problem): Item[] {
  const matters = new Map<string, Fit[]>();
  problem.targets.forEach((target, index) => {
    if (!target.violated) return;
    for (const slip of factorSlips(target, problem)) {
      const value = target.declared * slip.factor;
      const difference = residual(target, value, problem.base[target.parameter]);
      if (Math.abs(difference) > TIGHT) continue;
      const key = `${slip.code} ${slip.key}`;
      const fits = matters.get(key) ?? [];
      fits.push({ slip, index, value, difference });
      matters.set(key, fits);
    }
  });
  const factors = [...matters.values()].flatMap((fits) => itemsOf(fits, problem.targets));
  return [...factors, ...swapItems(problem)];
}

function itemsOf(fits: readonly Fit[], targets: readonly Target[]): Item[] {
  const reach = fits.reduce((mask, { index }) => mask | (1 << index), 0);
  return scopesWithin(reach, targets, UNIT_SCOPES).flatMap(({ mask, prior }) => {
    const inside = fits.filter(({ index }) => (mask >> index) & 1);
    const first = inside[0];
    if (first === undefined || !isCoherent(first.slip, inside, targets)) return [];
    // A slip in several fields is one act: its own price counts once, at the most natural of them.
    const own = Math.max(...inside.map(({ slip }) => slip.prior));
    const price = first.slip.isWhole === true && inside.length === 1 ? LONE_WHOLE : 0;
    const item: Item = {
      code: first.slip.code,
      in: 'declared',
      touched: mask,
      explained: mask,
      residuals: new Map(inside.map(({ index, difference }) => [index, difference])),
      corrected: Object.fromEntries(
        inside.map(({ index, value }) => [targets[index]?.parameter ?? '', value]),
      ),
      prior: own + prior + price,
      model: 0,
      freedom: 0,
      words: first.slip.words,
    };
    return [item];
  });
}

/**
 * A base slip shows in one field only where that field is in per unit; in Ω and µS it was made before the values were
 * converted, and so in several.
 */
function isCoherent(slip: FactorSlip, inside: readonly Fit[], targets: readonly Target[]): boolean {
  if (!BASE_SLIPS.has(slip.code) || inside.length > 1) return true;
  const unit = targets[inside[0]?.index ?? -1]?.value.unit;
  return unit === 'pu' || unit === '%' || unit === 'Mvar';
}

const BASE_SLIPS: ReadonlySet<string> = new Set(['base-mva', 'base-kv', 'phase-to-neutral-base']);
