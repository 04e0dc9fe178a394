import type { NormalisedCircuit, NormalisedLine, NormalisedMutual } from '../filing/types';
import { matchClass } from './bands/match-class';
import { CABLE_SHARE_LIMIT } from './context';
import type { CircuitContext, LineContext, PairContext } from './context';
import { withDerived } from './derive';
import { LINE_PARAMETERS, MUTUAL_PARAMETERS } from './parameters';
import type { LineParameter } from './parameters';
import { recompute } from './recompute';
import type { RuleSet } from './rule-set';
import { weigh } from './weigh';

const PI_KEYS = { r1: 'r', x1: 'x', b1: 'b', r0: 'r0', x0: 'x0', b0: 'b0' } as const;

/** Recomputes a line and finds its voltage class. */
export function lineContext(line: NormalisedLine, rules: RuleSet): LineContext {
  return {
    line,
    rules,
    match: matchClass(rules.bands, line.nominalVoltageKv, line.frequencyHz),
    recomputation: recompute(line, rules.uncertainties),
    isOverhead: line.cableShare <= CABLE_SHARE_LIMIT,
  };
}

/** Weighs the declared values of one circuit. */
export function circuitContext(context: LineContext, circuit: NormalisedCircuit): CircuitContext {
  const { line, rules, recomputation } = context;
  const declared: CircuitContext['declared'] = {};
  for (const parameter of LINE_PARAMETERS) {
    const value = circuit.declared[parameter];
    if (value !== undefined) declared[parameter] = value.perKm;
  }
  const index = circuit.circuit - 1;
  const constants = recomputation.ok ? (recomputation.constants.circuits[index] ?? null) : null;
  const weighings: CircuitContext['weighings'] = {};
  if (recomputation.ok && constants !== null) {
    const equivalent = recomputation.constants.equivalent[index];
    for (const parameter of LINE_PARAMETERS) {
      const value = circuit.declared[parameter];
      const spread = recomputation.spreads.circuits[index]?.[parameter];
      if (value === undefined || spread === undefined) continue;
      const perKm = constants[parameter];
      const total = equivalent?.[PI_KEYS[parameter]];
      const reference = {
        perKm,
        equivalentPerKm: total === undefined ? perKm : total / line.lengthKm,
        halfRange: spread.halfRange,
        dominantInput: spread.dominant,
      };
      weighings[parameter] = weigh(value, reference, rules.tolerances[parameter]);
    }
  }
  const recomputed = constants === null ? null : withDerived(constants, line.frequencyHz);
  return { lineContext: context, circuit, declared, constants, recomputed, weighings };
}

/** Weighs the declared coupling of two circuits. */
export function pairContext(
  context: LineContext,
  mutual: NormalisedMutual,
  circuits: readonly CircuitContext[],
): PairContext {
  const { rules, recomputation } = context;
  const weighings: PairContext['weighings'] = {};
  const found = recomputation.ok
    ? recomputation.constants.mutual.findIndex((pair) => isSamePair(pair.circuits, mutual.circuits))
    : -1;
  if (recomputation.ok && found >= 0) {
    for (const parameter of MUTUAL_PARAMETERS) {
      const value = mutual.declared[parameter];
      const perKm = recomputation.constants.mutual[found]?.[parameter];
      const spread = recomputation.spreads.mutual[found]?.[parameter];
      if (value === undefined || perKm === undefined || spread === undefined) continue;
      const { halfRange, dominant } = spread;
      const reference = { perKm, equivalentPerKm: perKm, halfRange, dominantInput: dominant };
      weighings[parameter] = weigh(value, reference, rules.tolerances[parameter]);
    }
  }
  const selves = mutual.circuits.map((number) =>
    perLengthValues(circuits.find(({ circuit }) => circuit.circuit === number)),
  );
  return { lineContext: context, mutual, selves, weighings };
}

/**
 * Declared values as values per length: an equivalent pi, whose resistance falls short of length × per-length value by
 * several per cent on a long line, is no measure for a coupling per length.
 */
function perLengthValues(context: CircuitContext | undefined): Partial<Record<LineParameter, number>> {
  const values: Partial<Record<LineParameter, number>> = { ...context?.declared };
  for (const parameter of LINE_PARAMETERS) {
    const weighing = context?.weighings[parameter];
    const perKm = context?.constants?.[parameter];
    if (weighing?.form !== 'equivalent-pi' || perKm === undefined || weighing.recomputed === 0) continue;
    values[parameter] = weighing.declared.perKm * (perKm / weighing.recomputed);
  }
  return values;
}

function isSamePair(one: readonly number[], other: readonly number[]): boolean {
  return [...one].sort().join() === [...other].sort().join();
}
