import type { DeclaredParameter, Target } from './problem';
import { isResistance, isShunt } from './problem';

/** A set of targets that a slip may have been made in together, and how natural that is (0 the most). */
export interface Scope {
  mask: number;
  prior: number;
}

type Test = (parameter: DeclaredParameter) => boolean;

const isZero: Test = (parameter) => parameter.includes('0');

/** Families of constants that are worked out together, and so slip together. */
const FAMILIES: readonly Test[] = [
  (parameter) => !isShunt(parameter),
  isShunt,
  (parameter) => !isZero(parameter),
  isZero,
  isResistance,
  (parameter) => !isShunt(parameter) && !isResistance(parameter),
  (parameter) => !isResistance(parameter),
  (parameter) => !isZero(parameter) && !isResistance(parameter),
  (parameter) => !isZero(parameter) && !isShunt(parameter),
  (parameter) => isZero(parameter) && !isShunt(parameter),
];

/** Priors of scopes: everything the slip reaches, a family of it, a single constant. */
export interface ScopePriors {
  whole: number;
  family: number;
  single: number;
}

/** A slip of unit or base: each field has its own, so single constants are nearly as natural as all. */
export const UNIT_SCOPES: ScopePriors = { whole: 0, family: -0.3, single: -0.6 };

/** A slip of calculation: it usually reaches everything that it can. */
export const CALCULATION_SCOPES: ScopePriors = { whole: 0, family: -1, single: -1.5 };

/**
 * The scopes of a slip that reaches the targets in a mask.
 *
 * @param reach mask of the targets that it can reach
 * @param targets the problem's targets
 * @param priors log priors of the kinds of scope
 * @returns each mask once, with its best prior
 */
export function scopesWithin(reach: number, targets: readonly Target[], priors: ScopePriors): Scope[] {
  const found = new Map<number, number>();
  const add = (mask: number, prior: number): void => {
    if (mask !== 0 && prior > (found.get(mask) ?? -Infinity)) found.set(mask, prior);
  };
  add(reach, priors.whole);
  for (const family of FAMILIES) add(reach & maskOf(targets, family), priors.family);
  targets.forEach((_, index) => add(reach & (1 << index), priors.single));
  return [...found].map(([mask, prior]) => ({ mask, prior }));
}

/** Mask of the targets whose constant passes a test. */
export function maskOf(targets: readonly Target[], test: Test): number {
  return targets.reduce((mask, { parameter }, index) => (test(parameter) ? mask | (1 << index) : mask), 0);
}
