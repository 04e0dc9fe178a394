import type { CircuitContext, LineContext } from '../context';
import type { LibraryConductor } from '../../library/types';
import type { Cause } from '../types';
import { MOST_CAUSES, toCause } from './alternatives';
import { Bench } from './bench';
import { declaredByIndex, makeProblem } from './find-causes';
import type { Item } from './item';
import { score } from './item';
import type { Problem } from './problem';
import { TIGHT, residual } from './problem';
import { geometryVariants } from './variants/all';
import type { Variant } from './variants/variant';

/** Scatter assumed where there is no recomputed value to read it off. */
const SCATTER = 1e-3;

/**
 * Slips in a geometry that cannot be computed: those that make it computable and every declared value fit.
 *
 * @param context the line
 * @param circuits its declared circuits
 * @param library the conductor library
 * @returns at most three, best first
 */
export function impossibleGeometryCauses(
  context: LineContext,
  circuits: readonly CircuitContext[],
  library: readonly LibraryConductor[],
): Cause[] {
  const { line } = context;
  if (line.engineInput === null) return [];
  const bench = new Bench(line.engineInput);
  const base = { circuits: Array.from({ length: line.circuitCount }, () => ({})), pairs: [] };
  const constants = { circuits: [], mutual: [], lengthKm: line.lengthKm, equivalent: [], nominal: [] };
  const variants = geometryVariants({
    line,
    bench,
    base,
    constants,
    library,
    declared: declaredByIndex(line),
  });
  const problems = circuits.map((one) => makeProblem(context, one.circuit.declared, {}, {}, () => 1));
  const best = new Map<string, { item: Item; problem: Problem; total: number }>();
  for (const variant of variants) {
    const fitted = fitAll(variant, circuits, problems);
    if (fitted !== null && fitted.total > (best.get(variant.code)?.total ?? -Infinity))
      best.set(variant.code, fitted);
  }
  return [...best.values()]
    .sort((a, b) => b.total - a.total)
    .slice(0, MOST_CAUSES)
    .map(({ item, problem }) => toCause(item, problem.targets));
}

function fitAll(
  variant: Variant,
  circuits: readonly CircuitContext[],
  problems: readonly Problem[],
): { item: Item; problem: Problem; total: number } | null {
  let total = 0;
  let first: { item: Item; problem: Problem } | null = null;
  for (const [index, { circuit }] of circuits.entries()) {
    const problem = problems[index];
    const values = variant.outcome.circuits[circuit.circuit - 1];
    if (problem === undefined || values === undefined) return null;
    const residuals = new Map<number, number>();
    for (const [at, target] of problem.targets.entries()) {
      const difference = residual(target, target.declared, values[target.parameter]);
      if (!(Math.abs(difference) <= TIGHT)) return null;
      residuals.set(at, difference);
    }
    const mask = (1 << problem.targets.length) - 1;
    const item = itemOf(variant, mask, residuals);
    total += score(item, problem.targets, SCATTER);
    first ??= { item, problem };
  }
  return first === null ? null : { ...first, total };
}

function itemOf(variant: Variant, mask: number, residuals: ReadonlyMap<number, number>): Item {
  const item: Item = {
    code: variant.code,
    in: variant.in,
    touched: mask,
    explained: mask,
    residuals,
    corrected: variant.corrected ?? {},
    prior: variant.prior,
    model: variant.model,
    freedom: variant.freedom,
    words: variant.words,
  };
  return variant.where === undefined ? item : { ...item, where: variant.where };
}
