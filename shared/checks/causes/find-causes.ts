import type { LineConstants } from '../../engine/index';
import type { DeclaredValue, NormalisedLine } from '../../filing/types';
import type { LibraryConductor } from '../../library/types';
import { nominalVoltages } from '../bands/match-class';
import type { CircuitContext, LineContext, PairContext } from '../context';
import type { LineParameter } from '../parameters';
import type { Weighing } from '../weigh';
import type { Outcome } from './bench';
import { Bench } from './bench';
import type { DeclaredParameter, Problem, Target, Values } from './problem';
import { TIGHT, residual } from './problem';
import type { Matter } from './solve-problem';
import { solveProblem } from './solve-problem';
import { allVariants } from './variants/all';
import type { Variant, VariantContext } from './variants/variant';

/** The matters of a line: for each circuit in the order of the contexts, and for each declared pair. */
export interface LineMatters {
  circuits: Matter[][];
  pairs: Matter[][];
}

/**
 * Seeks the slips behind every violated value of a line.
 *
 * @param context the line, recomputed
 * @param circuits its declared circuits, weighed
 * @param pairs its declared couplings, weighed
 * @param library conductors that may have been taken for the filed one
 */
export function findCauses(
  context: LineContext,
  circuits: readonly CircuitContext[],
  pairs: readonly PairContext[],
  library: readonly LibraryConductor[],
): LineMatters {
  const { line, recomputation } = context;
  const violated = violatedNames(circuits, pairs);
  const none = { circuits: circuits.map(() => []), pairs: pairs.map(() => []) };
  if (violated.size === 0 || !recomputation.ok || line.engineInput === null) return none;
  const bench = new Bench(line.engineInput);
  const base = bench.asFiled();
  if (base === null) return none;
  const { constants } = recomputation;
  const variantContext = { line, bench, base, constants, library, declared: declaredByIndex(line) };
  const variants = allVariants(variantContext, violated);
  const problems = circuits.map((one) => circuitProblem(context, one, base, constants));
  const fair = variants.filter((variant) => isFairToAll(variant, circuits, problems));
  return {
    circuits: circuits.map((one, index) => {
      const problem = problems[index];
      if (problem === undefined || !hasViolation(problem)) return [];
      return solveProblem(problem, fair, (outcome) => outcome.circuits[one.circuit.circuit - 1]);
    }),
    pairs: pairs.map((one) => pairMatters(context, one, base, fair)),
  };
}

function pairMatters(
  context: LineContext,
  pair: PairContext,
  base: Outcome,
  variants: readonly Variant[],
): Matter[] {
  // Two circuits make one pair; the coupling of more would be looked up by their numbers.
  const problem = makeProblem(context, pair.mutual.declared, pair.weighings, base.pairs[0] ?? {}, () => 1);
  return hasViolation(problem) ? solveProblem(problem, variants, (outcome) => outcome.pairs[0]) : [];
}

function hasViolation(problem: Problem): boolean {
  return problem.targets.some(({ violated }) => violated);
}

function violatedNames(
  circuits: readonly CircuitContext[],
  pairs: readonly PairContext[],
): ReadonlySet<string> {
  const names = [...circuits, ...pairs].flatMap(({ weighings }) =>
    Object.entries(weighings).flatMap(([name, weighing]) => (weighing.contradicted ? [name] : [])),
  );
  return new Set(names);
}

/** Declared values per km by circuit index. */
export function declaredByIndex(line: NormalisedLine): VariantContext['declared'] {
  const found: (Values | undefined)[] = Array.from({ length: line.circuitCount }, () => undefined);
  for (const { circuit, declared } of line.circuits) {
    const values: Values = {};
    for (const [name, value] of Object.entries(declared)) values[name as LineParameter] = value.perKm;
    found[circuit - 1] = values;
  }
  return found;
}

const PI_KEYS = { r1: 'r', x1: 'x', b1: 'b', r0: 'r0', x0: 'x0', b0: 'b0' } as const;

function circuitProblem(
  context: LineContext,
  one: CircuitContext,
  base: Outcome,
  constants: LineConstants,
): Problem {
  const index = one.circuit.circuit - 1;
  const ratioOf = (parameter: DeclaredParameter): number => {
    const key = PI_KEYS[parameter as LineParameter];
    const exact = constants.equivalent[index]?.[key];
    const nominal = constants.nominal[index]?.[key];
    return exact === undefined || nominal === undefined || nominal === 0 ? 1 : exact / nominal;
  };
  return makeProblem(context, one.circuit.declared, one.weighings, base.circuits[index] ?? {}, ratioOf);
}

/** The problem that a set of declared values poses. */
export function makeProblem(
  { line, rules }: LineContext,
  declared: Partial<Record<DeclaredParameter, DeclaredValue>>,
  weighings: Partial<Record<DeclaredParameter, Weighing>>,
  base: Values,
  formRatio: (parameter: DeclaredParameter) => number,
): Problem {
  const targets = (Object.entries(declared) as [DeclaredParameter, DeclaredValue][]).map(
    ([parameter, value]): Target => ({
      parameter,
      value,
      declared: value.perKm,
      violated: weighings[parameter]?.contradicted ?? false,
      rounding: value.halfDigitPerKm / Math.max(Math.abs(base[parameter] ?? value.perKm), 1e-12),
      formRatio: value.form === 'whole-line' ? formRatio(parameter) : 1,
    }),
  );
  return {
    targets,
    base,
    lengthKm: line.lengthKm,
    frequencyHz: line.frequencyHz,
    nominalVoltageKv: line.nominalVoltageKv,
    classesKv: nominalVoltages(rules.bands),
  };
}

/** A slip in the geometry shows on every circuit: it may not spoil a value of another one that fits as filed. */
function isFairToAll(
  variant: Variant,
  circuits: readonly CircuitContext[],
  problems: readonly Problem[],
): boolean {
  if (variant.in === 'declared' || circuits.length < 2) return true;
  return circuits.every(({ circuit }, index) => {
    const values = variant.outcome.circuits[circuit.circuit - 1];
    const problem = problems[index];
    if (values === undefined || problem === undefined) return false;
    return problem.targets.every((target) => {
      if (target.violated) return true;
      const before = Math.abs(residual(target, target.declared, problem.base[target.parameter]));
      const after = Math.abs(residual(target, target.declared, values[target.parameter]));
      return after <= Math.max(TIGHT, before + 0.002);
    });
  });
}
