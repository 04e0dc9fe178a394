import type { DeclaredValue } from '../filing/types';
import type { Tolerance } from './rule-set';
import { toleranceInUse } from './tolerance';
import type { ToleranceInUse } from './tolerance';

/** What the geometry gives for one constant. */
export interface Reference {
  /** Length-weighted mean, per km. */
  perKm: number;
  /** The whole line's exact equivalent pi ÷ its length, per km. */
  equivalentPerKm: number;
  /** Half the plausible range, per km. */
  halfRange: number;
  dominantInput: string;
}

/** How a whole-line value was read when it was weighed. */
export type WholeLineForm = 'equivalent-pi' | 'length-times-per-length';

/** One declared value against the recomputed one. */
export interface Weighing {
  declared: DeclaredValue;
  /** What it was weighed against, per km. */
  recomputed: number;
  /** (declared − recomputed) ÷ recomputed. */
  deviation: number;
  tolerance: ToleranceInUse;
  contradicted: boolean;
  /** For whole-line values, the form that lies nearer. */
  form: WholeLineForm | null;
  /** How far the two forms lie apart, a share; 0 for per-length values. */
  formsPart: number;
  /** True when it lies inside the plausible range although it is contradicted. */
  insideRange: boolean;
}

/**
 * Weighs a declared value. A per-length value is held against the length-weighted mean; a whole-line value
 * passes if it fits the equivalent pi or length × per-length value, and is held against the nearer.
 *
 * @param declared the value as filed
 * @param reference what the geometry gives
 * @param rule the administrator's tolerance
 */
export function weigh(declared: DeclaredValue, reference: Reference, rule: Tolerance): Weighing {
  const plain = against(declared, reference.perKm, reference, rule);
  if (declared.form === 'per-length') return plain;
  const exact = against(declared, reference.equivalentPerKm, reference, rule);
  const formsPart = Math.abs(reference.equivalentPerKm / reference.perKm - 1);
  const nearer = Math.abs(exact.deviation) < Math.abs(plain.deviation) ? exact : plain;
  const form = nearer === exact ? 'equivalent-pi' : 'length-times-per-length';
  return { ...nearer, form, formsPart };
}

function against(
  declared: DeclaredValue,
  recomputed: number,
  reference: Reference,
  rule: Tolerance,
): Weighing {
  const tolerance = toleranceInUse(
    rule,
    recomputed,
    reference.halfRange,
    declared.halfDigitPerKm,
    reference.dominantInput,
  );
  const deviation = (declared.perKm - recomputed) / recomputed;
  return {
    declared,
    recomputed,
    deviation,
    tolerance,
    contradicted: !(Math.abs(deviation) <= tolerance.total),
    form: null,
    formsPart: 0,
    insideRange: Math.abs(declared.perKm - recomputed) <= reference.halfRange,
  };
}
