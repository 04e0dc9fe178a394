import type { Item } from './item';
import { logDensity, scatterOf, score } from './item';
import type { Target } from './problem';

/** The best way to explain a circuit's values. */
export interface Cover {
  items: Item[];
  /** Mask of the violated targets that no item explains. */
  unexplained: number;
  /** Log score of the whole. */
  total: number;
  /** Share by which the values scatter under it. */
  scatter: number;
}

/** Shares by which a filing's values may scatter: from digits alone to another engineer's method. */
const SCATTERS = [3e-5, 1e-4, 3e-4, 1e-3, 3e-3] as const;

/** Log price of leaving a violated value unexplained: above that of any slip. */
const UNEXPLAINED = -40;

/**
 * Chooses the set of slips that explains the values best: every constant is either honest, or touched by exactly
 * one slip, or left unexplained. Each slip costs its prior, so that few slips are preferred over many; how much
 * honest values scatter is read off the filing itself.
 *
 * @param items the slips that fit what they touch
 * @param targets the problem's targets
 * @param honest remaining difference of each target when nothing is slipped
 */
export function bestCover(
  items: readonly Item[],
  targets: readonly Target[],
  honest: readonly number[],
): Cover {
  let best: Cover | null = null;
  for (const scatter of SCATTERS) {
    const cover = coverAt(items, targets, honest, scatter);
    if (best === null || cover.total > best.total) best = cover;
  }
  return best ?? { items: [], unexplained: 0, total: 0, scatter: SCATTERS[0] };
}

interface Step {
  total: number;
  item: Item | null;
  rest: number;
}

function coverAt(
  items: readonly Item[],
  targets: readonly Target[],
  honest: readonly number[],
  scatter: number,
): Cover {
  const scored = bestPerMask(items, targets, scatter);
  const count = targets.length;
  const steps: Step[] = [{ total: 0, item: null, rest: 0 }];
  for (let mask = 1; mask < 1 << count; mask++) {
    const lowest = 31 - Math.clz32(mask & -mask);
    const alone = mask & ~(1 << lowest);
    let step: Step = {
      total: (steps[alone]?.total ?? 0) + aloneScore(targets[lowest], honest[lowest] ?? 0, scatter),
      item: null,
      rest: alone,
    };
    for (const { item, total } of scored) {
      if (!((item.touched >> lowest) & 1) || (item.touched & mask) !== item.touched) continue;
      const rest = mask & ~item.touched;
      const sum = (steps[rest]?.total ?? 0) + total;
      if (sum > step.total) step = { total: sum, item, rest };
    }
    steps.push(step);
  }
  return walk(steps, targets, scatter);
}

function aloneScore(target: Target | undefined, difference: number, scatter: number): number {
  if (target === undefined) return 0;
  return target.violated ? UNEXPLAINED : logDensity(difference, scatterOf(target, scatter, 0));
}

function bestPerMask(
  items: readonly Item[],
  targets: readonly Target[],
  scatter: number,
): { item: Item; total: number }[] {
  const best = new Map<number, { item: Item; total: number }>();
  for (const item of items) {
    const total = score(item, targets, scatter);
    const known = best.get(item.touched);
    if (known === undefined || total > known.total) best.set(item.touched, { item, total });
  }
  return [...best.values()];
}

function walk(steps: readonly Step[], targets: readonly Target[], scatter: number): Cover {
  const chosen: Item[] = [];
  let unexplained = 0;
  let mask = (1 << targets.length) - 1;
  const total = steps[mask]?.total ?? 0;
  while (mask !== 0) {
    const step = steps[mask];
    if (step === undefined) break;
    if (step.item !== null) chosen.push(step.item);
    else {
      const lowest = 31 - Math.clz32(mask & -mask);
      if (targets[lowest]?.violated === true) unexplained |= 1 << lowest;
    }
    mask = step.rest;
  }
  return { items: chosen, unexplained, total, scatter };
}
